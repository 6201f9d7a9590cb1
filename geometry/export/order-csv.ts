import { orderTotalCents, type OrderLine } from '../plan/order-list';
import { writeCsv } from './write-csv';

/**
 * The order as a CSV file, a row for each thing.
 *
 * @param prices - false leaves the money out, for people who may not see it
 */
export function orderCsv(lines: readonly OrderLine[], prices: boolean): string {
  const header = ['Group', 'Item', 'Size', 'Quantity', 'Unit', 'Note'];
  const rows = lines.map(({ group, item, size, quantity, unit, note }) => [
    group,
    item,
    size,
    rounded(quantity),
    unit,
    note,
  ]);
  if (!prices) return writeCsv(header, rows);
  const priced = rows.map((row, i) => {
    const { eachCents, quantity } = lines[i]!;
    return [...row, money(eachCents), money(eachCents === null ? null : eachCents * quantity)];
  });
  const total = ['Total', 'Priced lines', '', null, '', '', null, money(orderTotalCents(lines))];
  return writeCsv([...header, 'Each', 'Sum'], [...priced, total]);
}

/** Hundredths of a quart or an ounce are as fine as anybody pours. */
const rounded = (quantity: number): number => Math.round(quantity * 100) / 100;

const money = (cents: number | null): number | null => (cents === null ? null : cents / 100);
