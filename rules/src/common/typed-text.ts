// Marks that turn the direction of what follows, blanks of no width, and halves of a character: none can be seen, and
// each can make one name look like another. The joiners stay, because scripts need them.
const UNSEEN = /[\u202A-\u202E\u2066-\u2069\u200B\u2060\uFEFF\p{Cs}]/gu;

/** Text of one line: breaks, tabs and other control characters become a blank. */
export const oneLineOf = (text: string): string =>
  text
    .replace(UNSEEN, '')
    .replace(/[\p{Cc}\s]+/gu, ' ')
    .trim();

/** Text of several lines, each ended by a line feed; other control characters are left out. */
export const linesOf = (text: string): string =>
  text
    .replace(UNSEEN, '')
    .replace(/\r\n?/g, '\n')
    .replace(/[^\P{Cc}\n\t]/gu, '')
    .trim();
