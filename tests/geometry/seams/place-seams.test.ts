import fc from 'fast-check';
import type { Base, Cutout, Layout } from '@/geometry/core/layout';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { layTops } from '@/geometry/seams/lay-tops';
import type { Tops } from '@/geometry/top/types';
import { FLUSH, JOINT, layout, room, run, WALL } from '../../helpers/tops-builder';

/** One straight run over a wall of this length, both ends open and flush. */
const straight = (length: number, more: Partial<Layout> = {}): Tops =>
  layTops(layout({ runs: [run('1', 'A')], ...more }), room([length], []), DEFAULT_SETTINGS);
const places = (tops: Tops) => tops.seams.map((seam) => seam.at);
const lengths = (tops: Tops) => tops.pieces.map((piece) => Math.max(piece.back, piece.front));
const messages = (tops: Tops) => tops.problems.map((problem) => problem.message);
const access = { doorWidth: 32, doorHeight: 80, corridor: null, crew: 2 } as const;

const sink = (centre: number, more: Partial<Cutout> = {}): Cutout => ({
  id: 'c1',
  on: '1',
  kind: 'sink',
  centre,
  setback: 2,
  width: 30,
  depth: 21,
  radius: 0.75,
  ...more,
});
const base = (kind: Base['kind'], from: number, to: number): Base => ({
  id: kind,
  wall: 'A',
  from,
  to,
  kind,
  depth: 24,
  access: 'open',
});

describe('placeSeams, where a seam is needed', () => {
  it('cuts nothing that a 96 in slab gives between its 1/2 in trims, and one seam a hair over it', () => {
    expect(places(straight(95))).toEqual([]);
    expect(places(straight(95.01))).toHaveLength(1);
    expect(places(straight(190))).toEqual([expect.closeTo(95, 9)]);
    expect(places(straight(190.01))).toHaveLength(2);
  });

  it('counts a mitred piece between its long points', () => {
    const mitred = (length: number) =>
      layTops(
        layout({ runs: [run('1', 'A', { right: JOINT }), run('2', 'B', { left: JOINT })] }),
        room([length, 60], [90]),
        DEFAULT_SETTINGS,
      );
    expect(places(mitred(95.25))).toEqual([]);
    expect(places(mitred(95.26))).toHaveLength(1);
  });

  it('cuts what cannot be carried in: sqrt(L^2 + 1.5^2) over the clear length', () => {
    const carried = (length: number) => places(straight(length, { access: { ...access, clearLength: 80 } }));
    expect(carried(79.98)).toEqual([]);
    expect(carried(79.99)).toHaveLength(1);
  });

  it('takes a long rack piece for one top whole, but not for two', () => {
    const stock = { ...layout().stock, rack: [{ id: 'R', length: 120, depth: 26 }] };
    const runs = [run('1', 'A'), run('2', 'C')];
    const tops = layTops(layout({ runs, stock }), room([110, 90, 112], [90, 90]), DEFAULT_SETTINGS);
    expect(tops.seams.map((seam) => seam.on)).toEqual(['1']);
  });

  it('goes round a defect that crosses the slab, and round none that leaves the depth', () => {
    const slab = (defects: Layout['stock']['slabs'][number]['defects']) => ({
      ...layout().stock,
      slabs: [{ id: 'S', length: 96, depth: 30, price: 1, count: null, defects }],
    });
    expect(places(straight(80, { stock: slab([{ x: 60, y: 0, w: 3, h: 30 }]) }))).toHaveLength(1);
    expect(places(straight(80, { stock: slab([{ x: 60, y: 27, w: 3, h: 3 }]) }))).toEqual([]);
  });

  it('knows no limit where no slab is listed', () => {
    expect(places(straight(400, { stock: { ...layout().stock, slabs: [] } }))).toEqual([]);
  });
});

describe('placeSeams, where a seam goes', () => {
  it('takes the middle of the sink, where 2 in before and 2 in behind stay in view', () => {
    const tops = straight(150, { cutouts: [sink(70)] });
    expect(tops.seams).toEqual([expect.objectContaining({ at: 70, inCutout: 'c1', pinned: false })]);
    expect(tops.seams[0]!.visible).toBeCloseTo(4, 10);
    expect(tops.seams[0]!.from).toEqual([70, expect.closeTo(-0.25, 10)]);
    expect(tops.seams[0]!.to).toEqual([70, expect.closeTo(-25.25, 10)]);
  });

  it('stays radius + 1 in inside the sink where the slab does not reach its middle', () => {
    // 95 in reaches to 95; the sink spans 93.2 to 123.2, so inside it a seam may stand at 94.95 at the least.
    const tops = straight(185, { cutouts: [sink(108.2)] });
    expect(places(tops)[0]).toBeGreaterThanOrEqual(94.95 - 1e-9);
    expect(places(tops)[0]).toBeLessThanOrEqual(95 + 1e-9);
    const short = straight(185, { cutouts: [sink(108.3)] });
    expect(places(short)[0]).toBeLessThanOrEqual(93.3 - 6 + 1e-9);
  });

  it('keeps 1 in clear of a tap hole behind the sink', () => {
    const tap = sink(70, { id: 't', kind: 'tap', setback: 23.3, width: 1.375, depth: 1.375 });
    const [at] = places(straight(150, { cutouts: [sink(70), tap] }));
    expect(Math.abs(at! - 70)).toBeCloseTo(1.6875, 9);
  });

  it('keeps off a dishwasher but for 3 in beside its cabinets', () => {
    const tops = straight(120, { bases: [base('dishwasher', 40, 64), base('opening', 64, 90)] });
    const [at] = places(tops);
    const over = (from: number, to: number) => at! > from + 3 + 1e-9 && at! < to - 3 - 1e-9;
    expect(over(40, 64)).toBe(false);
    expect(over(64, 90)).toBe(false);
    expect(messages(tops)).toEqual([]);
  });

  it('shares the length evenly where nothing else decides', () => {
    expect(places(straight(120))).toEqual([60]);
    expect(places(straight(270))).toEqual([90, 180]);
  });

  it('takes one seam more where the fewest cannot be placed', () => {
    const tops = straight(185, { bases: [base('opening', 80, 110)] });
    expect(lengths(tops).every((length) => length <= 95 + 1e-9)).toBe(true);
    expect(places(tops)).toHaveLength(2);
    expect(messages(tops)).toEqual([]);
  });

  it('cuts all the same where no place is allowed, and says which rule gives way', () => {
    const tops = straight(100, { bases: [base('dishwasher', 0, 100)] });
    expect(places(tops)).toHaveLength(1);
    expect(lengths(tops).every((length) => length <= 95)).toBe(true);
    expect(messages(tops)[0]).toMatch(
      /^Top 1 has to be cut, but no allowed place is left: the seam at .* in is over the dishwasher with no support within 3 in\.$/,
    );
    expect(tops.problems[0]!.severity).toBe('warn');
  });

  it('counts along the wall from its left end on the far side of a peninsula too', () => {
    const tops = layTops(
      layout({ runs: [run('1', 'A', { side: 'back' })], cutouts: [sink(40)] }),
      room([120], []),
      DEFAULT_SETTINGS,
    );
    expect(places(tops)).toEqual([40]);
    expect(tops.seams[0]!.inCutout).toBe('c1');
    expect(lengths(tops)).toEqual([40, 80]);
  });
});

describe('placeSeams, against every place tried', () => {
  const rulesAllow = (x: number, length: number, sinkAt: number, machine: readonly [number, number]): boolean => {
    const fromSink = Math.abs(x - sinkAt) - 15;
    const inSink = fromSink < 0;
    const sinkOk = inSink ? -fromSink >= 1.75 - 1e-9 : fromSink >= 6 - 1e-9;
    const overMachine = x > machine[0] + 3 + 1e-9 && x < machine[1] - 3 - 1e-9;
    const pieces = x <= 95 + 1e-9 && length - x <= 95 + 1e-9;
    return sinkOk && !overMachine && pieces && x >= 12 - 1e-9 && length - x >= 12 - 1e-9;
  };

  it('shows no more seam than the best of all places 1/8 in apart, and breaks no rule', () => {
    const length = fc.integer({ min: 96 * 8, max: 188 * 8 }).map((eighths) => eighths / 8);
    const share = fc.integer({ min: 0, max: 64 }).map((n) => n / 64);
    fc.assert(
      fc.property(length, share, share, (long, sinkShare, machineShare) => {
        const sinkAt = 16 + sinkShare * (long - 32);
        const from = machineShare * (long - 24);
        const tops = straight(long, { cutouts: [sink(sinkAt)], bases: [base('dishwasher', from, from + 24)] });
        let least = Infinity;
        for (let x = 0; x <= long; x += 1 / 8) {
          if (!rulesAllow(x, long, sinkAt, [from, from + 24])) continue;
          least = Math.min(least, Math.abs(x - sinkAt) < 15 ? 4 : 25);
        }
        const seams = places(tops);
        if (tops.problems.length > 0) expect(least).toBe(Infinity);
        else if (seams.length === 1) {
          expect(rulesAllow(seams[0]!, long, sinkAt, [from, from + 24])).toBe(true);
          expect(tops.seams[0]!.visible).toBeLessThanOrEqual(least + 1e-9);
        } else expect(least).toBe(Infinity);
      }),
      { seed: 21, numRuns: 400 },
    );
  });
});

describe('placeSeams, pinned seams', () => {
  it('keeps a pin to the last bit and adds no other where it is enough', () => {
    const tops = straight(150, { cutouts: [sink(70)], seams: [{ on: '1', at: 61.03125 }] });
    expect(tops.seams).toEqual([expect.objectContaining({ at: 61.03125, pinned: true, inCutout: 'c1' })]);
    expect(messages(tops)).toEqual([]);
  });

  it('adds seams where a piece beside the pin is still too long', () => {
    const tops = straight(200, { seams: [{ on: '1', at: 40 }] });
    expect(tops.seams.map((seam) => [seam.at, seam.pinned])).toEqual([
      [40, true],
      [120, false],
    ]);
  });

  it.each([
    [
      'over the dishwasher',
      52,
      { bases: [base('dishwasher', 40, 64)] },
      'is over the dishwasher with no support within 3 in. The nearest allowed place is 43 in.',
    ],
    [
      'too near a sink corner',
      52,
      { cutouts: [sink(70)] },
      'is within 6 in of a corner of Sink c1. The nearest allowed place is 49 in.',
    ],
    [
      'too near inside a sink',
      55.5,
      { cutouts: [sink(70)] },
      'is within 1 3/4 in of a side of Sink c1. The nearest allowed place is 56 3/4 in.',
    ],
    ['near an open end', 8, {}, 'is within 12 in of an open end. The nearest allowed place is 12 in.'],
  ] as const)('leaves a pin %s and names the nearest allowed place', (_, at, more, why) => {
    const tops = straight(120, { ...more, seams: [{ on: '1', at }] });
    expect(tops.seams.some((seam) => seam.pinned && seam.at === at)).toBe(true);
    expect(messages(tops)).toEqual([`The seam pinned at ${at === 55.5 ? '55 1/2' : at} in on top 1 ${why}`]);
    expect(tops.problems[0]!.severity).toBe('warn');
  });

  it('explains a pin within 6 in of a miter, and one across it cannot stay', () => {
    const mitred = (at: number) =>
      layTops(
        layout({
          runs: [run('1', 'A', { right: JOINT }), run('2', 'B', { left: JOINT, right: WALL })],
          seams: [{ on: '1', at }],
        }),
        room([90, 60, 60], [90, 90]),
        DEFAULT_SETTINGS,
      );
    // The miter's front point stands at 90 - 25.25 = 64.75.
    expect(messages(mitred(60))).toEqual([
      'The seam pinned at 60 in on top 1 is within 6 in of a joint. The nearest allowed place is 58 3/4 in.',
    ]);
    expect(mitred(60).seams).toHaveLength(1);
    expect(messages(mitred(70))).toEqual([
      'The seam pinned at 70 in on top 1 would cut across the end of the top. The nearest allowed place is 58 3/4 in.',
    ]);
    expect(mitred(70).seams).toEqual([]);
    expect(messages(mitred(200))).toEqual([
      'The seam pinned at 200 in on top 1 misses the top. The nearest allowed place is 58 3/4 in.',
    ]);
  });

  it('explains two pins nearer than a piece may be short', () => {
    const tops = straight(120, {
      seams: [
        { on: '1', at: 60 },
        { on: '1', at: 66 },
      ],
    });
    expect(places(tops)).toEqual([60, 66]);
    expect(messages(tops)[0]).toBe(
      'The seam pinned at 60 in on top 1 is within 12 in of another seam. The nearest allowed place is 54 in.',
    );
  });
});

describe('placeSeams, islands', () => {
  const island = (length: number, depth: number, more: Partial<Layout> = {}) =>
    layTops(layout({ islands: [{ id: 'I', length, depth }], ...more }), room([60], []), DEFAULT_SETTINGS);

  it('splits a 39 in deep island along the grain: 25 in of slab and 14 in', () => {
    const tops = island(72, 39);
    expect(tops.seams).toEqual([
      expect.objectContaining({ on: 'I', at: 25, edge: true, letters: ['P', 'Q'], visible: 72 }),
    ]);
    expect(tops.pieces.map((piece) => [piece.key, piece.depth])).toEqual([
      ['I.1', 25],
      ['I.2', 14],
    ]);
    expect(tops.pieces.map((piece) => piece.finishedEdges)).toEqual([
      ['front', 'left', 'right'],
      ['back', 'left', 'right'],
    ]);
  });

  it('draws the seam of an L no longer than the wood on both sides of it', () => {
    const outline = [[0, 0], [70, 0], [70, 24], [40, 24], [40, 40], [0, 40]] as const; // prettier-ignore
    const free = { id: 'I', length: 70, depth: 40, shape: 'free', outline, at: [10, -90], bearing: 0 } as const;
    const [seam] = layTops(layout({ islands: [free] }), room([60], []), DEFAULT_SETTINGS).seams;
    expect(seam).toMatchObject({ at: 25, edge: true, visible: 40 });
    expect(Math.hypot(seam!.to[0] - seam!.from[0], seam!.to[1] - seam!.from[1])).toBeCloseTo(40, 9);
    expect(Math.min(seam!.from[0], seam!.to[0])).toBeCloseTo(10, 9);
  });

  it('leaves it whole where one deep rack piece holds it, and splits the next', () => {
    const stock = { ...layout().stock, rack: [{ id: 'R', length: 80, depth: 40 }] };
    const islands = ['I', 'J'].map((id) => ({ id, length: 72, depth: 39 }));
    const tops = layTops(layout({ islands, stock }), room([60], []), DEFAULT_SETTINGS);
    expect(tops.pieces.map((piece) => piece.key)).toEqual(['I.1', 'J.1', 'J.2']);
  });

  it('leaves no row under 3 in and no rip along the side of a sink', () => {
    expect(island(72, 26).pieces.map((piece) => piece.depth)).toEqual([23, 3]);
    const cutout = sink(36, { on: 'I', setback: 6, depth: 18 });
    const tops = island(72, 39, { cutouts: [cutout] });
    // The sink's back side is at 24: 25 is within 2 in of it, so the rip moves into the sink, 1 3/4 in off its side.
    expect(tops.seams[0]!.at).toBeCloseTo(22.25, 9);
    expect(tops.seams[0]!.visible).toBeCloseTo(72 - 30, 9);
  });

  it('staggers the cross seams of its rows by 12 in', () => {
    const tops = island(150, 48);
    const cross = tops.seams.filter((seam) => !seam.edge);
    expect(cross).toHaveLength(2);
    expect(Math.abs(cross[0]!.at - cross[1]!.at)).toBeGreaterThanOrEqual(12 - 1e-9);
    expect(cross.map((seam) => seam.visible)).toEqual([25, 23]);
    expect(new Set(tops.pieces.map((piece) => piece.letter)).size).toBe(4);
  });

  it('pins a seam on the front row, counted from the left end', () => {
    const tops = island(90, 39, { seams: [{ on: 'I', at: 45 }] });
    expect(tops.seams.filter((seam) => seam.pinned)).toEqual([expect.objectContaining({ at: 45, visible: 25 })]);
    expect(tops.pieces.map((piece) => [piece.back, piece.depth])).toEqual([
      [45, 25],
      [45, 25],
      [90, 14],
    ]);
  });

  it('splits a run deeper than every slab the same way, its miter going on through both rows', () => {
    const tops = layTops(
      layout({ runs: [run('1', 'A', { right: JOINT, depth: 30, left: FLUSH }), run('2', 'B', { left: JOINT })] }),
      room([80, 60], [90]),
      DEFAULT_SETTINGS,
    );
    const own = tops.pieces.filter((piece) => piece.on === '1');
    expect(own.map((piece) => piece.depth)).toEqual([25, 5]);
    expect(own[0]!.back).toBeCloseTo(own[1]!.front, 12);
    expect(own[0]!.right.angle).toBeCloseTo(own[1]!.right.angle, 9);
  });
});

describe('strips', () => {
  it('cuts a strip of the tops’ thickness evenly where it is longer than a slab, others only to be carried in', () => {
    const strips = (thickness: number, clearLength: number | null) =>
      layTops(
        layout({
          strips: [{ id: 's', label: 'backsplash', length: 118, width: 4, thickness, count: 2 }],
          access: { ...access, clearLength },
        }),
        room([60], []),
        DEFAULT_SETTINGS,
      );
    expect(strips(1.5, null).pieces.map((piece) => [piece.key, piece.back, piece.count])).toEqual([
      ['s.1', 59, 2],
      ['s.2', 59, 2],
    ]);
    expect(strips(0.75, null).pieces).toHaveLength(1);
    expect(strips(0.75, 100).seams).toEqual([expect.objectContaining({ on: 's', at: 59, visible: 4 })]);
  });

  it('says which strip has no size', () => {
    const strip = { id: 's', label: 'filler', length: 30, width: 0, thickness: 0.75, count: 1 };
    const tops = layTops(layout({ strips: [strip] }), room([60], []), DEFAULT_SETTINGS);
    expect(messages(tops)).toEqual(['filler has no width.']);
  });
});
