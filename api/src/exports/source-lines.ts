import { sources } from '@brimgate/reference-tables';

/** Documents as a footer cites them: title, publisher, year; each once. */
export function sourceLines(ids: readonly string[]): string[] {
  return [...new Set(ids)].flatMap((id) => {
    const source = sources[id];
    if (!source) return [];
    return [[source.title, source.publisher, source.year].filter((part) => part !== null).join(', ')];
  });
}
