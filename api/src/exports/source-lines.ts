import { sources } from '@brimgate/reference-tables';

/** Documents as a footer cites them: title, publisher, year; each once. */
export function sourceLines(ids: readonly string[]): string[] {
  return [...new Set(ids)].flatMap((id) => {
    const source = sources[id];
    if (!source) return [];
    // What rests on no document has no publisher either.
    const parts = [source.title, source.publisher, source.year];
    return [parts.filter((part) => part !== null && part !== 'none').join(', ')];
  });
}
