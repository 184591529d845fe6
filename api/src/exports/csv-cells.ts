export type Cell = string | number | null;

// What a spreadsheet would read as the start of a formula; a text's own apostrophe stays as it is.
const FORMULA_START = /^[=+\-@\t\r\n\0]/;

// Nine figures keep every gram of a yard's year and drop what binary arithmetic leaves behind the ninth.
const SIGNIFICANT_FIGURES = 9;

/**
 * A cell as it goes into the file. Text that a spreadsheet would take for a formula gets an apostrophe; what the
 * program itself knows to be a number stays bare, so that a negative number is still one.
 */
export function csvCell(cell: Cell): string {
  if (cell === null) return '';
  if (typeof cell === 'number') return String(Number(cell.toPrecision(SIGNIFICANT_FIGURES)));
  return FORMULA_START.test(cell) ? `'${cell}` : cell;
}

export const csvRow = (cells: readonly Cell[]): string[] => cells.map(csvCell);
