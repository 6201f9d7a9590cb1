import type { Layout } from '../../core/layout';
import type { Point, Polygon } from '../../core/point';
import { boundingBox, centroid } from '../../core/polygon';
import { distance } from '../../core/vector';
import type { Plan } from '../../plan/types';
import { clipConvex, isConvex } from '../../top/clip-convex';
import type { PlacedCutout } from '../../top/types';
import type { DrawItem } from '../display-list';
import { atHeight, see, seeOutline, type Camera } from './camera';
import { ring } from './cabinets';
import { facet } from './solids';

/** Looks of what goes into a hole, inches: nobody measured them. */
const BASIN_DEPTH = 8;
const BASIN_DRAFT = 0.9;
const TAP_HEIGHT = 12;
const TAP_REACH = 6;

/** What fills the cutouts of a top: a basin, a hob, a tap; a hole stays a hole. */
export function drawFittings(camera: Camera, plan: Plan, layout: Layout, on: string, height: number): DrawItem[] {
  return plan.cutouts
    .filter((cutout) => cutout.on === on)
    .flatMap((cutout) => {
      const towards = frontOf(plan, layout, cutout);
      if (cutout.kind === 'sink') return basin(camera, cutout, height, layout.material.thickness);
      if (cutout.kind === 'cooktop') return hob(camera, cutout, height);
      if (cutout.kind === 'tap') return tap(camera, cutout, towards, height);
      return hole(camera, cutout, height);
    });
}

const tagOf = (cutout: PlacedCutout) => ({ layer: 'cutouts', id: cutout.id }) as const;

function hole(camera: Camera, cutout: PlacedCutout, height: number): DrawItem[] {
  return facet(camera, atHeight(cutout.outline, height), { ...tagOf(cutout), surface: 'kick', light: 0 });
}

/** The hole in the shade, the bottom of the basin in it as far as the eye sees it. */
function basin(camera: Camera, cutout: PlacedCutout, height: number, thickness: number): DrawItem[] {
  const rim = seeOutline(camera, atHeight(cutout.outline, height));
  const centre = centroid(cutout.outline);
  const small: Polygon = cutout.outline.map(([x, y]) => [
    centre[0] + (x - centre[0]) * BASIN_DRAFT,
    centre[1] + (y - centre[1]) * BASIN_DRAFT,
  ]);
  const floor = seeOutline(camera, atHeight(small, height - thickness - BASIN_DEPTH));
  const seen = isConvex(rim) && isConvex(floor) ? clipConvex(floor, rim) : [];
  const tag = tagOf(cutout);
  return [
    ...(rim.length > 2 ? [{ ...tag, kind: 'facet', outline: rim, surface: 'basin', light: 0.15 } as const] : []),
    ...(seen.length > 2 ? [{ ...tag, kind: 'facet', outline: seen, surface: 'basin', light: 1 } as const] : []),
  ];
}

function hob(camera: Camera, cutout: PlacedCutout, height: number): DrawItem[] {
  const tag = tagOf(cutout);
  const centre = centroid(cutout.outline);
  const grown: Polygon = cutout.outline.map(([x, y]) => {
    const away = Math.hypot(x - centre[0], y - centre[1]) || 1;
    return [x + (x - centre[0]) / away, y + (y - centre[1]) / away];
  });
  // Burners lie in the quarters between the middle and the farthest corners.
  const corners = farthest(cutout.outline, centre);
  const size = Math.min(cutout.width, cutout.depth);
  return [
    ...facet(camera, atHeight(grown, height), { ...tag, surface: 'hob', light: 0.1 }),
    ...corners.flatMap((corner) => {
      const at: Point = [centre[0] + (corner[0] - centre[0]) * 0.52, centre[1] + (corner[1] - centre[1]) * 0.5];
      return facet(camera, atHeight(ring(at, size * 0.17), height), { ...tag, surface: 'hob', light: 1 });
    }),
  ];
}

/** One corner in each quarter round the middle. */
function farthest(outline: Polygon, centre: Point): Point[] {
  const box = boundingBox(outline);
  const longest = Math.hypot(box.maxX - box.minX, box.maxY - box.minY);
  const sorted = [...outline].sort((a, b) => distance(b, centre) - distance(a, centre));
  const kept: Point[] = [];
  for (const p of sorted) {
    if (kept.length < 4 && kept.every((q) => distance(p, q) > longest / 4)) kept.push(p);
  }
  return kept;
}

/** Unit vector from a cutout to the front of its top. */
function frontOf(plan: Plan, layout: Layout, cutout: PlacedCutout): Point {
  const run = plan.tops.runs.find((r) => r.id === cutout.on);
  if (run) {
    const [x, y] = [run.front.origin[0] - run.back.origin[0], run.front.origin[1] - run.back.origin[1]];
    const size = Math.hypot(x, y) || 1;
    return [x / size, y / size];
  }
  const sink = plan.cutouts.find((other) => other.on === cutout.on && other.kind === 'sink');
  if (!sink) return [0, -1];
  const [a, b] = [centroid(cutout.outline), centroid(sink.outline)];
  const size = distance(a, b) || 1;
  return [(b[0] - a[0]) / size, (b[1] - a[1]) / size];
}

function tap(camera: Camera, cutout: PlacedCutout, towards: Point, height: number): DrawItem[] {
  const [x, y] = centroid(cutout.outline);
  const points = Array.from({ length: 7 }, (_, i) => {
    const angle = (Math.PI * i) / 6;
    const reach = (TAP_REACH / 2) * (1 - Math.cos(angle));
    const rise = TAP_HEIGHT + (TAP_REACH / 2) * Math.sin(angle);
    return see(camera, [x + towards[0] * reach, y + towards[1] * reach, height + rise]);
  });
  return [
    {
      ...tagOf(cutout),
      kind: 'polyline',
      points: [see(camera, [x, y, height]), ...points],
      stroke: { ink: 'ink2', width: 3 },
    },
  ];
}
