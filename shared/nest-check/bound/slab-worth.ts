import type { NestSlab } from '@/geometry/nest/types';
import { asRowPart, CLASS_FIT, createRowMeasure, type RowPart } from './row-length';
import { clearOfDefects } from './clear-of-defects';
import type { Offer, SectionBound } from './section-worth';

/** A row of full-depth parts and what it can be worth with a section beside it. */
export interface WorthRow {
  readonly keys: readonly string[];
  readonly worth: number;
}

export interface SlabSearch {
  readonly slab: NestSlab;
  readonly usable: number;
  readonly kerf: number;
  readonly offers: readonly Offer[];
  /** Parts that never belong to one plan. */
  readonly apart: (a: string, b: string) => boolean;
  readonly section: SectionBound;
  readonly nodeLimit: number;
}

/** The most a pattern of the class on this slab can be worth; null when the search is too large. */
export function mostWorth(search: SlabSearch): number | null {
  let most = 0;
  const done = visitRows(
    search,
    () => most,
    (row) => void (most = Math.max(most, row.worth)),
    false,
  );
  return done ? most : null;
}

/** Every row that can be worth more than `above`; null when there are too many. */
export function rowsWorth(search: SlabSearch, above: number, limit: number): WorthRow[] | null {
  const rows: WorthRow[] = [];
  const done = visitRows(
    search,
    () => above,
    (row) => void rows.push(row),
    true,
  );
  return done && rows.length <= limit ? rows : null;
}

/** Goes through the sets of full-depth parts that fit, leaving out those that cannot reach beyond `enough`. */
function visitRows(
  { slab, usable, kerf, offers, apart, section, nodeLimit }: SlabSearch,
  enough: () => number,
  take: (row: WorthRow) => void,
  withWorthless: boolean,
): boolean {
  const measure = createRowMeasure(slab.depth, kerf);
  const full = offers
    .flatMap((o) => {
      const part = Math.abs(o.part.depth - slab.depth) <= CLASS_FIT ? asRowPart(o.part, slab.depth) : null;
      return part && (withWorthless || o.worth > 0) ? [{ part, count: o.count, worth: o.worth }] : [];
    })
    .sort((a, b) => b.worth / (b.part.mid + kerf) - a.worth / (a.part.mid + kerf));
  const whole = section(usable, Infinity);
  let nodes = 0;

  const offerRow = (held: readonly RowPart[], worth: number, length: number): void => {
    const room = held.length > 0 ? usable - length - kerf : usable;
    const beside = room > 0 ? section(room, enough() - worth) : 0;
    if (worth + beside > enough()) take({ keys: held.map((p) => p.key), worth: worth + beside });
  };

  const visit = (from: number, held: readonly RowPart[], worth: number, room: number): void => {
    if (++nodes > nodeLimit) return;
    // A section beside these parts is worth no more than one that has all the room to itself.
    const beside = room > 0 ? Math.min(whole, section(room, Infinity)) : 0;
    for (let i = from; i < full.length; i++) {
      const { part, count, worth: each } = full[i]!;
      if (worth + beside + (Math.max(0, room) * each) / (part.mid + kerf) <= enough()) return;
      if (held.some((h) => apart(h.key, part.key))) continue;
      for (let n = 1; n <= count; n++) {
        const now = [...held, ...new Array<RowPart>(n).fill(part)];
        const length = measure(now);
        if (length > usable + CLASS_FIT || !clearOfDefects(now, slab, (slab.length - usable) / 2, kerf)) break;
        offerRow(now, worth + n * each, length);
        visit(i + 1, now, worth + n * each, room - n * (part.mid + kerf));
      }
    }
  };
  offerRow([], 0, 0);
  visit(0, [], 0, usable + kerf + CLASS_FIT);
  return nodes <= nodeLimit;
}
