import type { Cell } from './worksheet';

/** A text a spreadsheet would run as a formula, or could after trimming. */
const FORMULA = /^[\s]*[=+\-@\t\r\0]/;

function cellOf(cell: Cell): string {
  if (typeof cell === 'number') return String(cell);
  const text = FORMULA.test(cell) ? `'${cell}` : cell;
  return /[",\r\n']/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}

/** Rows as CSV by RFC 4180. A text that a spreadsheet would take for a formula gets an apostrophe before it; numbers stay numbers. */
export const csvOf = (rows: Cell[][]) => rows.map((row) => `${row.map(cellOf).join(',')}\r\n`).join('');
