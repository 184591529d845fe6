/**
 * A composition's label with the room of one short line: "book", "analysed 21 May 2026", "analysed, rest not determined".
 * That the rest is not known is never cut off; which book stands in for it is told on the feedstuff's page.
 */
export function shortComposition(label: string): string {
  if (label === 'book values') return 'book';
  return label
    .replace(/^as analysed/, 'analysed')
    .replace(/, else book values.*$/, '')
    .replace(/; the rest is not determined$/, ', rest not determined');
}
