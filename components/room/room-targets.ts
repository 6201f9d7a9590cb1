import type { Layout, Mark } from '@/geometry/core/layout';
import type { Point } from '@/geometry/core/point';
import { along as pointAlong, unit } from '@/geometry/core/vector';
import type { Plan } from '@/geometry/plan/types';
import type { Scene } from '@/geometry/scene/display-list';
import { spokenLength } from '@/geometry/tape/format-length';
import type { CanvasTarget } from '../canvas/Canvas';
import { observationOf, targetName, walkOf } from './tape-walk';

/** px a blade and a badge take on the drawing, with room for a finger. */
const BLADE = { width: 104, height: 44 };
const BADGE = { width: 80, height: 60 };

/** Everything on the room's drawing that can be touched, in the order of the tape walk. */
export function roomTargets(plan: Plan, layout: Layout, scene: Scene): CanvasTarget[] {
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
  return [...targets, ...labelTargets(scene)];
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
