import type { Base, Cutout, CutoutKind, Island, Layout, Run, RunEnd, Strip } from '@/geometry/core/layout';
import type { ShopSettings } from '@/geometry/core/settings';
import type { Plan } from '@/geometry/plan/types';
import { wallPairs } from '@/shared/layout/wall-chain';
import { wallLength } from './length-checks';
import { freshId } from './tops-choice';

/** Usual first sizes, inches; every one is changed on a blade. Common practice. */
const SINK = { width: 30, depth: 18, setback: 3, radius: 0.75 };
const COOKTOP = { width: 28.5, depth: 19.5, setback: 2.5, radius: 0.5 };
const TAP = { width: 1.375, depth: 1.375, radius: 0 };
const NOTCH = { width: 6, depth: 3, radius: 0 };
const FREE = { width: 12, depth: 8, setback: 4, radius: 0.5 };
/** Wood left behind a sink or cooktop, at least. */
const BEHIND = 2;
const ISLAND = { length: 72, depth: 36 };
const ISLAND_CORNER = 4;
/** Arm of a first L-shaped island. */
const ARM = 25;
const SHORTEST = 1;

/** A run over the part of a wall that no other run covers; the whole wall where all of it is covered. */
export function newRun(layout: Layout, plan: Plan, settings: ShopSettings, wall: string, side: 'front' | 'back'): Run {
  const length = wallLength(plan, wall) ?? 60;
  const taken = layout.runs
    .filter((run) => run.wall === wall && (run.side ?? 'front') === side)
    .map((run) => [run.from, run.to === 'end' ? length : run.to] as const)
    .sort((a, b) => a[0] - b[0]);
  let free: readonly [number, number] = [0, 0];
  let at = 0;
  for (const [from, to] of [...taken, [length, length] as const]) {
    if (from - at > free[1] - free[0]) free = [at, from];
    at = Math.max(at, to);
  }
  const [from, to] = free[1] - free[0] < SHORTEST ? [0, length] : free;
  const atStart = from <= 0;
  const atEnd = to >= length;
  const open: RunEnd = { kind: 'open', overhang: settings.openOverhang, radius: settings.openRadius };
  const beside = (neighbour: string | undefined): RunEnd => {
    if (neighbour === undefined || side === 'back') return open;
    return layout.runs.some((run) => run.wall === neighbour)
      ? { kind: 'joint' }
      : { kind: 'wall', clearance: settings.wallClearance };
  };
  const pairs = wallPairs(layout.room);
  return {
    id: freshRunId(layout),
    wall,
    from: Math.round(from * 16) / 16,
    to: atEnd ? 'end' : Math.round(to * 16) / 16,
    depth: layout.material.slabDepth,
    backGap: settings.backGap,
    left: atStart ? beside(pairs.find(([, right]) => right === wall)?.[0]) : open,
    right: atEnd ? beside(pairs.find(([left]) => left === wall)?.[1]) : open,
    ...(side === 'back' ? { side } : {}),
  };
}

/** Runs, islands and strips share the names that pieces and cutouts point to. */
function freshRunId(layout: Layout): string {
  const taken = new Set([...layout.runs, ...layout.islands, ...layout.strips].map((top) => top.id));
  let n = layout.runs.length + 1;
  while (taken.has(String(n))) n++;
  return String(n);
}

export type IslandForm = 'rectangle' | 'clipped' | 'rounded' | 'L' | 'free';

/** An island of a form, laid beside the room until it is dragged into it. */
export function newIsland(layout: Layout, form: IslandForm): Island {
  const { length, depth } = ISLAND;
  const id = freshId([...layout.islands, ...layout.runs, ...layout.strips], 'I');
  if (form === 'L' || form === 'free') {
    const outline =
      form === 'L'
        ? ([[0, 0], [length, 0], [length, ARM], [ARM, ARM], [ARM, 60], [0, 60]] as const) // prettier-ignore
        : ([[0, 0], [length, 0], [length - 12, depth], [12, depth]] as const); // prettier-ignore
    return { id, length, depth: form === 'L' ? 60 : depth, shape: 'free', outline };
  }
  return { id, length, depth, shape: form, ...(form === 'rectangle' ? {} : { corner: ISLAND_CORNER }) };
}

export type StripUse = 'backsplash' | 'filler' | 'shelf';

/** A strip of wood with the grain along it; a backsplash is as long as the longest run. */
export function newStrip(layout: Layout, plan: Plan, use: StripUse): Strip {
  const longest = Math.max(24, ...plan.tops.runs.map((run) => run.backTo - run.backFrom));
  const { thickness } = layout.material;
  const id = freshId([...layout.strips, ...layout.runs, ...layout.islands], 's');
  const length = Math.round(longest * 16) / 16;
  if (use === 'backsplash') return { id, label: 'Backsplash', length, width: 4, thickness, count: 1 };
  if (use === 'shelf') return { id, label: 'Shelf', length: 36, width: 10, thickness, count: 1 };
  return { id, label: 'Filler', length: 30, width: 3, thickness, count: 1 };
}

/** A cutout on a run or an island: over the base it belongs to, else in the middle. */
export function newCutout(layout: Layout, plan: Plan, on: string, kind: CutoutKind): Cutout {
  const run = layout.runs.find((r) => r.id === on);
  const island = layout.islands.find((i) => i.id === on);
  const depth = run?.depth ?? island?.depth ?? 24;
  const laid = plan.tops.runs.find((r) => r.id === on);
  const [from, to] = laid ? [laid.frontFrom, laid.frontTo] : [0, island?.length ?? 24];
  const base = run && baseFor(layout.bases, run.wall, kind, layout.cutouts);
  const middle = base ? (base.from + (base.to === 'end' ? to : base.to)) / 2 : (from + to) / 2;
  const centre = Math.round(middle * 16) / 16;
  const within = (size: { width: number; depth: number; setback: number; radius: number }) => ({
    ...size,
    width: Math.min(size.width, Math.max(SHORTEST, to - from - 2 * BEHIND)),
    depth: Math.min(size.depth, Math.max(SHORTEST, depth - size.setback - BEHIND)),
  });
  const common = { id: freshId(layout.cutouts, 'c'), on, kind, centre };
  switch (kind) {
    case 'sink':
      return { ...common, mount: 'drop-in', ...within(SINK) };
    case 'cooktop':
      return { ...common, ...within(COOKTOP) };
    case 'tap':
      return { ...common, ...TAP, setback: Math.max(0, depth - 3) };
    case 'notch':
      return { ...common, ...NOTCH, setback: depth - NOTCH.depth };
    case 'free':
      return { ...common, ...within(FREE) };
  }
}

/** The base a cutout belongs over, if nothing is cut over it yet. */
function baseFor(bases: readonly Base[], wall: string, kind: CutoutKind, cutouts: readonly Cutout[]): Base | undefined {
  if (kind !== 'sink' && kind !== 'tap') return undefined;
  return bases.find((base) => {
    if (base.wall !== wall || base.kind !== 'sink base' || base.to === 'end') return false;
    const [from, to] = [base.from, base.to];
    return kind === 'tap' || !cutouts.some((c) => c.kind === 'sink' && c.centre > from && c.centre < to);
  });
}
