import type { Layout } from '../../core/layout';
import type { Plan } from '../../plan/types';
import { formatLength } from '../../tape/format-length';
import { keptOffcuts } from '../slab/offcut-labels';
import { placeSlab, type PlacedSlab } from '../slab/placed-slab';

/** What stands on one label. */
export interface LabelFacts {
  /** "Q" or, of an offcut, "Rack". */
  readonly letter: string;
  readonly offcut: boolean;
  readonly size: string;
  /** Each at most a short line, the most needed first. */
  readonly lines: readonly string[];
}

/** Labels of all pieces, as many of each as there are alike, then of the offcuts that are kept. */
export function labelFacts(plan: Plan, layout: Layout, jobNumber: string): readonly LabelFacts[] {
  const slabs = (plan.nest?.slabs ?? []).map((_, i) => placeSlab(plan, layout, i));
  const pieces = plan.pieces.flatMap((piece) => {
    const places = slabs.flatMap((slab) => slab.pieces.filter((p) => p.letter === piece.letter).map((placed) => ({ slab, placed }))); // prettier-ignore
    return Array.from({ length: piece.count }, (_, i): LabelFacts => {
      const place = places[i];
      const number = piece.count > 1 ? `, ${i + 1} of ${piece.count}` : '';
      const cutLines = place
        ? [place.placed.faceDown ? 'Cut face DOWN' : 'Cut face up', `${place.slab.name}${number}`]
        : [`${plan.nest ? 'From other stock' : 'Not on a slab yet'}${number}`];
      return {
        letter: piece.letter,
        offcut: false,
        size: sizeOf([piece.thickness, piece.depth, Math.max(piece.back, piece.front)], layout),
        lines: [...cutLines, `${layout.material.species}, ${Math.ceil(piece.weight)} lb`],
      };
    });
  });
  return [...pieces, ...slabs.flatMap((slab) => offcutFacts(slab, layout, jobNumber))];
}

function offcutFacts(slab: PlacedSlab, layout: Layout, jobNumber: string): LabelFacts[] {
  return keptOffcuts(slab, jobNumber).map(({ offcut, label }) => ({
    letter: 'Rack',
    offcut: true,
    size: sizeOf([slab.thickness, offcut.depth, offcut.length], layout),
    lines: [
      `Offcut ${label}`,
      slab.bothFaces ? 'both faces good' : 'one good face',
      `${slab.species}, from ${slab.name}`,
    ],
  }));
}

/** Thickness, depth, length: "1 1/2 × 25 × 96 1/4 in". */
function sizeOf(inches: readonly number[], { step }: Layout): string {
  const words = inches.map((inch) => formatLength(inch, step).replace(/ mm$/, ''));
  return `${words.join(' × ')} ${step.endsWith('mm') ? 'mm' : 'in'}`;
}
