import type { Base, Cutout, Layout } from '@/geometry/core/layout';
import { DEFAULT_SETTINGS, type ShopSettings } from '@/geometry/core/settings';
import type { FindingContext } from '@/geometry/findings/context';
import type { NestPlacement, NestPlan } from '@/geometry/nest/types';
import type { CornerFit, RoomFit } from '@/geometry/room/types';
import { layTops } from '@/geometry/seams/lay-tops';
import type { Tops } from '@/geometry/top/types';
import { wallFit } from '@/geometry/top/wall-fit';
import { wallFrames } from '@/geometry/top/wall-frame';
import { jointWood } from '@/geometry/wood/joint-wood';
import { movementOf } from '@/geometry/wood/movement';
import { pieceWeight } from '@/geometry/wood/weight';
import { JOINT, layout, room, run } from '@/tests/helpers/tops-builder';

export interface KitchenParts {
  /** Wall lengths, inches, and interior angles between them, degrees. */
  readonly walls?: readonly number[];
  readonly angles?: readonly number[];
  readonly layout?: Partial<Layout>;
  readonly settings?: Partial<ShopSettings>;
  readonly fit?: Partial<RoomFit>;
  readonly corner?: Partial<CornerFit>;
  readonly tops?: (tops: Tops) => Tops;
  readonly context?: (context: FindingContext) => FindingContext;
}

/** A year that makes nothing move: for rules that are not about the seasons. */
export const STEADY: Layout['climate'] = {
  make: { tempF: 70, rh: 50 },
  summer: { tempF: 70, rh: 50 },
  winter: { tempF: 70, rh: 50 },
  heated: true,
};

/**
 * A measured straight wall of 90 in with one maple top on it in steady air, unless told otherwise: a kitchen in which no
 * rule has anything to say but that oily rags burn and that no reading is to spare.
 */
export function kitchen(parts: KitchenParts = {}): FindingContext {
  const { walls = [90], angles = walls.slice(1).map(() => 90) } = parts;
  const settings = { ...DEFAULT_SETTINGS, ...parts.settings };
  const drawn = layout({ runs: [run('1', 'A')], climate: STEADY, ...parts.layout });
  const ids = walls.map((_, i) => String.fromCharCode(65 + i));
  const known = drawn.room.walls.length > 0 ? drawn.room.walls : ids.map((id) => ({ id, length: [], profile: [] }));
  const whole: Layout = { ...drawn, room: { ...drawn.room, walls: known } };
  const shape = room(walls, angles);
  const solved = { ...shape, walls: shape.walls.map((wall, i) => ({ ...wall, profile: known[i]?.profile ?? [] })) };
  const laid = layTops(whole, solved, settings);
  const tops = parts.tops ? parts.tops(laid) : laid;
  const depth = Math.max(25, ...tops.runs.map((r) => r.depth));
  const movement = movementOf(whole.material, whole.climate, depth, settings);
  const context: FindingContext = {
    layout: whole,
    settings,
    fit: fitOf(shape.points, walls, angles, parts),
    tops,
    pieces: tops.pieces.map((piece) => ({
      ...piece,
      weight: pieceWeight(piece.netArea, piece.thickness, whole.material.species, movement.emc.make),
    })),
    joints: tops.joints.map((joint) => ({ ...joint, ...jointWood(joint, tops, movement, settings) })),
    movement,
    nest: null,
    nestProblem: null,
    passages: [],
    wallFit: wallFit(tops.runs, whole, wallFrames(solved)),
  };
  return parts.context ? parts.context(context) : context;
}

/** Two walls with a corner top, glued in the shop unless said otherwise. */
export function cornerKitchen(parts: KitchenParts & { readonly joint?: Partial<Layout['joints'][number]> } = {}) {
  return kitchen({
    walls: [80, 90],
    ...parts,
    layout: {
      runs: [run('1', 'A', { right: JOINT }), run('2', 'B', { left: JOINT })],
      joints: [{ between: ['1', '2'], kind: 'miter', assembled: 'shop', ...parts.joint }],
      ...parts.layout,
    },
  });
}

function fitOf(
  points: RoomFit['points'],
  walls: readonly number[],
  angles: readonly number[],
  { fit, corner }: KitchenParts,
): RoomFit {
  const ids = walls.map((_, i) => String.fromCharCode(65 + i));
  return {
    points,
    closed: false,
    dof: 1,
    chi2: 0.5,
    chi2Limit: 3.84,
    walls: ids.map((id, i) => ({
      id,
      taped: walls[i]!,
      adjusted: walls[i]!,
      sd: 0.03,
      bearing: 0,
      residual: 0,
      redundancy: 0.5,
      standardised: 0,
      ignored: false,
      readings: [],
    })),
    corners: angles.map((angleDeg, i) => ({
      between: [ids[i]!, ids[i + 1]!] as const,
      angleDeg,
      sdDeg: 0.05,
      measured: true,
      kind: 'triangle' as const,
      taped: 60,
      adjusted: 60,
      residual: 0,
      redundancy: 0.5,
      standardised: 0,
      ignored: false,
      readings: [],
      ...corner,
    })),
    ties: [],
    suspects: [],
    checkCorner: null,
    next: null,
    ...fit,
  };
}

export const base = (overrides: Partial<Base> = {}): Base => ({
  id: 'b1',
  wall: 'A',
  from: 0,
  to: 'end',
  kind: 'cabinet',
  depth: 24,
  access: 'open',
  ...overrides,
});

/** A drop-in sink 30 x 21, 2 in from the front of a 25 in top. */
export const sink = (overrides: Partial<Cutout> = {}): Cutout => ({
  id: 'c1',
  on: '1',
  kind: 'sink',
  centre: 45,
  setback: 2,
  width: 30,
  depth: 21,
  radius: 0.75,
  ...overrides,
});

/** A plan whose slabs hold these pieces from left to right, unturned unless said otherwise. */
export function nestOf(...slabs: readonly (readonly (string | Partial<NestPlacement>)[])[]): NestPlan {
  return {
    instance: 'n',
    slabs: slabs.map((parts) => ({
      stock: 'S96',
      parts: parts.map((part, i) => ({
        id: '',
        x: 1 + 40 * i,
        y: 0,
        turned: false,
        turnedOver: false,
        ...(typeof part === 'string' ? { id: part } : part),
      })),
      cuts: [],
      offcuts: [],
    })),
    choices: [],
    cost: 37900 * slabs.length,
    lowerBound: 37900 * slabs.length,
    gap: 0,
    proved: true,
    provedScope: 'class',
    certificate: { kind: 'area' },
    priceTags: [],
    work: 1,
  };
}
