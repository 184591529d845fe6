// Every control character: a line break in an address or a subject would begin a header of its own.
const CONTROL = /\p{Cc}/u;

export class LineBreakRefused extends Error {
  constructor(what: string) {
    super(`The ${what} holds a line break or another control character and was refused`);
    this.name = 'LineBreakRefused';
  }
}

/** Hands a header's text on, refusing what would reach beyond its line. */
export function oneLine(what: string, text: string): string {
  if (CONTROL.test(text)) throw new LineBreakRefused(what);
  return text;
}
