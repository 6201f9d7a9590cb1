import { useMemo, useRef } from 'react';

import type { Point } from '@/geometry/core/point';
import { dot, length, unit } from '@/geometry/core/vector';
import { inches } from '@/geometry/top/sentence';
import type { EditDraft } from '@/shared/layout/apply-edit';
import type { CanvasDrag } from '../canvas/Canvas';
import { useOpenJob, type OpenJob } from '../editor/JobProvider';
import { moveIsland } from './island-place';
import { wallLength } from './length-checks';
import { choiceOf } from './tops-choice';
import { snapTo } from './tops-targets';

export interface TopsDrag {
  readonly onDragStart: (drag: CanvasDrag) => void;
  readonly onDrag: (drag: CanvasDrag) => void;
  readonly onDragEnd: (drag: CanvasDrag) => void;
  readonly onDragCancel: () => void;
  /** Arrow keys: along the run, by the inches given. */
  readonly nudge: (name: string, by: Point) => void;
}

/** What moves are reckoned from: the tops as they were when the finger came down. */
export type DragStart = Pick<OpenJob, 'layout' | 'plan' | 'drawn' | 'turn'>;

/** An edit with its name, and the place it came to rest at when it snapped. */
export interface TopsMove {
  readonly edit: EditDraft;
  readonly label: string;
  readonly rest?: number;
}

/** ms; just felt. */
const BUZZ = 10;

/** Slides seams and cutouts along their runs and islands over the floor: previewed while the finger moves, one edit when it lifts. */
export function useTopsDrag(): TopsDrag {
  const job = useOpenJob();
  const start = useRef<DragStart | null>(null);
  const rest = useRef<number | undefined>(undefined);
  return useMemo(() => {
    const { store, run } = job;
    const slide = (drag: CanvasDrag) => topsMove(start.current ?? job, drag.target, drag.by, true);
    const drop = () => {
      start.current = null;
      rest.current = undefined;
      store.getState().showPreview(null);
    };
    return {
      onDragStart: () => {
        start.current = job;
      },
      onDrag: (drag) => {
        const move = slide(drag);
        if (move?.rest !== undefined && move.rest !== rest.current) navigator.vibrate?.(BUZZ);
        rest.current = move?.rest;
        store.getState().showPreview(move ? [move.edit] : null);
      },
      onDragEnd: (drag) => {
        const move = slide(drag);
        drop();
        if (move) run(move.edit, move.label);
      },
      onDragCancel: drop,
      nudge: (name, by) => {
        const move = topsMove(job, name, by, false);
        if (move) run(move.edit, move.label);
      },
    };
  }, [job]);
}

/**
 * The edit that moves a seam, a cutout or an island by a distance on the drawing; null where nothing moves.
 *
 * @param from - the tops before the move
 * @param snap - comes to rest at middles and sides of bases and cutouts, else exactly there
 */
export function topsMove(from: DragStart, name: string, by: Point, snap: boolean): TopsMove | null {
  const { drawn, layout } = from;
  const choice = choiceOf(drawn, layout, name);
  if (choice?.kind === 'piece') {
    const on = drawn.pieces.find((piece) => piece.letter === choice.letter)?.on;
    const island = on !== undefined && layout.islands.some((i) => i.id === on);
    return island ? moveIsland(layout, from.plan, from.turn, on, by) : null;
  }
  if (choice?.kind === 'cutout') {
    const cutout = layout.cutouts.find((c) => c.id === choice.id);
    const way = cutout && wayAlong(from, cutout.on, by, snap);
    if (!cutout || way === null || way === undefined) return null;
    const wanted = cutout.centre + way;
    const places = baseCentres(from, cutout.on);
    const centre = snap ? snapTo(wanted, places) : wanted;
    return {
      edit: { kind: 'changeItem', section: 'cutouts', item: cutout.id, change: { centre } },
      label: `${cutout.kind} at ${inches(centre, layout.step)}`,
      ...(snap && places.includes(centre) ? { rest: centre } : {}),
    };
  }
  return choice?.kind === 'seam' ? seamMove(from, choice.letters, by, snap) : null;
}

function seamMove(from: DragStart, letters: readonly [string, string], by: Point, snap: boolean): TopsMove | null {
  const { drawn, layout } = from;
  const seam = drawn.seams.find((s) => s.letters.join() === letters.join());
  const way = seam && !seam.edge ? wayAlong(from, seam.on, by, snap) : null;
  if (!seam || way === null) return null;
  const pinned = layout.seams.find((p) => p.on === seam.on && Math.abs(p.at - seam.at) < 1 / 64);
  const wanted = Math.max(0, (pinned?.at ?? seam.at) + way);
  const places = seamPlaces(from, seam.on);
  const at = snap ? snapTo(wanted, places) : wanted;
  const { edit, label } = seamEdit(pinned?.at ?? null, seam.on, at, inches(at, layout.step));
  return { edit, label, ...(snap && places.includes(at) ? { rest: at } : {}) };
}

/** Pins a seam somewhere, or moves the pin it has. */
export function seamEdit(pinned: number | null, on: string, at: number, words: string) {
  const edit: EditDraft = pinned === null ? { kind: 'pinSeam', on, at } : { kind: 'moveSeam', on, from: pinned, at };
  return { edit, label: `seam at ${words}` };
}

/** Inches along a run that a move on the drawing means. A key goes its whole step along the run, or nowhere across it. */
function wayAlong({ drawn }: DragStart, on: string, by: Point, dragged: boolean): number | null {
  const run = drawn.tops.runs.find((r) => r.id === on);
  const piece = drawn.pieces.find((p) => p.on === on);
  const direction = run ? run.back.direction : piece && unit([0, 0], piece.grain);
  if (!direction) return null;
  const way = dot(by, direction);
  if (dragged) return way;
  const step = length(by);
  return Math.abs(way) > step / 2 ? Math.sign(way) * step : null;
}

/** What stands under a run, from and to, inches along its wall; windows and pipes stand over it. */
function basesUnder({ layout, plan }: DragStart, on: string): (readonly [number, number])[] {
  const wall = layout.runs.find((r) => r.id === on)?.wall;
  const end = wall === undefined ? 0 : (wallLength(plan, wall) ?? 0);
  return layout.bases
    .filter((base) => base.wall === wall && base.kind !== 'window' && base.kind !== 'pipe')
    .map((base) => [base.from, base.to === 'end' ? end : base.to] as const);
}

/** Middles of the cabinets under a run, and of the windows over it: a sink likes to sit under one. */
function baseCentres(from: DragStart, on: string): number[] {
  const wall = from.layout.runs.find((r) => r.id === on)?.wall;
  const windows = from.layout.bases.flatMap((base) =>
    base.wall === wall && base.kind === 'window' && base.to !== 'end' ? [(base.from + base.to) / 2] : [],
  );
  return [...basesUnder(from, on).map(([a, b]) => (a + b) / 2), ...windows];
}

/** Where a seam likes to rest: the middle and the sides of a cutout, and cabinet joints. */
function seamPlaces(from: DragStart, on: string): number[] {
  const cutouts = from.layout.cutouts.filter((c) => c.on === on);
  return [
    ...cutouts.flatMap((c) => [c.centre, c.centre - c.width / 2, c.centre + c.width / 2]),
    ...basesUnder(from, on).flat(),
  ];
}
