import { z } from 'zod';

import type { Layout, RoomReadings, RunEnd, Wall } from '@/geometry/core/layout';
import { DEFAULT_SETTINGS, type ShopSettings } from '@/geometry/core/settings';
import { emptyLayout } from './empty-layout';
import { fileUnitsSchema } from './file-length';
import { jobFileSchema, type JobFile } from './job-file-schema';
import { layoutSchema } from './layout-schema';
import { sketchFromReadings } from './sketch-from-readings';
import { wallPairs } from './wall-chain';

export interface FileError {
  readonly code: string;
  readonly message: string;
  /** Place in the file, such as `runs[1].depth`. */
  readonly path: string;
}

export type ParsedJob =
  | { readonly ok: true; readonly name: string; readonly layout: Layout }
  | { readonly ok: false; readonly errors: readonly FileError[] };

/**
 * Reads a job file. What is left out is filled from the shop's defaults; lengths may be numbers in the file's units or
 * text as typed on a tape, and texts of tape readings are kept beside their values.
 */
export function parseJobFile(json: unknown, settings: ShopSettings = DEFAULT_SETTINGS): ParsedJob {
  const head = z.object({ units: fileUnitsSchema.optional() }).safeParse(json);
  if (!head.success) return { ok: false, errors: fileErrors(head.error) };
  const units = head.data.units ?? 'in';
  const parsed = jobFileSchema(units).safeParse(json);
  if (!parsed.success) return { ok: false, errors: fileErrors(parsed.error) };
  const file = parsed.data;
  if (file.room.units !== undefined && file.room.units !== units)
    return problem('bad_units', 'The room is in other units than the file. Write both in one unit.', 'room.units');
  const metric = file.step ? file.step.endsWith('mm') : units === 'mm' || units === 'cm' || units === 'm';
  const layout = fillIn(file, settings, metric);
  const checked = layoutSchema.safeParse(layout);
  if (!checked.success) return { ok: false, errors: fileErrors(checked.error) };
  const dangling = danglingName(layout);
  return dangling ?? { ok: true, name: file.name ?? 'Job without a name', layout };
}

/** zod's issues as sentences with their places in the file. */
export function fileErrors(error: z.ZodError): FileError[] {
  return error.issues.map((issue) => {
    const keys = issue.code === 'unrecognized_keys' ? issue.keys : [];
    const path = pathText([...issue.path, ...keys.slice(0, 1)]);
    const message = keys.length > 0 ? `Unknown key ${keys.map((key) => `"${key}"`).join(', ')}.` : issue.message;
    return { code: issue.code, message, path };
  });
}

/** A place in a document as people write it: `runs[1].depth`. */
export function pathText(path: readonly PropertyKey[]): string {
  return path.reduce<string>(
    (text, key) => (typeof key === 'number' ? `${text}[${key}]` : text ? `${text}.${String(key)}` : String(key)),
    '',
  );
}

const problem = (code: string, message: string, path: string): ParsedJob => ({
  ok: false,
  errors: [{ code, message, path }],
});

function fillIn(file: JobFile, settings: ShopSettings, metric: boolean): Layout {
  const base = emptyLayout();
  return {
    ...base,
    units: metric ? 'mm' : 'in',
    step: file.step ?? (metric ? '1 mm' : '1/16'),
    room: roomOf(file, settings),
    bases: (file.bases ?? []).map((b) => ({ ...b, depth: b.depth ?? 24, access: b.access ?? 'open' })),
    runs: file.runs.map((run) => ({
      ...run,
      from: run.from ?? 0,
      to: run.to ?? 'end',
      depth: run.depth ?? file.material?.slabDepth ?? base.material.slabDepth,
      backGap: run.backGap ?? settings.backGap,
      left: endOf(run.left, settings),
      right: endOf(run.right, settings),
    })),
    islands: file.islands ?? [],
    strips: (file.strips ?? []).map((s) => ({ ...s, label: s.label ?? s.id, count: s.count ?? 1 })),
    // Two inches of top in front of a sink: common practice.
    cutouts: (file.cutouts ?? []).map((c) => ({ ...c, setback: c.setback ?? 2, radius: c.radius ?? 0 })),
    joints: (file.joints ?? []).map((j) => ({ ...j, assembled: j.assembled ?? 'shop' })),
    seams: file.seams ?? [],
    material: { ...base.material, ...file.material },
    climate: { ...base.climate, ...file.climate },
    fixing: { ...base.fixing, ...file.fixing },
    access: { ...base.access, ...file.access },
    edges: { ...base.edges, ...file.edges },
    finish: { ...base.finish, ...file.finish },
    stock: { ...base.stock, ...file.stock },
    site: file.site ?? {},
    notes: file.notes ?? [],
    letters: file.letters ?? {},
    accepted: file.accepted ?? {},
    ...(file.work && { work: file.work }),
  };
}

function endOf(end: JobFile['runs'][number]['left'], settings: ShopSettings): RunEnd {
  switch (end.kind) {
    case 'wall':
      return { kind: 'wall', clearance: end.clearance ?? settings.wallClearance };
    case 'open':
      return {
        kind: 'open',
        overhang: end.overhang ?? settings.openOverhang,
        radius: end.radius ?? settings.openRadius,
      };
    case 'appliance':
      return { kind: 'appliance', overhang: end.overhang ?? 0 };
    case 'waterfall':
      return { kind: 'waterfall', overhang: end.overhang ?? 0, height: end.height };
    case 'joint':
      return end;
  }
}

/** The room block as stored: every corner is listed, those left out at 90 degrees. */
export function roomOf(file: { room: JobFile['room'] }, settings: ShopSettings): RoomReadings {
  const { room } = file;
  const { closed } = room;
  const walls: Wall[] = room.walls.map(({ length, sd, profile, ...wall }) => {
    const readings = length ?? [];
    return {
      ...wall,
      length: readings.map((reading) => ({ ...reading, ...(sd !== undefined && { sd }) })),
      profile: profile ?? [],
    };
  });
  const listed = new Map(room.corners.map((corner) => [corner.between.join('|'), corner]));
  const corners = wallPairs({ walls, closed }).map((between) => {
    const corner = listed.get(between.join('|'));
    listed.delete(between.join('|'));
    if (!corner) return { between, nominal: 90 };
    const { triangle, nominal, ...rest } = corner;
    if (!triangle) return { ...rest, nominal: nominal ?? 90 };
    const { sd, ...marks } = triangle;
    return {
      ...rest,
      nominal: nominal ?? 90,
      triangle: { ...marks, c: { ...marks.c, ...(sd !== undefined && { sd }) } },
    };
  });
  const strangers = [...listed.values()].map((corner) => ({ ...corner, nominal: corner.nominal ?? 90 }));
  const readings: RoomReadings = {
    closed,
    tapeSd: room.tapeSd ?? settings.tapeSd,
    walls,
    corners: [...corners, ...(strangers as RoomReadings['corners'])],
    ties: room.ties.map(({ sd, ...tie }) => ({
      ...tie,
      length: { ...tie.length, ...(sd !== undefined && { sd }) },
    })),
    trust: room.trust,
    ignore: room.ignore,
    sketch: room.sketch ?? [],
  };
  return readings.sketch.length > 0 ? readings : { ...readings, sketch: sketchFromReadings(readings) };
}

/** A name in the file that nothing in it has. */
function danglingName(layout: Layout): ParsedJob | null {
  const walls = new Set(layout.room.walls.map((wall) => wall.id));
  const tops = new Set([...layout.runs, ...layout.islands].map((top) => top.id));
  const noWall = (id: string, path: string) => problem('no_such_wall', `There is no wall "${id}" in this room.`, path);
  const noRun = (id: string, path: string) => problem('no_such_run', `There is no run or island "${id}".`, path);
  const twice = firstTwice([...layout.runs, ...layout.islands, ...layout.strips].map((top) => top.id));
  if (twice !== null) return problem('same_id', `Two runs, islands or strips are called "${twice}".`, 'runs');
  const pairs = new Set(wallPairs(layout.room).map((pair) => pair.join('|')));
  for (const [i, corner] of layout.room.corners.entries())
    if (!pairs.has(corner.between.join('|')))
      return problem(
        'no_such_corner',
        `Walls ${corner.between[0]} and ${corner.between[1]} are not neighbours in this order.`,
        `room.corners[${i}].between`,
      );
  for (const [i, run] of layout.runs.entries()) if (!walls.has(run.wall)) return noWall(run.wall, `runs[${i}].wall`);
  for (const [i, base] of layout.bases.entries())
    if (!walls.has(base.wall)) return noWall(base.wall, `bases[${i}].wall`);
  for (const [i, cutout] of layout.cutouts.entries())
    if (!tops.has(cutout.on)) return noRun(cutout.on, `cutouts[${i}].on`);
  for (const [i, seam] of layout.seams.entries()) if (!tops.has(seam.on)) return noRun(seam.on, `seams[${i}].on`);
  for (const [i, joint] of layout.joints.entries())
    for (const run of joint.between) if (!tops.has(run)) return noRun(run, `joints[${i}].between`);
  return null;
}

function firstTwice(ids: readonly string[]): string | null {
  const seen = new Set<string>();
  for (const id of ids) {
    if (seen.has(id)) return id;
    seen.add(id);
  }
  return null;
}
