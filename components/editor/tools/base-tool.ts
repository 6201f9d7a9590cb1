import type { Base, Layout } from '@/geometry/core/layout';
import type { Point } from '@/geometry/core/point';
import { baseEnd, BASE_LOOK, basePlaceProblem, onFloor } from '../../room/base-words';
import { inches } from '@/geometry/top/sentence';
import type { OnWall, ToolEvent, ToolStep } from './tool';

/** Nothing is remembered between events: every drag comes with the way it has gone. */
export type BaseState = null;

/** Inches within which an edge is drawn to another edge. */
const CATCH = 1.5;
const TIDY = 1 / 16;

/**
 * Dragging what stands along a wall. Targets: `base b1` moves it, `base b1 left` and `base b1 right` its edges. The place on
 * the wall comes with the event; only the way along the wall counts.
 *
 * @param alongBy - inches along the wall that the finger has come, left to right
 */
export function stepBase(
  event: ToolEvent & { readonly kind: 'drag' | 'drop' | 'nudge' },
  layout: Layout,
  wall: Pick<OnWall, 'length'>,
  alongBy: number,
): ToolStep<BaseState, Base> {
  const base = baseOf(layout, event.target);
  if (!base) return { state: null, preview: null };
  const part = partOf(event.target);
  const snap = event.kind !== 'nudge';
  const moved =
    part === null
      ? shifted(base, layout, wall.length, alongBy, snap)
      : resized(base, part, layout, wall.length, alongBy, snap);
  if (event.kind === 'drag') return { state: null, preview: moved };
  const problem = basePlaceProblem(moved, layout.bases, wall.length, (value) => inches(value, layout.step));
  if (problem) return { state: null, preview: null, refusal: problem };
  if (moved.from === base.from && moved.to === base.to) return { state: null, preview: null };
  const name = BASE_LOOK[base.kind].name.toLowerCase();
  return {
    state: null,
    preview: null,
    edit: {
      edit: { kind: 'changeItem', section: 'bases', item: base.id, change: { from: moved.from, to: moved.to } },
      label: `${name} at ${inches(moved.from, layout.step)}`,
    },
  };
}

export const baseOf = (layout: Layout, target: string): Base | null => {
  const id = /^base (.+?)( left| right)?$/.exec(target)?.[1];
  return layout.bases.find((base) => base.id === id) ?? null;
};

const partOf = (target: string): 'left' | 'right' | null =>
  target.endsWith(' left') ? 'left' : target.endsWith(' right') ? 'right' : null;

const tidy = (value: number): number => Math.round(value / TIDY) * TIDY;

function shifted(base: Base, layout: Layout, length: number, by: number, snap: boolean): Base {
  const end = baseEnd(base, length);
  const width = end - base.from;
  const wanted = Math.min(Math.max(0, base.from + by), Math.max(0, length - width));
  const places = snap
    ? [...edgesFor(base, layout, length), ...middlesFor(base, layout, length).map((m) => m - width / 2)]
    : [];
  const ends = snap ? edgesFor(base, layout, length).map((edge) => edge - width) : [];
  const from = Math.max(0, caught(wanted, [...places, ...ends]));
  return { ...base, from: tidy(from), to: tidy(from) + width };
}

function resized(base: Base, part: 'left' | 'right', layout: Layout, length: number, by: number, snap: boolean): Base {
  const end = baseEnd(base, length);
  const edges = snap ? edgesFor(base, layout, length) : [];
  if (part === 'left') {
    const from = caught(Math.min(end - 1, Math.max(0, base.from + by)), edges);
    return { ...base, from: Math.min(end - 1, tidy(from)) };
  }
  const to = caught(Math.max(base.from + 1, Math.min(length, end + by)), edges);
  return { ...base, to: Math.max(base.from + 1, tidy(to)) };
}

/** Where an edge likes to rest: the wall's ends and the edges of what stands there already. */
function edgesFor(base: Base, layout: Layout, length: number): number[] {
  const others = layout.bases.filter((b) => b.wall === base.wall && b.id !== base.id);
  return [0, length, ...others.flatMap((b) => [b.from, baseEnd(b, length)])];
}

/** A window is centred over a sink, a sink under a window. */
function middlesFor(base: Base, layout: Layout, length: number): number[] {
  const other = onFloor(base) ? 'window' : 'sink base';
  return layout.bases
    .filter((b) => b.wall === base.wall && b.kind === other)
    .map((b) => (b.from + baseEnd(b, length)) / 2);
}

function caught(wanted: number, places: readonly number[]): number {
  const nearest = places.reduce(
    (best, place) => (Math.abs(place - wanted) < Math.abs(best - wanted) ? place : best),
    Infinity,
  );
  return Math.abs(nearest - wanted) <= CATCH ? nearest : wanted;
}

/** How far along a wall a drag has gone, inches. */
export const alongOf = (direction: Point, from: Point, to: Point): number =>
  (to[0] - from[0]) * direction[0] + (to[1] - from[1]) * direction[1];
