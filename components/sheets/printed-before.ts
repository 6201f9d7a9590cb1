import type { SheetPrint } from '@/shared/contracts/sheet-acts';

/** The newest print of a revision older than the newest one: paper that has to go. Null where there is none. */
export function printedBefore(prints: readonly SheetPrint[], newest: number | null): SheetPrint | null {
  if (newest === null) return null;
  const old = prints.filter((print) => print.revision < newest);
  return old.reduce<SheetPrint | null>((best, print) => (best && best.revision >= print.revision ? best : print), null);
}
