import type { AuditEventView } from '@brimgate/rules';

export type Changes = AuditEventView['changes'];

/** One field in the trade's words: what it is called, with its unit, and what its value reads. */
export type FieldWords = { label: string; show: (value: unknown) => string };

/** The fields of a thing in the order they are told. */
export type Vocabulary = readonly { name: string; words: FieldWords }[];

type Values = Readonly<Record<string, unknown>>;

/** What an act says beside its sentence, such as its reason; nothing where nothing was said. */
export function told(label: string, text: string | null): Changes {
  return text === null || text === '' ? [] : [{ field: label, before: null, after: text }];
}

/** What was entered first; what was left open is not listed, nor the name, which stands in the sentence. */
export const entered = (vocabulary: Vocabulary, values: Values): Changes =>
  vocabulary
    .filter(({ name }) => name !== 'name')
    .flatMap(({ name, words }) => (isOpen(values[name]) ? [] : told(words.label, words.show(values[name]))));

/** What reads differently in two states of the same thing, each field once; empty when nothing does. */
export const changesBetween = (vocabulary: Vocabulary, before: Values, after: Values): Changes =>
  vocabulary
    .map(({ name, words }) => ({
      field: words.label,
      before: words.show(before[name]),
      after: words.show(after[name]),
    }))
    .filter((change) => change.before !== change.after);

/** The first eight digits tell contents apart; the whole hash stands with what was signed. */
export const contentOf = (contentHash: string): Changes => told('Content', `${contentHash.slice(0, 8)}…`);

export const isOpen = (value: unknown): boolean => value === null || value === undefined || value === '';
