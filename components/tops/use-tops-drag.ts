import { useMemo } from 'react';

import type { Point } from '@/geometry/core/point';
import { dot, unit } from '@/geometry/core/vector';
import type { EditDraft } from '@/shared/layout/apply-edit';
import { inches } from '@/geometry/top/sentence';
import type { CanvasDrag } from '../canvas/Canvas';
import { useOpenJob, type OpenJob } from '../editor/JobProvider';
import { choiceOf, snapTo } from './tops-targets';

export interface TopsDrag {
  readonly onDrag: (drag: CanvasDrag) => void;
  readonly onDragEnd: (drag: CanvasDrag) => void;
  readonly onDragCancel: () => void;
  /** Arrow keys: along the run, by the inches given. */
  readonly nudge: (name: string, by: Point) => void;
}

/** Slides seams and cutouts along their runs: previewed while the finger moves, one edit when it lifts. */
export function useTopsDrag(): TopsDrag {
  const job = useOpenJob();
  return useMemo(() => {
    const { store, run } = job;
    // The plan under a drag is the preview's; positions always start from the stored layout.
    const slide = (drag: CanvasDrag) => moveEdit(job, drag.target, drag.by, true);
    return {
      onDrag: (drag) => {
        const move = slide(drag);
        store.getState().showPreview(move ? [move.edit] : null);
      },
      onDragEnd: (drag) => {
        const move = slide(drag);
        store.getState().showPreview(null);
        if (move) run(move.edit, move.label);
      },
      onDragCancel: () => store.getState().showPreview(null),
      nudge: (name, by) => {
        const move = moveEdit(job, name, by, false);
        if (move) run(move.edit, move.label);
      },
    };
  }, [job]);
}

/** The edit that moves a seam or a cutout by a distance on the drawing. */
function moveEdit(
  job: OpenJob,
  name: string,
  by: Point,
  snap: boolean,
): { readonly edit: EditDraft; readonly label: string } | null {
  const { drawn, store } = job;
  const layout = store.getState().layout;
  const choice = choiceOf(drawn, name);
  if (choice?.kind === 'cutout') {
    const cutout = layout.cutouts.find((c) => c.id === choice.id);
    const along = cutout && directionOf(job, cutout.on);
    if (!cutout || !along) return null;
    const wanted = cutout.centre + dot(by, along);
    const centre = snap ? snapTo(wanted, basesCentres(job, cutout.on)) : wanted;
    return {
      edit: { kind: 'changeItem', section: 'cutouts', item: cutout.id, change: { centre } },
      label: `${cutout.kind} at ${inches(centre, layout.step)}`,
    };
  }
  if (choice?.kind !== 'seam') return null;
  const seam = drawn.seams.find((s) => s.letters.join() === choice.letters.join());
  const along = seam && directionOf(job, seam.on);
  if (!seam || !along) return null;
  const pinned = layout.seams.find((p) => p.on === seam.on && Math.abs(p.at - seam.at) < 1 / 64);
  const from = pinned?.at ?? seam.at;
  const at = snap ? snapTo(from + dot(by, along), seamPlaces(job, seam.on)) : from + dot(by, along);
  return seamEdit(pinned?.at ?? null, seam.on, at, inches(at, layout.step));
}

/** Pins a seam somewhere, or moves the pin it has. */
export function seamEdit(pinned: number | null, on: string, at: number, words: string) {
  const edit: EditDraft = pinned === null ? { kind: 'pinSeam', on, at } : { kind: 'moveSeam', on, from: pinned, at };
  return { edit, label: `seam at ${words}` };
}

/** Direction along a run on the drawing, left to right. */
function directionOf({ drawn }: OpenJob, on: string): Point | null {
  const run = drawn.tops.runs.find((r) => r.id === on);
  if (run) return run.back.direction;
  const piece = drawn.pieces.find((p) => p.on === on);
  return piece ? unit([0, 0], piece.grain) : null;
}

/** Middles of sink bases and of all other cabinets under a run. */
function basesCentres({ layout, plan }: OpenJob, on: string): number[] {
  const run = layout.runs.find((r) => r.id === on);
  const length = plan.room?.walls.find((w) => w.id === run?.wall)?.adjusted ?? 0;
  return layout.bases
    .filter((base) => base.wall === run?.wall && base.kind !== 'window' && base.kind !== 'pipe')
    .map((base) => (base.from + (base.to === 'end' ? length : base.to)) / 2);
}

/** Where a seam likes to rest: the middle and the sides of a cutout, and cabinet joints. */
function seamPlaces({ layout, plan }: OpenJob, on: string): number[] {
  const cutouts = layout.cutouts.filter((c) => c.on === on);
  const run = layout.runs.find((r) => r.id === on);
  const length = plan.room?.walls.find((w) => w.id === run?.wall)?.adjusted ?? 0;
  const bases = layout.bases.filter((base) => base.wall === run?.wall && base.kind !== 'window');
  return [
    ...cutouts.flatMap((c) => [c.centre, c.centre - c.width / 2, c.centre + c.width / 2]),
    ...bases.flatMap((base) => [base.from, base.to === 'end' ? length : base.to]),
  ];
}
