import type { Layout } from '@/geometry/core/layout';
import type { NestCrosscut, NestPlan, NestPlanSlab } from '@/geometry/nest/types';
import { nestInstanceOf } from '@/geometry/plan/nest-instance';
import type { Piece } from '@/geometry/top/types';

/**
 * A slab with two mitred pieces that share one cut, laid by hand: `first` face up with its square end left, `second` face
 * down behind it. Works for the two pieces of one corner, whose ends are mirror images.
 */
export function sharedMiterSlab(stock: string, layout: Layout, first: Piece, second: Piece): NestPlanSlab {
  const { kerf, trim } = layout.stock;
  const back = trim + first.back;
  const front = trim + first.front;
  const rise = first.depth;
  const run = back - front;
  const along = (kerf * Math.hypot(rise, run)) / rise;
  const miter: NestCrosscut = {
    ...cutAt(2, [front, back], along, first.depth),
    pieces: [first.letter, second.letter],
    left: 0,
    right: 1,
    shared: true,
  };
  const x = front + along;
  const end = x + second.back;
  return {
    stock,
    parts: [
      { id: first.letter, x: trim, y: 0, turned: false, turnedOver: false },
      { id: second.letter, x, y: 0, turned: false, turnedOver: true },
    ],
    cuts: [
      {
        ...cutAt(1, [trim - kerf, trim - kerf], kerf, first.depth),
        pieces: [first.letter],
        right: 0,
        kerfSide: 'left',
      },
      miter,
      { ...cutAt(3, [end, end], kerf, first.depth), pieces: [second.letter], left: 1 },
    ],
    offcuts: [],
  };
}

function cutAt(n: number, [front, back]: readonly [number, number], along: number, depth: number): NestCrosscut {
  return {
    n,
    kind: 'crosscut',
    front,
    back,
    frontFar: front + along,
    backFar: back + along,
    yFront: 0,
    yBack: depth,
    angle: (Math.atan2(depth, back - front) * 180) / Math.PI,
    pieces: [],
    left: null,
    right: null,
    shared: false,
    kerfSide: 'right',
  };
}

/** A nest result made of slabs laid by hand, so that `makePlan` takes it for the layout's own. */
export function handNest(layout: Layout, pieces: readonly Piece[], slabs: readonly NestPlanSlab[]): NestPlan {
  return {
    instance: nestInstanceOf(layout, pieces).id,
    slabs,
    choices: [],
    cost: 0,
    lowerBound: 0,
    gap: 0,
    proved: false,
    provedScope: 'class',
    certificate: { kind: 'area' },
    priceTags: [],
    work: 0,
  };
}
