import type { RationSaveInput, RationView } from '@brimgate/rules';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { aDraft, aRationView } from '../../../test/builders/rations';
import { ApiProblem, networkUnreachable } from '../../lib/api-problem';
import { DraftNotSaved, DraftSaver, RETRY_AFTER_MS, SAVE_AFTER_MS } from './draft-saver';
import { rationValues, type RationValues } from './ration-values';

const refusal = (status: number, errors: { path: string; message: string }[] = []) =>
  new ApiProblem({ type: 'about:blank', title: 'Refused', status, code: 'refused', errors });

const opened = aRationView({ version: 3 });
const typed = (bodyWeightKg: string): RationValues => {
  const values = rationValues(opened.name, opened.draft);
  return { ...values, cattle: { ...values.cattle, bodyWeightKg } };
};

/** A server that keeps what it is sent and counts its versions. */
function aSaver(save = vi.fn<(input: RationSaveInput, version: number) => Promise<RationView>>()) {
  if (!save.getMockImplementation()) {
    save.mockImplementation((input, version) =>
      Promise.resolve(aRationView({ name: input.name, draft: input.draft, version: version + 1 })),
    );
  }
  const fetchCurrent = vi.fn<() => Promise<RationView>>();
  const onMerged = vi.fn();
  const onSaved = vi.fn();
  return {
    saver: new DraftSaver(opened, { save, fetchCurrent, onSaved, onMerged }),
    save,
    fetchCurrent,
    onMerged,
    onSaved,
  };
}

beforeEach(() => {
  vi.useFakeTimers();
});
afterEach(() => {
  vi.useRealTimers();
});

describe('saving by itself', () => {
  it('saves once, after typing has stopped, with the version it was made on', async () => {
    const { saver, save } = aSaver();
    saver.change(typed('45'));
    await vi.advanceTimersByTimeAsync(SAVE_AFTER_MS - 1);
    saver.change(typed('455'));
    await vi.advanceTimersByTimeAsync(SAVE_AFTER_MS - 1);
    expect(save).not.toHaveBeenCalled();
    await vi.advanceTimersByTimeAsync(1);
    expect(save).toHaveBeenCalledExactlyOnceWith(expect.objectContaining({ name: opened.name }), 3);
    expect(save.mock.calls[0]?.[0].draft.cattle.bodyWeightKg).toBe(455);
    expect(saver.state()).toEqual({ kind: 'saved' });
    expect(saver.version).toBe(4);
  });

  it('sends nothing when nothing changed', async () => {
    const { saver, save } = aSaver();
    saver.change(typed('454.0'));
    await vi.advanceTimersByTimeAsync(SAVE_AFTER_MS);
    expect(save).not.toHaveBeenCalled();
  });

  it('saves what was typed during a save afterwards, on the new version', async () => {
    let answer: (ration: RationView) => void = () => undefined;
    const save = vi.fn<(input: RationSaveInput, version: number) => Promise<RationView>>(
      () => new Promise((resolve) => (answer = resolve)),
    );
    const { saver } = aSaver(save);
    saver.change(typed('460'));
    await vi.advanceTimersByTimeAsync(SAVE_AFTER_MS);
    saver.change(typed('470'));
    answer(aRationView({ version: 4 }));
    await vi.advanceTimersByTimeAsync(SAVE_AFTER_MS);
    expect(save.mock.calls.map(([input, version]) => [input.draft.cattle.bodyWeightKg, version])).toEqual([
      [460, 3],
      [470, 4],
    ]);
  });

  it('holds back text that cannot be read and names the field', async () => {
    const { saver, save } = aSaver();
    saver.change(typed('heavy'));
    await vi.advanceTimersByTimeAsync(SAVE_AFTER_MS);
    expect(save).not.toHaveBeenCalled();
    const state = saver.state();
    expect(state.kind === 'held' && state.faults.map(({ path }) => path)).toEqual(['cattle.bodyWeightKg']);
  });

  it('puts the server’s faults at the fields of the form', async () => {
    const fault = { path: 'draft.lines.0.feedstuffId', message: 'This feedstuff is not in the list' };
    const { saver } = aSaver(vi.fn().mockRejectedValue(refusal(422, [fault])));
    saver.change(typed('460'));
    await vi.advanceTimersByTimeAsync(SAVE_AFTER_MS);
    const state = saver.state();
    expect(state.kind === 'held' && state.faults).toEqual([{ ...fault, path: 'lines.0.feedstuffId' }]);
  });

  it('tries again when the server could not be reached, and loses nothing', async () => {
    const { saver, save } = aSaver();
    save.mockRejectedValueOnce(networkUnreachable());
    saver.change(typed('460'));
    await vi.advanceTimersByTimeAsync(SAVE_AFTER_MS);
    expect(saver.state().kind).toBe('failed');
    await vi.advanceTimersByTimeAsync(RETRY_AFTER_MS);
    expect(saver.state().kind).toBe('saved');
    expect(save.mock.calls.at(-1)?.[0].draft.cattle.bodyWeightKg).toBe(460);
  });
});

describe('saving at once', () => {
  it('answers with the version that then stands', async () => {
    const { saver } = aSaver();
    saver.change(typed('460'));
    await expect(saver.flush()).resolves.toBe(4);
  });

  it('says that it could not', async () => {
    const { saver } = aSaver();
    saver.change(typed('heavy'));
    await expect(saver.flush()).rejects.toThrow(DraftNotSaved);
  });

  it('saves once the text is mended', async () => {
    const { saver } = aSaver();
    saver.change(typed('heavy'));
    await saver.flush().catch(() => undefined);
    saver.change(typed('480'));
    await expect(saver.flush()).resolves.toBe(4);
  });
});

describe('when somebody else saved meanwhile', () => {
  const staleOnce = () => {
    const parts = aSaver();
    parts.save.mockRejectedValueOnce(refusal(412));
    return parts;
  };

  it('puts changes of different parts together and saves them on the newer version', async () => {
    const { saver, save, fetchCurrent, onMerged } = staleOnce();
    fetchCurrent.mockResolvedValue(aRationView({ version: 9, name: 'Renamed' }));
    saver.change(typed('460'));
    await vi.advanceTimersByTimeAsync(2 * SAVE_AFTER_MS);
    expect(onMerged).toHaveBeenCalledExactlyOnceWith(expect.objectContaining({ name: 'Renamed' }), expect.anything());
    expect(save.mock.calls.at(-1)?.[0]).toMatchObject({ name: 'Renamed', draft: { cattle: { bodyWeightKg: 460 } } });
    expect(save.mock.calls.at(-1)?.[1]).toBe(9);
  });

  it('asks when both changed the same figure, and saves what is chosen', async () => {
    const { saver, save, fetchCurrent } = staleOnce();
    const theirs = aDraft({ cattle: { ...opened.draft.cattle, bodyWeightKg: 500 } });
    fetchCurrent.mockResolvedValue(aRationView({ version: 9, draft: theirs }));
    saver.change(typed('460'));
    await vi.advanceTimersByTimeAsync(SAVE_AFTER_MS);
    const state = saver.state();
    expect(state.kind === 'conflict' && state.conflicts.map(({ part }) => part)).toEqual(['cattle.bodyWeightKg']);
    expect(save).toHaveBeenCalledTimes(1);

    saver.resolve(typed('460'));
    await vi.advanceTimersByTimeAsync(0);
    expect(save.mock.calls.at(-1)?.[1]).toBe(9);
    expect(saver.state().kind).toBe('saved');
  });
});
