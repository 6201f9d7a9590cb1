import type { Base, Layout, Mark } from '@/geometry/core/layout';
import type { Point } from '@/geometry/core/point';
import { along as pointAlong, distance, rightNormal, unit } from '@/geometry/core/vector';
import { measureRoom } from '@/geometry/plan/lay-room';
import type { Plan } from '@/geometry/plan/types';
import type { Scene } from '@/geometry/scene/display-list';
import { turnPlan } from '@/geometry/scene/turn-plan';
import { spokenLength } from '@/geometry/tape/format-length';
import type { CanvasTarget } from '../canvas/Canvas';
import { BASE_LOOK, baseEnd } from './base-words';
import { observationOf, targetName, walkOf } from './tape-walk';

/** px a blade and a badge take on the drawing, with room for a finger. */
const BLADE = { width: 104, height: 44 };
const BADGE = { width: 80, height: 60 };

/** Everything on the room's drawing that can be touched, in the order of the tape walk. */
export function roomTargets(plan: Plan, layout: Layout, scene: Scene, chosen: string | null = null): CanvasTarget[] {
  const fit = plan.room;
  if (!fit) return [];
  const targets: CanvasTarget[] = [];
  for (const target of walkOf(layout, null)) {
    const id = observationOf(target);
    const name = spokenTarget(plan, layout, id, targetName(layout, target));
    if (target.kind === 'wall') {
      const ends = wallEnds(plan, target.wall);
      if (ends) targets.push({ id, name, shape: { kind: 'segment', from: ends[0], to: ends[1] } });
    } else if (target.kind === 'tie') {
      const from = markPoint(plan, target.from);
      const to = markPoint(plan, target.to);
      if (from && to) targets.push({ id, name, shape: { kind: 'segment', from, to }, rank: -1 });
    } else {
      const corner = cornerPoint(plan, target.between);
      if (corner) targets.push({ id, name, shape: { kind: 'point', at: corner }, rank: 1 });
    }
  }
  return [...targets, ...baseTargets(plan, layout, chosen), ...labelTargets(scene)];
}

/** What stands along the walls; it can be dragged, and the one that is open for change has both its edges. */
function baseTargets(plan: Plan, layout: Layout, chosen: string | null): CanvasTarget[] {
  return layout.bases.flatMap((base): CanvasTarget[] => {
    const place = basePlace(plan, base);
    if (!place) return [];
    const { outline, left, right } = place;
    const id = `base ${base.id}`;
    const name = `${BASE_LOOK[base.kind].name} on wall ${base.wall}, ${spokenLength(place.width, layout.step)} wide, at ${spokenLength(base.from, layout.step)}`;
    const body: CanvasTarget = { id, name, shape: { kind: 'area', outline }, rank: -2, draggable: true };
    if (base.id !== chosen) return [body];
    const edge = (part: 'left' | 'right', at: Point): CanvasTarget => ({
      id: `${id} ${part}`,
      name: `${part === 'left' ? 'Left' : 'Right'} edge of the ${BASE_LOOK[base.kind].name.toLowerCase()}`,
      shape: { kind: 'point', at },
      rank: 4,
      draggable: true,
    });
    return [{ ...body, rank: 3 }, edge('left', left), edge('right', right)];
  });
}

/** Depth, inches, at which something flat such as a window can be touched on either side of its wall. */
const FLAT = 5;

/** Where a base stands on the drawing: its outline and the middles of its two edges. */
export function basePlace(
  plan: Plan,
  base: Base,
): {
  readonly outline: readonly Point[];
  readonly left: Point;
  readonly right: Point;
  readonly width: number;
  readonly along: Point;
} | null {
  const ends = wallEnds(plan, base.wall);
  const along = ends && unit(...ends);
  if (!along) return null;
  const inward = rightNormal(along);
  const to = baseEnd(base, distance(...ends));
  const near = base.depth > 0 ? 0 : -FLAT;
  const far = base.depth > 0 ? base.depth : FLAT / 2;
  const at = (x: number, y: number): Point => pointAlong(pointAlong(ends[0], along, x), inward, y);
  return {
    outline: [at(base.from, near), at(base.from, far), at(to, far), at(to, near)],
    left: at(base.from, (near + far) / 2),
    right: at(to, (near + far) / 2),
    width: to - base.from,
    along,
  };
}

/**
 * Something to draw while the readings contradict each other: the room as it was sketched. The readings stay on it, and the
 * fit report says what is wrong.
 */
export function drawable(drawn: Plan, layout: Layout, turn: number): Plan {
  if (drawn.room || layout.room.walls.length === 0) return drawn;
  const { room } = layout;
  const bare = {
    ...room,
    walls: room.walls.map((wall) => ({ ...wall, length: [] })),
    corners: room.corners.map(({ between, nominal }) => ({ between, nominal })),
    ties: [],
    trust: [],
    ignore: [],
  };
  return turnPlan({ ...drawn, room: measureRoom(bare).fit }, turn);
}

/** Blades and badges stand off the wall by px; they are second hit areas of what they belong to. */
function labelTargets(scene: Scene): CanvasTarget[] {
  return scene.items.flatMap((item): CanvasTarget[] => {
    if ((item.kind !== 'blade' && item.kind !== 'badge') || !item.id) return [];
    const size = item.kind === 'blade' ? BLADE : BADGE;
    const turn = item.kind === 'blade' ? item.turn : 0;
    return [
      {
        id: item.id,
        name: item.id,
        unlisted: true,
        rank: 2,
        shape: { kind: 'box', at: item.at, ...(item.shift && { shift: item.shift }), ...size, turn },
      },
    ];
  });
}

/** Where a wall begins and ends on the drawing. */
export function wallEnds(plan: Plan, wall: string): readonly [Point, Point] | null {
  const fit = plan.room;
  const index = fit?.walls.findIndex((w) => w.id === wall) ?? -1;
  if (!fit || index < 0) return null;
  const from = fit.points[index];
  const to = fit.points[fit.closed ? (index + 1) % fit.points.length : index + 1];
  return from && to ? [from, to] : null;
}

function markPoint(plan: Plan, mark: Mark): Point | null {
  const ends = wallEnds(plan, mark.wall);
  if (!ends) return null;
  if (mark.at === 'end') return ends[1];
  const direction = unit(ends[0], ends[1]);
  return direction && pointAlong(ends[0], direction, mark.at);
}

function cornerPoint(plan: Plan, between: readonly [string, string]): Point | null {
  return wallEnds(plan, between[0])?.[1] ?? null;
}

function spokenTarget(plan: Plan, layout: Layout, id: string, name: string): string {
  const { walls, corners, ties } = layout.room;
  const wall = walls.find((w) => `wall ${w.id}` === id);
  if (wall) {
    const [first] = wall.length;
    if (!first) return `${name}, not taped`;
    return `${name}, ${spokenLength(first.value, layout.step)}${wall.length.length > 1 ? ', taped twice' : ''}`;
  }
  const tie = ties.find((t) => `tie ${t.id}` === id);
  if (tie) return `${name}, ${spokenLength(tie.length.value, layout.step)}`;
  const corner = corners.find((c) => `corner ${c.between.join('-')}` === id);
  const fit = plan.room?.corners.find((c) => `corner ${c.between.join('-')}` === id);
  if (!corner || !fit) return name;
  return fit.measured ? `${name}, ${fit.angleDeg.toFixed(1)} degrees` : `${name}, not checked`;
}
