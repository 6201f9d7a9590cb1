import type { Polygon } from '@/geometry/core/point';
import { fingerprint, nestInstanceOf } from '@/geometry/plan/nest-instance';
import type { Piece } from '@/geometry/top/types';
import { emptyLayout } from '@/shared/layout/empty-layout';

const layout = emptyLayout({
  stock: {
    ...emptyLayout().stock,
    slabs: [{ id: 'M96', length: 96, depth: 25, price: 37900, count: null, species: 'hard maple', thickness: 1.5 }],
  },
});

const piece = (shape: Polygon): Piece =>
  ({ letter: 'P', key: '1.1', on: '1', kind: 'run', shape, thickness: 1.5, depth: 25, count: 1 }) as unknown as Piece;

const SHAPE: Polygon = [
  [0, 0],
  [51.4, 0],
  [75.8, 25],
  [0, 25],
];
const idOf = (shape: Polygon) => nestInstanceOf(layout, [piece(shape)]).id;

describe('the id of a nest instance', () => {
  it('is the same where two machines differ in the last bits of a coordinate', () => {
    const other = SHAPE.map(([x, y], i): [number, number] => [x + (i % 2 ? 3e-14 : -2e-14), y + (i > 1 ? 7e-15 : 0)]);
    expect(idOf(other)).toBe(idOf(SHAPE));
  });

  it('is the same whichever corner the outline begins with', () => {
    expect(idOf([...SHAPE.slice(2), ...SHAPE.slice(0, 2)])).toBe(idOf(SHAPE));
  });

  it('changes with a piece that is a thousandth of an inch longer, and with the price of a slab', () => {
    expect(idOf(SHAPE.map(([x, y]): [number, number] => [x > 50 ? x + 0.001 : x, y]))).not.toBe(idOf(SHAPE));
    const dearer = { ...layout, stock: { ...layout.stock, slabs: [{ ...layout.stock.slabs[0]!, price: 38000 }] } };
    expect(nestInstanceOf(dearer, [piece(SHAPE)]).id).not.toBe(idOf(SHAPE));
  });
});

describe('fingerprint', () => {
  // FNV-1a, 64 bit, test vectors of the IETF draft "The FNV Non-Cryptographic Hash Algorithm", appendix C.
  it.each([
    ['', 'cbf29ce484222325'],
    ['a', 'af63dc4c8601ec8c'],
    ['foobar', '85944171f73967e8'],
  ])('of "%s" is the published %s', (text, hex) => {
    expect(fingerprint(text)).toBe(hex);
  });
});
