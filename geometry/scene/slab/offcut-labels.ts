import type { PlacedSlab } from './placed-slab';

/** Offcuts of a slab that go back on the rack, with the names they get there: "0142-2", "0142-2a" where there are more. */
export function keptOffcuts(slab: PlacedSlab, jobNumber: string) {
  const kept = slab.offcuts.filter((offcut) => offcut.keep);
  const name = `${jobNumber}-${slab.index + 1}`;
  return kept.map((offcut, i) => ({
    offcut,
    label: kept.length > 1 ? `${name}${String.fromCharCode(97 + i)}` : name,
  }));
}
