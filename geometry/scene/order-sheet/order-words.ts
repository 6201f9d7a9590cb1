import type { OrderLine } from '../../plan/order-list';

/** "3", "6.5 fl oz", "0.8 qt": counted things whole, the rest rounded up to a tenth, since too little stops the work. */
export function quantityWords({ quantity, unit }: Pick<OrderLine, 'quantity' | 'unit'>): string {
  if (unit === 'pcs' || unit === 'discs') return String(Math.ceil(quantity - 1e-9));
  return `${(Math.ceil(quantity * 10 - 1e-9) / 10).toFixed(1)} ${unit}`;
}

/** "$1,247.00", the same in every process whatever its language. */
export function moneyWords(cents: number): string {
  const whole = Math.round(cents);
  const dollars = String(Math.floor(Math.abs(whole) / 100)).replaceAll(/\B(?=(\d{3})+$)/g, ',');
  return `${whole < 0 ? '-' : ''}$${dollars}.${String(Math.abs(whole) % 100).padStart(2, '0')}`;
}
