import { addsToHundred, sumOfShares } from '@brimgate/rules';
import { typedNumber } from '../../lib/form/judged';

export interface NamedFeedstuff {
  id: string;
  name: string;
}

export interface PastedRow {
  /** Counted from 1, as a spreadsheet does. */
  rowNumber: number;
  text: string;
  line: { feedstuffId: string; feedstuffName: string; sharePctDm: number } | null;
  fault: string | null;
}

export interface PastedBlock {
  rows: PastedRow[];
  /** The heading row that was left out, as it stood. */
  heading: string | null;
  /** Something that holds for the whole block, such as shares that look like fractions of 1. */
  note: string | null;
}

/** Spreadsheets copy with tabs; lists are also written with semicolons, or the share simply stands last. */
function cellsOf(row: string): [string, string] {
  const separator = row.includes('\t') ? '\t' : row.includes(';') ? ';' : null;
  if (separator) {
    const [name = '', share = ''] = row.split(separator).map((cell) => cell.trim());
    return [name, share];
  }
  const match = /^(.*\S)\s+(\S+)$/.exec(row.trim().replace(/\s*%$/, ''));
  return match ? [match[1] ?? '', match[2] ?? ''] : [row.trim(), ''];
}

const plain = (name: string) =>
  name
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim();

function matching(name: string, feedstuffs: readonly NamedFeedstuff[]): NamedFeedstuff[] {
  const wanted = plain(name);
  if (wanted === '') return [];
  const exact = feedstuffs.filter((feedstuff) => plain(feedstuff.name) === wanted);
  if (exact.length > 0) return exact;
  const words = wanted.split(' ');
  return feedstuffs.filter((feedstuff) => {
    const known = plain(feedstuff.name).split(' ');
    return words.every((word) => known.includes(word));
  });
}

function nameFault(name: string, matches: readonly NamedFeedstuff[]): string | null {
  if (name === '') return 'The feedstuff is missing';
  if (matches.length === 0) return `No feedstuff is named “${name}”: use the name of the feedstuff list`;
  if (matches.length === 1) return null;
  const names = matches.slice(0, 3).map((match) => match.name);
  const more = matches.length > names.length ? ` and ${matches.length - names.length} more` : '';
  return `“${name}” could be ${names.join(', or ')}${more}: write the full name`;
}

function shareFault(text: string, share: number | string | undefined): string | null {
  if (share === undefined) return 'The share is missing';
  if (typeof share === 'string') return `“${text}” is not a number`;
  if (share < 0) return 'A share cannot be below 0';
  if (share > 100) return 'A share cannot be above 100';
  return null;
}

function pastedRow(text: string, rowNumber: number, feedstuffs: readonly NamedFeedstuff[]): PastedRow {
  const [name, shareText] = cellsOf(text);
  const matches = matching(name, feedstuffs);
  const share = typedNumber(shareText.replace(/\s*%$/, ''));
  const faults = [nameFault(name, matches), shareFault(shareText, share)].filter((fault) => fault !== null);
  const feedstuff = matches[0];
  if (faults.length > 0 || !feedstuff || typeof share !== 'number') {
    return { rowNumber, text, line: null, fault: faults.join('. ') };
  }
  return {
    rowNumber,
    text,
    line: { feedstuffId: feedstuff.id, feedstuffName: feedstuff.name, sharePctDm: share },
    fault: null,
  };
}

const isHeading = (row: string, feedstuffs: readonly NamedFeedstuff[]): boolean => {
  const [name, share] = cellsOf(row);
  return typeof typedNumber(share.replace(/\s*%$/, '')) !== 'number' && matching(name, feedstuffs).length === 0;
};

/** Reads two columns copied from a spreadsheet, feedstuff and share of dry matter, and says of each row what is wrong. */
export function pastedBlock(text: string, feedstuffs: readonly NamedFeedstuff[]): PastedBlock {
  const numbered = text
    .split(/\r\n|\r|\n/)
    .map((row, index) => ({ row, rowNumber: index + 1 }))
    .filter(({ row }) => row.trim() !== '');
  const first = numbered[0];
  const hasHeading = numbered.length > 1 && first !== undefined && isHeading(first.row, feedstuffs);
  const body = hasHeading ? numbered.slice(1) : numbered;
  const rows = body.map(({ row, rowNumber }) => pastedRow(row, rowNumber, feedstuffs));
  return { rows, heading: hasHeading ? first.row.trim() : null, note: fractionNote(rows) };
}

function fractionNote(rows: readonly PastedRow[]): string | null {
  const shares = rows.flatMap((row) => (row.line ? [row.line.sharePctDm] : []));
  const looksLikeFractions = shares.length > 1 && addsToHundred([sumOfShares(shares) * 100]);
  return looksLikeFractions
    ? 'These shares add to 1: they look like fractions. Shares are per cent and add to 100.'
    : null;
}
