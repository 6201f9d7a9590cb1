import { placedOutline } from '@/geometry/nest/plan/leaf-outline';
import type { Plan } from '@/geometry/plan/types';
import { toRoomOutput } from './room-output';

/** A plan in the words of the file format: inches, angles in degrees, weights in pounds, money in cents, nothing rounded. */
export function toPlanOutput(plan: Plan) {
  const shapes = new Map(plan.pieces.map((piece) => [piece.letter, piece.shape]));
  return {
    engine: plan.engine,
    room: plan.room && toRoomOutput(plan.room),
    pieces: plan.pieces.map((piece) => ({
      letter: piece.letter,
      on: piece.on,
      kind: piece.kind,
      outline: piece.outline,
      back: piece.back,
      front: piece.front,
      depth: piece.depth,
      thickness: piece.thickness,
      left: piece.left,
      right: piece.right,
      grain: piece.grain,
      area: piece.area,
      weight: piece.weight,
      count: piece.count,
      finishedEdges: piece.finishedEdges,
    })),
    joints: plan.joints.map(({ corner, cornerSd, from, to, ...joint }) => ({ ...joint, corner, cornerSd, from, to })),
    seams: plan.seams,
    cutouts: plan.cutouts,
    slabs: (plan.nest?.slabs ?? []).map((slab) => ({
      stock: slab.stock,
      pieces: slab.parts.map(({ id, ...place }) => ({
        letter: id,
        ...place,
        outline: placedOutline(shapes.get(id) ?? [], place),
      })),
      cuts: slab.cuts,
      offcuts: slab.offcuts,
    })),
    scribes: plan.wallFit.scribes,
    cost: plan.cost,
    provedScope: plan.nest?.provedScope ?? null,
    movement: plan.movement,
    screws: plan.screws,
    findings: plan.findings.map(({ code, severity, text, action, at, source }) => ({
      code,
      severity,
      text,
      action,
      at,
      source,
    })),
    schedule: plan.schedule,
    problems: plan.tops.problems,
  };
}

export type PlanOutput = ReturnType<typeof toPlanOutput>;
