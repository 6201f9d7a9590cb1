export type Cell = string | number | null;

/** A spreadsheet takes text that begins so for a formula and runs it. */
const FORMULA = /^[=+\-@\t\r]/;

/**
 * Rows as a CSV file: CRLF at the end of every row, fields quoted where they hold a comma, a quote or a break. Text that
 * a spreadsheet would run as a formula gets an apostrophe in front; numbers stay numbers.
 *
 * @see RFC 4180, section 2
 */
export function writeCsv(header: readonly string[], rows: readonly (readonly Cell[])[]): string {
  return [header, ...rows].map((row) => `${row.map(field).join(',')}\r\n`).join('');
}

function field(cell: Cell): string {
  if (cell === null) return '';
  if (typeof cell === 'number') return Number.isFinite(cell) ? String(Math.round(cell * 1e6) / 1e6) : '';
  const safe = FORMULA.test(cell) ? `'${cell}` : cell;
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}
