import type { RowEntry } from '../row/row-gaps';

/** A band of a section, ripped to `depth` and then crosscut into its entries; a shallower entry is ripped once more by itself. */
export interface Lane {
  readonly depth: number;
  readonly entries: readonly RowEntry[];
}

/** A square-ended piece of the slab's full depth that is ripped into lanes, front lane first. */
export interface Section {
  readonly length: number;
  readonly lanes: readonly Lane[];
}

export type Slot = RowEntry | Section;

/** What is cut from one slab, left to right, as tight to the left as kerf and defects allow. */
export interface Pattern {
  readonly stock: number;
  readonly slots: readonly Slot[];
}

export const isSection = (slot: Slot): slot is Section => 'lanes' in slot;

/** Items a pattern cuts, one entry for each copy. */
export function patternItems(pattern: Pattern): number[] {
  return pattern.slots.flatMap((slot) =>
    isSection(slot) ? slot.lanes.flatMap((lane) => lane.entries.map((e) => e.item)) : [slot.item],
  );
}
