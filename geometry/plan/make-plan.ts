import type { Layout } from '../core/layout';
import type { ShopSettings } from '../core/settings';
import { findingsOf } from '../findings/catalogue';
import type { NestError, NestPlan } from '../nest/types';
import { solvedRoom } from '../top/solved-room';
import { wallFit, type WallFit } from '../top/wall-fit';
import { wallFrames } from '../top/wall-frame';
import { gettingIn } from '../top/getting-in';
import { assembledSections } from '../wood/sections';
import { jobSettings } from '../wood/job-settings';
import { jointWood } from '../wood/joint-wood';
import { movementOf } from '../wood/movement';
import { orderOfWork } from '../wood/schedule';
import { chooseScrew } from '../wood/screws';
import { pieceWeight } from '../wood/weight';
import { layRoom, type Laid } from './lay-room';
import { nestInstanceOf } from './nest-instance';
import type { Plan, PlanInput } from './types';

/** Version of everything that computes; stored with every revision. */
export const ENGINE = '1.0.0';

/**
 * Everything computed from a layout, the shop's settings and a nest result. Pure and deterministic; starts no search. A
 * nest result that belongs to other pieces (its instance is another) is left out, never stretched to fit.
 */
export function makePlan({ layout, settings, nest, nestProblem }: PlanInput): Plan {
  return finishPlan(layRoom(layout, settings), layout, settings, { nest, nestProblem });
}

const NO_WALLS: WallFit = { scribes: [], slides: [] };

/** What a search for slabs gave: a plan, or why there is none. */
export interface NestGiven {
  readonly nest: NestPlan | null;
  readonly nestProblem?: NestError['error'] | null;
}

/** The part of the plan that follows once room and tops are known. */
export function finishPlan(laid: Laid, layout: Layout, shop: ShopSettings, given: NestGiven): Plan {
  const settings = jobSettings(layout, shop);
  const { room, tops } = laid;
  const { material, climate, fixing } = layout;
  // The wall gap and the slots belong to runs; a kitchen of islands alone still moves.
  const depths = (layout.runs.length > 0 ? layout.runs : layout.islands).map((top) => top.depth);
  const deepest = depths.length > 0 ? Math.max(...depths) : material.slabDepth;
  const movement = movementOf(material, climate, deepest, settings);
  const instance = nestInstanceOf(layout, tops.pieces);
  const nest = given.nest !== null && given.nest.instance === instance.id ? given.nest : null;
  const pieces = tops.pieces.map((piece) => ({
    ...piece,
    weight: pieceWeight(piece.netArea, piece.thickness, material.species, movement.emc.make),
  }));
  const joints = tops.joints.map((joint) => ({ ...joint, ...jointWood(joint, tops, movement, settings) }));
  const byLetter = new Map(pieces.map((piece) => [piece.letter, piece]));
  const passages = assembledSections(tops).map((letters) =>
    gettingIn(
      letters.map((letter) => byLetter.get(letter)!),
      layout.access,
      layout.step,
    ),
  );
  const walls = room.fit && !room.error ? wallFrames(solvedRoom(room.fit, layout.room)) : null;
  const fit = walls ? wallFit(tops.runs, layout, walls) : NO_WALLS;
  const screws = chooseScrew(fixing, material.thickness, settings);
  return {
    engine: ENGINE,
    room: room.fit,
    roomError: room.error,
    untaped: room.untaped,
    tops,
    pieces,
    joints,
    seams: tops.seams,
    cutouts: tops.cutouts,
    instance,
    nest,
    cost: nest && { slabs: nest.cost, lowerBound: nest.lowerBound, gap: nest.gap, proved: nest.proved },
    passages,
    wallFit: fit,
    movement,
    screws,
    findings: findingsOf({
      layout,
      settings,
      fit: room.error ? null : room.fit,
      tops,
      pieces,
      joints,
      movement,
      nest,
      nestProblem: given.nestProblem ?? null,
      passages,
      wallFit: fit,
    }),
    schedule: orderOfWork({ layout, settings, tops }),
  };
}
