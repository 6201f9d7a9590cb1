import fc from 'fast-check';
import type { Cutout, Layout } from '@/geometry/core/layout';
import type { Polygon } from '@/geometry/core/point';
import { area } from '@/geometry/core/polygon';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { layTops } from '@/geometry/seams/lay-tops';
import type { Tops } from '@/geometry/top/types';
import { differenceArea, sharedArea, unionArea } from '../../helpers/clipper-area';
import { FLUSH, JOINT, layout, OPEN, room, run, WALL } from '../../helpers/tops-builder';

const sink: Cutout = { id: 'c1', on: '1', kind: 'sink', centre: 48, setback: 2, width: 30, depth: 21, radius: 0.75 };
const one = (more: Partial<Layout> = {}) =>
  layTops(layout({ runs: [run('1', 'A')], ...more }), room([90], []), DEFAULT_SETTINGS);
const l = (more: Partial<Layout> = {}): Tops =>
  layTops(
    layout({
      runs: [run('1', 'A', { left: OPEN, right: JOINT }), run('2', 'B', { left: JOINT, right: WALL })],
      ...more,
    }),
    room([80, 90, 60], [92, 90]),
    DEFAULT_SETTINGS,
  );

describe('pieces', () => {
  it('gives each its long and short points, end angles and finished edges', () => {
    const [p, q] = l().pieces;
    expect(p).toMatchObject({ key: '1.1', letter: 'P', finishedEdges: ['front', 'left'], depth: 25, thickness: 1.5 });
    expect(p!.left).toEqual({ kind: 'open', angle: 90, finished: true, radius: 1 });
    expect(p!.right).toMatchObject({ kind: 'joint', finished: false });
    expect(p!.right.angle).toBeCloseTo(46, 9);
    expect(q!.left.angle).toBeCloseTo(46, 9);
    expect(q!.right.angle).toBeCloseTo(90, 9);
    expect(p!.back - p!.front).toBeCloseTo(25 / Math.tan((46 * Math.PI) / 180), 10);
    expect(p!.area).toBeCloseTo((25 * (p!.back + p!.front)) / 2, 9);
  });

  it('lays the shape good face up, front edge at 0, left end at 0', () => {
    const [p] = l().pieces;
    const setBack = 25 / Math.tan((46 * Math.PI) / 180);
    expect(p!.shape).toEqual([
      [0, 0],
      [expect.closeTo(p!.back - setBack, 9), 0],
      [expect.closeTo(p!.back, 9), 25],
      [0, 25],
    ]);
  });

  it('keeps letters by piece key, never gives one twice, and goes on after Z with P2', () => {
    const kept = l({ letters: { '2.1': 'P', gone: 'Q' } }).pieces.map((piece) => [piece.key, piece.letter]);
    expect(kept).toEqual([
      ['1.1', 'R'],
      ['2.1', 'P'],
    ]);
    const strips = Array.from({ length: 12 }, (_, i) => ({
      id: `s${i}`,
      label: 'filler',
      length: 20,
      width: 3,
      thickness: 0.75,
      count: 2,
    }));
    const letters = layTops(layout({ strips }), room([90], []), DEFAULT_SETTINGS).pieces.map((piece) => piece.letter);
    expect(letters.join(' ')).toBe('P Q R S T U V W X Y Z P2');
  });

  it('carries a diagonal front as a wing below the front edge', () => {
    const tops = l({ joints: [{ between: ['1', '2'], kind: 'diagonal', width: 17, assembled: 'shop' }] });
    const [p] = tops.pieces;
    expect(p!.shape).toHaveLength(5);
    expect(Math.min(...p!.shape.map(([, y]) => y))).toBe(0);
    expect(p!.depth).toBeGreaterThan(25);
    const plain = l();
    const wing =
      tops.pieces.reduce((sum, piece) => sum + piece.area, 0) -
      plain.pieces.reduce((sum, piece) => sum + piece.area, 0);
    // The triangle before the fronts' corner of 92 degrees: two sides of s = 17 / (2 sin 46), s^2 sin 92 / 2.
    const s = 17 / (2 * Math.sin((46 * Math.PI) / 180));
    expect(wing).toBeCloseTo((s * s * Math.sin((92 * Math.PI) / 180)) / 2, 9);
    expect(unionArea(tops.pieces.map((piece) => piece.outline))).toBeCloseTo(
      tops.pieces.reduce((sum, piece) => sum + piece.area, 0),
      2,
    );
  });

  it('makes a waterfall leg its own piece, grain down, bevelled 45 degrees against the top', () => {
    const end = { kind: 'waterfall', overhang: 1, height: 36 } as const;
    const tops = layTops(
      layout({ runs: [run('1', 'A', { left: end, right: end })] }),
      room([60], []),
      DEFAULT_SETTINGS,
    );
    const [top, left, right] = tops.pieces;
    expect(top!.back).toBe(62);
    expect([top!.left.bevel, top!.right.bevel]).toEqual([45, 45]);
    expect(left).toMatchObject({ key: '1.L', kind: 'leg', back: 36, depth: 25, finishedEdges: ['front', 'left'] });
    expect(left!.right).toMatchObject({ kind: 'waterfall', bevel: 45 });
    expect(right).toMatchObject({ key: '1.R', kind: 'leg', finishedEdges: ['front', 'right'] });
    expect(right!.left).toMatchObject({ kind: 'waterfall', bevel: 45 });
    // Folded flat, they continue the top on both sides.
    expect(unionArea(tops.pieces.map((piece) => piece.outline))).toBeCloseTo((62 + 2 * 36) * 25, 2);
  });

  it('numbers the far side of a peninsula left to right as seen from the room', () => {
    const long = run('1', 'A', { side: 'back', left: FLUSH, right: FLUSH });
    const tops = layTops(layout({ runs: [long], seams: [{ on: '1', at: 40 }] }), room([90], []), DEFAULT_SETTINGS);
    expect(tops.pieces.map((piece) => [piece.key, piece.back])).toEqual([
      ['1.1', 40],
      ['1.2', 50],
    ]);
    expect(tops.pieces[0]!.grain).toEqual([-1, expect.closeTo(0)]);
    expect(tops.seams[0]!.letters).toEqual(['P', 'Q']);
  });
});

describe('islands', () => {
  const island = (more: Partial<Layout['islands'][number]>, rest: Partial<Layout> = {}) =>
    layTops(
      layout({ islands: [{ id: 'I', length: 72, depth: 24, ...more }], ...rest }),
      room([90], []),
      DEFAULT_SETTINGS,
    );

  it('finishes all four sides and stands where it is put, turned by its bearing', () => {
    const [piece] = island({ at: [10, -80], bearing: 90 }).pieces;
    expect(piece!.finishedEdges).toEqual(['front', 'back', 'left', 'right']);
    const box = [Math.min(...piece!.outline.map(([x]) => x)), Math.max(...piece!.outline.map(([, y]) => y))];
    expect(box).toEqual([expect.closeTo(10 - 24, 10), expect.closeTo(-80 + 72, 10)]);
    expect(piece!.grain).toEqual([expect.closeTo(0), expect.closeTo(1)]);
  });

  it('clips 4 in off every corner, rounds by a radius at its ends, and keeps an L as it is drawn', () => {
    expect(island({ shape: 'clipped', corner: 4 }).pieces[0]!.area).toBeCloseTo(72 * 24 - 2 * 16, 10);
    const [rounded] = island({ shape: 'rounded', corner: 6 }).pieces;
    expect([rounded!.left.radius, rounded!.right.radius, rounded!.area]).toEqual([6, 6, 72 * 24]);
    const outline: Polygon = [
      [0, 0],
      [60, 0],
      [60, 12],
      [20, 12],
      [20, 24],
      [0, 24],
    ];
    const [piece] = island({ shape: 'free', outline }).pieces;
    expect(piece!.area).toBe(60 * 12 + 20 * 12);
    expect([piece!.front, piece!.back]).toEqual([60, 20]);
  });

  it('says what is wrong with an outline that cannot be cut', () => {
    const sentence = (more: Partial<Layout['islands'][number]>) =>
      island(more).problems.map((problem) => problem.message);
    expect(sentence({ depth: 0 })).toEqual(['Island I has no depth. Type how deep the top is.']);
    expect(sentence({ shape: 'free' })).toEqual(['Island I has no outline yet. Give it at least three corners.']);
    const bow: Polygon = [
      [0, 0],
      [10, 10],
      [10, 0],
      [0, 10],
    ];
    expect(sentence({ shape: 'free', outline: bow })).toEqual(['Island I has an outline that crosses itself.']);
    expect(sentence({ shape: 'clipped', corner: 12 })).toEqual(['Island I cannot lose 12 in at every corner.']);
  });
});

describe('cutouts', () => {
  it('leaves 2 in before and behind a 21 in sink in a 25 in top and takes its rounded area off', () => {
    const tops = one({ cutouts: [sink] });
    expect(tops.cutouts[0]).toMatchObject({
      frontStrip: 2,
      backStrip: 2,
      endGrain: 42,
      letters: ['P'],
      label: 'Sink c1',
    });
    const arcs = (4 - Math.PI) * 0.75 ** 2;
    // Flattened arcs lie inside the true ones by 1/128 in at most.
    expect(Math.abs(area(tops.cutouts[0]!.outline) - (30 * 21 - arcs))).toBeLessThan((2 * Math.PI * 0.75) / 128);
    expect(tops.pieces[0]!.netArea).toBeCloseTo(90 * 25 - area(tops.cutouts[0]!.outline), 9);
    expect(tops.problems).toEqual([]);
  });

  it('keeps every chord of a flattened arc within 1/128 in', () => {
    const [cut] = one({ cutouts: [{ ...sink, radius: 8 }] }).cutouts;
    const outline = cut!.outline;
    const centre = [48 - 15 + 8, -25.25 + 2 + 8] as const;
    const onArc = outline.filter(([x, y]) => x <= centre[0] && y <= centre[1]);
    for (let i = 1; i < onArc.length; i++) {
      const middle = [(onArc[i]![0] + onArc[i - 1]![0]) / 2, (onArc[i]![1] + onArc[i - 1]![1]) / 2];
      expect(8 - Math.hypot(middle[0]! - centre[0], middle[1]! - centre[1])).toBeLessThanOrEqual(1 / 128 + 1e-12);
    }
    expect(onArc.length).toBeGreaterThan(5);
  });

  it('opens an apron-front sink to the front edge and takes a template over the typed size', () => {
    const apron = one({ cutouts: [{ ...sink, mount: 'apron', radius: 0 }] });
    expect(apron.cutouts[0]).toMatchObject({ frontStrip: 0, backStrip: 2 });
    expect(apron.pieces[0]!.netArea).toBeCloseTo(90 * 25 - 30 * 23, 9);
    expect(apron.problems).toEqual([]);
    const template: Polygon = [
      [-14, 0],
      [14, 0],
      [14, 18],
      [0, 20],
      [-14, 18],
    ];
    const made = one({ cutouts: [{ ...sink, outline: template }] });
    expect(made.cutouts[0]).toMatchObject({ width: 28, depth: 20, frontStrip: 2, backStrip: 3 });
    expect(made.pieces[0]!.netArea).toBeCloseTo(90 * 25 - 28 * 18 - 28, 9);
  });

  it('lets a notch run out at the back edge, and says so of a sink', () => {
    const notch = one({ cutouts: [{ ...sink, kind: 'notch', width: 4, depth: 6, setback: 22, radius: 0 }] });
    expect(notch.problems).toEqual([]);
    expect(notch.pieces[0]!.netArea).toBeCloseTo(90 * 25 - 4 * 3, 9);
    const over = one({ cutouts: [{ ...sink, setback: 5 }] });
    expect(over.problems.map((problem) => problem.message)).toEqual([
      'Sink c1 reaches 1 in past the back edge of top 1.',
    ]);
    const off = one({ cutouts: [{ ...sink, centre: 200 }] });
    expect(off.problems.map((problem) => problem.message)).toEqual(['Sink c1 lies off top 1.']);
    const end = one({ cutouts: [{ ...sink, centre: 80 }] });
    expect(end.problems.map((problem) => problem.message)).toEqual(['Sink c1 reaches past the end of top 1.']);
    expect(end.pieces[0]!.cutouts).toHaveLength(1);
  });

  it('cuts a corner sink out of both tops at their miter', () => {
    const corner: Cutout = { ...sink, kind: 'free', on: '2', centre: 12, setback: 4, width: 20, depth: 12, radius: 1 };
    const tops = l({ cutouts: [corner] });
    expect(tops.cutouts[0]!.letters).toEqual(['P', 'Q']);
    const taken = tops.pieces.reduce((sum, piece) => sum + piece.area - piece.netArea, 0);
    expect(taken).toBeCloseTo(
      sharedArea(
        tops.pieces.map((piece) => piece.outline),
        [tops.cutouts[0]!.outline],
      ),
      2,
    );
  });

  it('names cutouts that run into each other, have no size, or no top', () => {
    const tops = one({
      cutouts: [
        sink,
        { ...sink, id: 'c2', kind: 'cooktop', centre: 60 },
        { ...sink, id: 'c3', width: 0 },
        { ...sink, id: 'c4', on: '9', label: 'Bar sink' },
      ],
    });
    expect(tops.problems.map((problem) => problem.message)).toEqual([
      'Sink c3 has no size. Type its width and depth.',
      'Bar sink is cut in top 9, which is not laid.',
      'Sink c1 and Cooktop c2 run into each other on top 1.',
    ]);
  });

  it('agrees with an independent clipper on the net area, wherever cutouts lie', () => {
    const cutout = fc.record({
      kind: fc.constantFrom('sink' as const, 'cooktop' as const, 'tap' as const, 'notch' as const, 'free' as const),
      on: fc.constantFrom('1', '2', 'I'),
      centre: fc.double({ min: -10, max: 100, noNaN: true }),
      setback: fc.double({ min: -6, max: 24, noNaN: true }),
      width: fc.double({ min: 1, max: 40, noNaN: true }),
      depth: fc.double({ min: 1, max: 24, noNaN: true }),
      radius: fc.double({ min: 0, max: 4, noNaN: true }),
      apron: fc.boolean(),
      template: fc.boolean(),
    });
    const notched: Polygon = [
      [-9, 0],
      [9, 0],
      [9, 5],
      [2, 5],
      [2, 12],
      [-9, 12],
    ];
    fc.assert(
      fc.property(cutout, fc.boolean(), ({ apron, template, ...shape }, free) => {
        const tops = l({
          cutouts: [
            { id: 'c', ...shape, ...(apron && { mount: 'apron' as const }), ...(template && { outline: notched }) },
          ],
          seams: [{ on: '1', at: 40 }],
          islands: [
            {
              id: 'I',
              length: 90,
              depth: 24,
              ...(free
                ? {
                    shape: 'free' as const,
                    outline: [
                      [0, 0],
                      [90, 0],
                      [90, 10],
                      [30, 14],
                      [30, 24],
                      [0, 24],
                    ] as Polygon,
                  }
                : { shape: 'clipped' as const, corner: 5 }),
            },
          ],
        });
        const cut = tops.cutouts.map((placed) => placed.outline);
        for (const piece of tops.pieces) {
          const touches = piece.cutouts.length > 0 || shape.on === piece.on;
          const expected = touches ? differenceArea([piece.outline], cut) : piece.area;
          expect(Math.abs(piece.netArea - expected)).toBeLessThan(2e-3);
        }
      }),
      { seed: 77, numRuns: 400 },
    );
  });
});
