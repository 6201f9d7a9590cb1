import type { BenchRow } from './bench-row';

const HEADS = ['', 'value', 'unit', 'against', 'value', 'ratio'] as const;
/** Columns of numbers, set flush right. */
const NUMBERS = new Set([1, 4, 5]);

/** The rows as one table for a terminal; a bare number has no ratio. */
export function benchTable(rows: readonly BenchRow[]): string {
  const lines = [HEADS, ...rows.map(cells)];
  const widths = HEADS.map((_, column) => Math.max(...lines.map((line) => line[column]!.length)));
  return lines
    .map((line) =>
      line
        .map((cell, column) => (NUMBERS.has(column) ? cell.padStart(widths[column]!) : cell.padEnd(widths[column]!)))
        .join('  ')
        .trimEnd(),
    )
    .join('\n');
}

function cells({ name, value, unit, against, ratio }: BenchRow): string[] {
  return [
    name,
    significant(value),
    unit,
    against?.name ?? '',
    against ? significant(against.value) : '',
    ratio === null ? '' : ratio.toFixed(2),
  ];
}

/** Three significant digits, more only before the point. */
function significant(value: number): string {
  if (value === 0) return '0';
  const decimals = 2 - Math.floor(Math.log10(Math.abs(value)));
  return value.toFixed(Math.min(6, Math.max(0, decimals)));
}
