import type { Along, Base, Cutout, Layout, Run, RunEnd } from '@/geometry/core/layout';
import { DEFAULT_SETTINGS, type ShopSettings } from '@/geometry/core/settings';
import { wallPairs } from './wall-chain';

/** What a top lies on. A range and an opening part it; a window or a pipe changes nothing. */
const CARRIES = new Set<Base['kind']>(['cabinet', 'sink base', 'corner base', 'dishwasher']);
const PARTS = new Set<Base['kind']>(['range', 'opening']);

/** A gap this near a corner reaches it, inches: no top is made for less than a filler's width. */
const NARROWEST = 6;

/** A sink cutout leaves the base's sides room for clips: 3 in narrower than its base. Common practice. */
const SINK_IN_BASE = 3;
/** Sink cutout, front to back, and strip in front of it, inches. Common practice. */
const SINK_DEPTH = 18;
const SINK_SETBACK = 3;
const SINK_RADIUS = 0.75;

interface Stretch {
  readonly from: number;
  readonly to: Along;
  /** What stands at either end: nothing but the wall's own end, or an appliance. */
  readonly leftGap: boolean;
  readonly rightGap: boolean;
}

/**
 * First tops for a measured room: a run along every wall that carries cabinets (every wall of an open room when none are
 * drawn), parted at ranges and openings, joined at the corners, with a sink cutout over every sink base. A proposal: each
 * run is changed afterwards like any other.
 *
 * @param lengths - solved wall lengths by wall id, inches
 */
export function firstTops(
  layout: Layout,
  lengths: ReadonlyMap<string, number>,
  settings: ShopSettings = DEFAULT_SETTINGS,
): { readonly runs: readonly Run[]; readonly cutouts: readonly Cutout[] } {
  const walls = coveredWalls(layout);
  const stretches = new Map(
    walls.map((wall) => [wall, stretchesOf(layout.bases, wall, lengths.get(wall) ?? 0)] as const),
  );
  const pairs = wallPairs(layout.room);
  const reaches = (wall: string | undefined, end: 'left' | 'right'): boolean => {
    const list = wall === undefined ? undefined : stretches.get(wall);
    const last = end === 'left' ? list?.[0] : list?.[list.length - 1];
    return last !== undefined && !(end === 'left' ? last.leftGap : last.rightGap);
  };
  const runs: Run[] = [];
  for (const wall of walls) {
    const before = pairs.find(([, right]) => right === wall)?.[0];
    const after = pairs.find(([left]) => left === wall)?.[1];
    for (const stretch of stretches.get(wall)!) {
      runs.push({
        id: String(runs.length + 1),
        wall,
        from: stretch.from,
        to: stretch.to,
        depth: layout.material.slabDepth,
        backGap: settings.backGap,
        left: endOf(stretch.leftGap, before, reaches(before, 'right'), settings),
        right: endOf(stretch.rightGap, after, reaches(after, 'left'), settings),
      });
    }
  }
  return { runs, cutouts: sinksOf(layout, runs, lengths) };
}

function coveredWalls(layout: Layout): string[] {
  const all = layout.room.walls.map((wall) => wall.id);
  const carrying = new Set(layout.bases.filter((base) => CARRIES.has(base.kind)).map((base) => base.wall));
  if (carrying.size > 0) return all.filter((wall) => carrying.has(wall));
  // A closed room without cabinets: the way in is somewhere, most likely on the wall drawn last.
  return layout.room.closed ? all.slice(0, -1) : all;
}

function stretchesOf(bases: readonly Base[], wall: string, length: number): Stretch[] {
  const gaps = bases
    .filter((base) => base.wall === wall && PARTS.has(base.kind))
    .map((base) => ({ from: base.from, to: base.to === 'end' ? length : base.to }))
    .sort((a, b) => a.from - b.from);
  const stretches: Stretch[] = [];
  let from = 0;
  let leftGap = false;
  for (const gap of gaps) {
    if (gap.from - from >= NARROWEST) stretches.push({ from, to: gap.from, leftGap, rightGap: true });
    from = Math.max(from, gap.to);
    leftGap = true;
  }
  if (length - from >= NARROWEST || gaps.length === 0) stretches.push({ from, to: 'end', leftGap, rightGap: false });
  return stretches;
}

function endOf(gap: boolean, neighbour: string | undefined, joined: boolean, settings: ShopSettings): RunEnd {
  if (gap) return { kind: 'appliance', overhang: 0 };
  if (neighbour === undefined) return { kind: 'open', overhang: settings.openOverhang, radius: settings.openRadius };
  return joined ? { kind: 'joint' } : { kind: 'wall', clearance: settings.wallClearance };
}

function sinksOf(layout: Layout, runs: readonly Run[], lengths: ReadonlyMap<string, number>): Cutout[] {
  return layout.bases
    .filter((base) => base.kind === 'sink base')
    .flatMap((base, i) => {
      const end = lengths.get(base.wall) ?? 0;
      const to = base.to === 'end' ? end : base.to;
      const centre = (base.from + to) / 2;
      const run = runs.find((r) => r.wall === base.wall && r.from <= centre && centre <= (r.to === 'end' ? end : r.to));
      if (!run || to - base.from <= SINK_IN_BASE) return [];
      return [
        {
          id: `sink${i + 1}`,
          on: run.id,
          kind: 'sink' as const,
          mount: 'drop-in' as const,
          centre,
          setback: SINK_SETBACK,
          width: to - base.from - SINK_IN_BASE,
          depth: Math.min(SINK_DEPTH, run.depth - SINK_SETBACK - 2),
          radius: SINK_RADIUS,
        },
      ];
    });
}
