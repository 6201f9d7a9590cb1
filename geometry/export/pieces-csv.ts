import type { Layout } from '../core/layout';
import type { Plan } from '../plan/types';
import { formatLength } from '../tape/format-length';
import { writeCsv } from './write-csv';

const HEADER = [
  'Letter', 'Kind', 'On', 'Count', 'Species', 'Thickness in', 'Depth in', 'Back in', 'Front in', 'Back as taped', 'Front as taped',
  'Left end', 'Left angle deg', 'Right end', 'Right angle deg', 'Finished edges', 'Cutouts', 'Area sq in', 'Weight lb', 'Slab',
]; // prettier-ignore

/** Every piece as a row: sizes in decimal inches to a millionth, and as a tape reads them in the job's own step. */
export function piecesCsv(plan: Plan, layout: Layout): string {
  const rows = plan.pieces.map((piece) => [
    piece.letter,
    piece.kind,
    piece.on,
    piece.count,
    layout.material.species,
    piece.thickness,
    piece.depth,
    piece.back,
    piece.front,
    formatLength(piece.back, layout.step),
    formatLength(piece.front, layout.step),
    piece.left.kind,
    piece.left.angle,
    piece.right.kind,
    piece.right.angle,
    piece.finishedEdges.join(' '),
    piece.cutouts.map((cutout) => cutout.id).join(' '),
    piece.netArea,
    piece.weight,
    slabsOf(plan, piece.letter),
  ]);
  return writeCsv(HEADER, rows);
}

/** "1 (HM-120)": number of the slab in the plan and its stock; more than one for pieces that are cut several times. */
function slabsOf(plan: Plan, letter: string): string {
  const on = (plan.nest?.slabs ?? []).flatMap((slab, i) =>
    slab.parts.some((part) => part.id === letter) ? [`${i + 1} (${slab.stock})`] : [],
  );
  return on.join(' ');
}
