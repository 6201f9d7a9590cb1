import type { Base, Layout } from '@/geometry/core/layout';
import { applyEdit, type Edit } from '@/shared/layout/apply-edit';
import { emptyLayout } from '@/shared/layout/empty-layout';
import { firstTops } from '@/shared/layout/first-tops';
import { startingShape, STARTING_SHAPES, type StartingShape } from '@/shared/layout/starting-shapes';
import { sketchedAngle } from '@/shared/layout/wall-chain';

const room = (shape: StartingShape, bases: Base[] = []): Layout => {
  const result = applyEdit(emptyLayout({ bases }), {
    ...startingShape(shape),
    id: '90000000-0000-4000-8000-000000000000',
  } as Edit);
  if (!result.ok) throw new Error(result.reason);
  return result.layout;
};

const base = (over: Partial<Base>): Base => ({
  id: 'b',
  wall: 'A',
  from: 0,
  to: 'end',
  kind: 'cabinet',
  depth: 24,
  access: 'open',
  ...over,
});

const LENGTHS = new Map([
  ['A', 96],
  ['B', 118],
  ['C', 84],
]);

describe('starting shapes', () => {
  it.each(STARTING_SHAPES)('%s has its corners at 90 or 135 degrees inside', (shape) => {
    const { points, closed } = startingShape(shape);
    const inner = points.map((_, i) => i).filter((i) => closed || (i > 0 && i < points.length - 1));
    for (const i of inner) expect([90, 135]).toContain(sketchedAngle(points, i, closed));
  });

  it('the bay has four corners of 135', () => {
    expect(room('bay').room.corners.map((c) => c.nominal)).toEqual([135, 135, 135, 135]);
  });
});

describe('firstTops', () => {
  it('lays a run along every wall of an open U, joined at both corners and open at both ends', () => {
    const { runs } = firstTops(room('U'), LENGTHS);
    expect(runs.map((r) => [r.wall, r.left.kind, r.right.kind])).toEqual([
      ['A', 'open', 'joint'],
      ['B', 'joint', 'joint'],
      ['C', 'joint', 'open'],
    ]);
  });

  it('parts a run at the range and leaves no piece between the range and a near corner', () => {
    const layout = room('L', [
      base({ id: 'c' }),
      base({ id: 'd', wall: 'B' }),
      base({ id: 'r', kind: 'range', from: 40, to: 70 }),
      base({ id: 's', wall: 'B', kind: 'range', from: 2, to: 32 }),
    ]);
    const { runs } = firstTops(layout, LENGTHS);
    expect(runs.map((r) => [r.wall, r.from, r.to, r.left.kind, r.right.kind])).toEqual([
      ['A', 0, 40, 'open', 'appliance'],
      ['A', 70, 'end', 'appliance', 'wall'],
      ['B', 32, 'end', 'appliance', 'open'],
    ]);
  });

  it('covers only walls with cabinets, and cuts a sink over the sink base', () => {
    const layout = room('U', [base({ wall: 'B', kind: 'sink base', from: 42, to: 78 })]);
    const { runs, cutouts } = firstTops(layout, LENGTHS);
    expect(runs.map((r) => r.wall)).toEqual(['B']);
    expect(runs[0]).toMatchObject({ left: { kind: 'wall' }, right: { kind: 'wall' } });
    expect(cutouts).toEqual([
      expect.objectContaining({ on: '1', kind: 'sink', centre: 60, width: 33, depth: 18, setback: 3 }),
    ]);
  });

  it('leaves the last wall of a closed room without cabinets free', () => {
    expect(firstTops(room('closed'), LENGTHS).runs.map((r) => r.wall)).toEqual(['A', 'B', 'C']);
  });
});
