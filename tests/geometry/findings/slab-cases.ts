import type { Stock } from '@/geometry/core/layout';
import type { FindingContext } from '@/geometry/findings/context';
import type { NestPlan } from '@/geometry/nest/types';
import { run } from '@/tests/helpers/tops-builder';
import type { RuleCases } from './case';
import { cornerKitchen, kitchen, nestOf } from './kitchen';

const STOCK: Stock = kitchen().layout.stock;
const S96 = STOCK.slabs[0]!;

const withNest = (context: FindingContext, nest: NestPlan | null): FindingContext => ({ ...context, nest });

/** One piece of this length and depth, whatever seams the layout would have placed. */
const onePiece = (length: number, depth = 25, stock: Partial<Stock> = {}) => {
  const context = kitchen({ walls: [90], layout: { runs: [run('1', 'A', { depth })], stock: { ...STOCK, ...stock } } });
  const shape = [
    [0, 0],
    [length, 0],
    [length, depth],
    [0, depth],
  ] as const;
  const pieces = context.tops.pieces.slice(0, 1).map((piece) => ({ ...piece, shape, depth }));
  return { ...context, tops: { ...context.tops, pieces } };
};

const counted = (count: number) =>
  withNest(kitchen({ layout: { stock: { ...STOCK, slabs: [{ ...S96, count }] } } }), nestOf(['P'], ['Q']));

const oneFace = (turnedOver: boolean) =>
  withNest(
    kitchen({ layout: { material: { ...kitchen().layout.material, faces: 'one' } } }),
    nestOf([{ id: 'P', turnedOver }]),
  );

const seamed = (nest: NestPlan | null) => withNest(kitchen({ walls: [140] }), nest);

const slabs = (overrides: Partial<Stock['slabs'][number]>) =>
  kitchen({ layout: { stock: { ...STOCK, slabs: [S96, { ...S96, id: 'S2', ...overrides }] } } });

export const SLAB_CASES: RuleCases = {
  'piece-over-slab': {
    severity: 'stop',
    // 96 in less 1/2 in of trim at either end.
    raises: () => onePiece(95.5),
    spares: () => onePiece(95),
    says: ['Piece P', '95 1/2 in', '95 in'],
    other: () => onePiece(90, 26),
  },
  'no-slab-listed': {
    severity: 'stop',
    raises: () => kitchen({ layout: { stock: { ...STOCK, slabs: [{ ...S96, species: 'beech' }] } } }),
    spares: () => kitchen({ layout: { stock: { ...STOCK, slabs: [{ ...S96, species: 'hard maple' }] } } }),
    says: ['1 piece', 'hard maple', '1 1/2 in'],
    other: () => cornerKitchen({ layout: { stock: { ...STOCK, slabs: [] } } }),
  },
  'slabs-short': {
    severity: 'stop',
    raises: () => counted(1),
    spares: () => counted(2),
    says: ['takes 2', 'S96', 'is 1'],
    other: () => ({
      ...kitchen(),
      nestProblem: { code: 'not_enough_stock', message: 'The pieces need 3 slabs and 2 are there.' },
    }),
  },
  'face-down': {
    severity: 'stop',
    raises: () => oneFace(true),
    spares: () => oneFace(false),
    says: ['Slab 1', 'one good face', 'P lies face down'],
  },
  'grain-breaks-at-seam': {
    severity: 'note',
    raises: () => seamed(nestOf(['P'], ['Q'])),
    spares: () => seamed(nestOf(['P', 'Q'])),
    says: ['P to Q'],
  },
  'slab-no-neighbours': {
    severity: 'note',
    raises: () => withNest(cornerKitchen({ walls: [140, 140] }), nestOf(['P', 'R'], ['Q', 'S'])),
    spares: () => withNest(cornerKitchen({ walls: [140, 140] }), nestOf(['P', 'Q'], ['R', 'S'])),
    says: ['Slab 1', 'P and R'],
  },
  'stock-differs': {
    severity: 'note',
    raises: () => slabs({ thickness: 1.25 }),
    spares: () => slabs({ thickness: 1.5 - 1 / 32 }),
    says: ['S2', '1 1/4 in', '1 1/2 in'],
    other: () => slabs({ species: 'beech' }),
  },
};
