/** Laid out as a grid on a phone a browser may forget that the sheet is a table: the roles say so again. */
export const sheetRole = (role: 'table' | 'rowgroup' | 'row' | 'columnheader' | 'rowheader' | 'cell') => ({ role });
