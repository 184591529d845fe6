import type { Problem, RationSaveInput, RationView } from '@brimgate/rules';
import { isApiProblem, problemOf } from '../../lib/api-problem';
import type { Fault } from '../../lib/form/faults-to-form';
import { type Conflict, mergeRations, sameValues } from './conflict';
import { atFormField, draftFromValues } from './ration-content';
import { type RationValues, rationValues } from './ration-values';

/** After this long without a keystroke the draft is saved. */
export const SAVE_AFTER_MS = 1500;
/** A server that cannot be reached is tried again after this. */
export const RETRY_AFTER_MS = 5000;

export type SaveState =
  | { kind: 'saved' | 'typing' | 'saving' }
  /** What is typed cannot be read; it is saved when it is mended. */
  | { kind: 'held'; faults: Fault[] }
  | { kind: 'failed'; problem: Problem }
  /** Somebody else saved meanwhile and both changed the same parts. */
  | { kind: 'conflict'; merged: RationValues; conflicts: Conflict[]; current: RationView };

export class DraftNotSaved extends Error {
  override readonly name = 'DraftNotSaved';

  constructor(readonly state: SaveState) {
    super('The draft could not be saved');
  }
}

export interface DraftSaverCalls {
  save: (input: RationSaveInput, version: number) => Promise<RationView>;
  fetchCurrent: () => Promise<RationView>;
  /** The server's answer, for the query cache. */
  onSaved: (ration: RationView) => void;
  /** Somebody else's changes were put together with mine, without a conflict: the form shows them. */
  onMerged: (values: RationValues, current: RationView) => void;
}

/**
 * Saves a draft a moment after typing stops, one save at a time, each with the version it was made on.
 * It holds no React: the form tells it what is typed and reads its state.
 */
export class DraftSaver {
  #state: SaveState = { kind: 'saved' };
  #listeners = new Set<() => void>();
  #timer: ReturnType<typeof setTimeout> | undefined;
  #inFlight: Promise<void> | null = null;
  #isDisposed = false;
  #ration: RationView;
  #base: RationValues;
  #values: RationValues;

  constructor(
    ration: RationView,
    private readonly calls: DraftSaverCalls,
  ) {
    this.#ration = ration;
    this.#base = rationValues(ration.name, ration.draft);
    this.#values = this.#base;
  }

  readonly subscribe = (listener: () => void): (() => void) => {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  };

  readonly state = (): SaveState => this.#state;

  get version(): number {
    return this.#ration.version;
  }

  get isDirty(): boolean {
    return !sameValues(this.#values, this.#base);
  }

  /** What stands in the form now. */
  change(values: RationValues): void {
    this.#values = values;
    if (this.#state.kind === 'conflict' || this.#state.kind === 'saving') return;
    clearTimeout(this.#timer);
    if (!this.isDirty) this.#become({ kind: 'saved' });
    else {
      this.#become({ kind: 'typing' });
      this.#saveAfter(SAVE_AFTER_MS);
    }
  }

  /** Another act answered (a screening, a submission): from here on changes are counted against its answer. */
  adopt(ration: RationView, values: RationValues): void {
    clearTimeout(this.#timer);
    this.#ration = ration;
    this.#base = values;
    this.change(this.#values);
  }

  /** Saves what is still unsaved and answers with the version that stands then; throws when it cannot. */
  async flush(): Promise<number> {
    clearTimeout(this.#timer);
    if (this.isDirty && (this.#state.kind === 'held' || this.#state.kind === 'failed'))
      this.#become({ kind: 'typing' });
    while (this.#inFlight || this.#canSave()) await (this.#inFlight ?? this.#start());
    if (this.#state.kind !== 'saved') throw new DraftNotSaved(this.#state);
    return this.version;
  }

  /** The person has chosen: their choice is saved on top of what the other person saved. */
  resolve(values: RationValues): void {
    if (this.#state.kind !== 'conflict') return;
    const { current } = this.#state;
    this.#ration = current;
    this.#base = rationValues(current.name, current.draft);
    this.#values = values;
    this.#become({ kind: 'typing' });
    this.change(values);
    if (this.isDirty) this.#saveAfter(0);
  }

  /** The page is left: what is under way ends, nothing new begins. */
  dispose(): void {
    this.#isDisposed = true;
    clearTimeout(this.#timer);
  }

  #canSave(): boolean {
    return this.isDirty && this.#state.kind === 'typing';
  }

  #saveAfter(delayMs: number): void {
    this.#after(delayMs, () => void this.#start());
  }

  #after(delayMs: number, act: () => void): void {
    clearTimeout(this.#timer);
    if (!this.#isDisposed) this.#timer = setTimeout(act, delayMs);
  }

  #start(): Promise<void> {
    this.#inFlight ??= this.#saveOnce().finally(() => {
      this.#inFlight = null;
    });
    return this.#inFlight;
  }

  async #saveOnce(): Promise<void> {
    const sent = this.#values;
    const draft = draftFromValues(sent);
    if (!draft.isValid) return this.#become({ kind: 'held', faults: draft.faults });
    this.#become({ kind: 'saving' });
    try {
      const ration = await this.calls.save(draft.output, this.version);
      this.#ration = ration;
      this.#base = sent;
      this.calls.onSaved(ration);
      this.#settle();
    } catch (error) {
      await this.#fail(error);
    }
  }

  #settle(): void {
    this.#become({ kind: this.isDirty ? 'typing' : 'saved' });
    if (this.isDirty) this.#saveAfter(SAVE_AFTER_MS);
  }

  async #fail(error: unknown): Promise<void> {
    if (isApiProblem(error) && error.status === 412) return this.#meetOtherChanges();
    const problem = problemOf(error);
    if (problem.status === 422) {
      return this.#become({ kind: 'held', faults: problem.errors.map(atFormField) });
    }
    this.#become({ kind: 'failed', problem });
    if (problem.status === 0 || problem.status >= 500) {
      this.#after(RETRY_AFTER_MS, () => this.retry());
    }
  }

  /** Tries again what the server could not take. */
  retry(): void {
    if (this.#state.kind !== 'failed') return;
    this.#become({ kind: 'typing' });
    void this.#start();
  }

  async #meetOtherChanges(): Promise<void> {
    let current: RationView;
    try {
      current = await this.calls.fetchCurrent();
    } catch (error) {
      return this.#become({ kind: 'failed', problem: problemOf(error) });
    }
    const theirs = rationValues(current.name, current.draft);
    const { merged, conflicts } = mergeRations(this.#base, this.#values, theirs);
    if (conflicts.length > 0) return this.#become({ kind: 'conflict', merged, conflicts, current });
    this.#ration = current;
    this.#base = theirs;
    this.#values = merged;
    this.calls.onMerged(merged, current);
    this.#settle();
  }

  #become(state: SaveState): void {
    this.#state = state;
    for (const listener of this.#listeners) listener();
  }
}
