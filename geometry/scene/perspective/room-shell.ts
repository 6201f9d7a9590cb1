import type { Layout } from '../../core/layout';
import type { Point } from '../../core/point';
import { along, dot, subtract } from '../../core/vector';
import type { Plan } from '../../plan/types';
import { convexHull } from '../../top/convex-hull';
import { solvedRoom } from '../../top/solved-room';
import { alongWall, wallFrames, type WallFrame } from '../../top/wall-frame';
import type { DrawItem } from '../display-list';
import { atHeight, type Camera } from './camera';
import { facet, lightOn, upright } from './solids';

/** Heights nobody measured, inches: a room's walls, a half wall under a peninsula's top, a window and its usual sill. */
const WALL_HEIGHT = 84;
const WINDOW_HEIGHT = 34;
const SILL = 7;
const OVER_WINDOW = 6;

/** Floor, the walls that face the eye, and their windows; the farthest first. */
export function roomShell(camera: Camera, plan: Plan, layout: Layout, topHeight: number): DrawItem[] {
  if (!plan.room) return [];
  const eye: Point = [camera.eye[0], camera.eye[1]];
  const walls = wallFrames(solvedRoom(plan.room, layout.room)).byIndex.flatMap((wall) => wall ?? []);
  const tops = plan.pieces.filter((piece) => piece.kind !== 'strip').flatMap((piece) => [...piece.outline]);
  const halved = new Set(layout.runs.filter((run) => run.side === 'back').map((run) => run.wall));
  const floor = facet(camera, atHeight(convexHull([...plan.room.points, ...tops]), 0), {
    layer: 'walls',
    surface: 'floor',
    light: 1,
  });
  const middle = (wall: WallFrame) => along(wall.start, wall.along, wall.length / 2);
  const facing = walls
    .filter((wall) => dot(wall.inward, subtract(eye, wall.start)) > 0)
    .sort((a, b) => distanceTo(eye, middle(b)) - distanceTo(eye, middle(a)));
  return [
    ...floor,
    ...facing.flatMap((wall) => [
      ...facet(
        camera,
        upright(wall.start, wall.end, 0, halved.has(wall.id) ? topHeight - layout.material.thickness : WALL_HEIGHT),
        {
          layer: 'walls',
          id: wall.id,
          surface: 'wall',
          light: lightOn(wall.inward),
        },
      ),
      ...windowsOn(camera, wall, layout, topHeight),
    ]),
  ];
}

const distanceTo = (eye: Point, p: Point): number => Math.hypot(p[0] - eye[0], p[1] - eye[1]);

function windowsOn(camera: Camera, wall: WallFrame, layout: Layout, topHeight: number): DrawItem[] {
  return layout.bases.flatMap((base) => {
    if (base.kind !== 'window' || base.wall !== wall.id) return [];
    const bottom = topHeight - layout.material.thickness + (base.sill ?? SILL);
    const top = Math.min(bottom + WINDOW_HEIGHT, WALL_HEIGHT - OVER_WINDOW);
    const [from, to] = [base.from, alongWall(wall, base.to)];
    const at = (x: number) => along(wall.start, wall.along, x);
    const middle = (from + to) / 2;
    const look = { layer: 'bases', id: base.id, surface: 'glass', light: lightOn(wall.inward) } as const;
    return [
      ...facet(camera, upright(at(from), at(middle), bottom, top), look),
      ...facet(camera, upright(at(middle), at(to), bottom, top), look),
    ];
  });
}
