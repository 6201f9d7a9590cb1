import fc from 'fast-check';
import type { Layout, RunEnd } from '@/geometry/core/layout';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { layTops } from '@/geometry/seams/lay-tops';
import { seamAlternatives } from '@/geometry/seams/seam-alternatives';
import { layout, room } from '../../helpers/tops-builder';

/** Sixteenths from low to high, inches: whatever a person may type. */
const tape = (low: number, high: number) => fc.integer({ min: low * 16, max: high * 16 }).map((n) => n / 16);

const end: fc.Arbitrary<RunEnd> = fc.oneof(
  { weight: 8, arbitrary: fc.constant<RunEnd>({ kind: 'joint' }) },
  tape(-1, 2).map((clearance): RunEnd => ({ kind: 'wall', clearance })),
  fc.tuple(tape(-4, 20), tape(0, 6)).map(([overhang, radius]): RunEnd => ({ kind: 'open', overhang, radius })),
  tape(-4, 4).map((overhang): RunEnd => ({ kind: 'appliance', overhang })),
  fc.tuple(tape(-2, 4), tape(-5, 120)).map(([overhang, height]): RunEnd => ({ kind: 'waterfall', overhang, height })),
);
/** Mostly the wall of the run's own number, so that many runs meet. */
const wall = fc.constantFrom(null, null, null, 'A', 'B', 'C', 'Z');
const top = fc.constantFrom('1', '2', '1', '2', '3', '4', 'I', 'J', 's', 'gone');
const points = fc.array(fc.tuple(tape(-10, 90), tape(-10, 60)), { minLength: 0, maxLength: 7 });

const anything: fc.Arbitrary<Partial<Layout>> = fc.record({
  runs: fc
    .array(
      fc.record({
        wall,
        from: tape(-20, 130),
        to: fc.oneof(fc.constant('end' as const), tape(-20, 160)),
        depth: fc.oneof(tape(-2, 70), fc.constant(25)),
        backGap: tape(0, 3),
        left: end,
        right: end,
        side: fc.constantFrom('front' as const, 'front' as const, 'front' as const, 'back' as const),
      }),
      { maxLength: 4 },
    )
    .map((runs) => runs.map((run, i) => ({ ...run, wall: run.wall ?? 'ABC'[i % 3]!, id: String(i + 1) }))),
  islands: fc
    .array(
      fc.record(
        {
          length: tape(-1, 220),
          depth: tape(-1, 90),
          at: fc.tuple(tape(-50, 200), tape(-200, 20)),
          bearing: fc.integer({ min: -400, max: 400 }),
          shape: fc.constantFrom('rectangle' as const, 'clipped' as const, 'rounded' as const, 'free' as const),
          corner: tape(-2, 40),
          outline: points,
        },
        { requiredKeys: ['length', 'depth'] },
      ),
      { maxLength: 2 },
    )
    .map((islands) => islands.map((island, i) => ({ ...island, id: 'IJ'[i]! }))),
  strips: fc.array(
    fc.record({
      id: fc.constant('s'),
      label: fc.constant('filler'),
      length: tape(-1, 300),
      width: tape(-1, 30),
      thickness: fc.constantFrom(0.75, 1.5),
      count: fc.integer({ min: -1, max: 4 }),
    }),
    { maxLength: 1 },
  ),
  cutouts: fc
    .array(
      fc.record(
        {
          on: top,
          kind: fc.constantFrom('sink' as const, 'cooktop' as const, 'tap' as const, 'notch' as const, 'free' as const),
          mount: fc.constantFrom('drop-in' as const, 'undermount' as const, 'apron' as const),
          centre: tape(-30, 200),
          setback: tape(-10, 40),
          width: tape(-1, 60),
          depth: tape(-1, 40),
          radius: tape(0, 30),
          outline: points,
        },
        { requiredKeys: ['on', 'kind', 'centre', 'setback', 'width', 'depth', 'radius'] },
      ),
      { maxLength: 3 },
    )
    .map((cutouts) => cutouts.map((cutout, i) => ({ ...cutout, id: `c${i}` }))),
  joints: fc.array(
    fc.record(
      {
        between: fc.tuple(top, top),
        kind: fc.constantFrom('miter' as const, 'butt' as const, 'diagonal' as const),
        through: top,
        width: tape(-1, 60),
        angle: fc.integer({ min: -10, max: 190 }),
        assembled: fc.constantFrom('shop' as const, 'site' as const),
      },
      { requiredKeys: ['between', 'kind', 'assembled'] },
    ),
    { maxLength: 3 },
  ),
  seams: fc.array(fc.record({ on: top, at: tape(-20, 220) }), { maxLength: 4 }),
});

function numbers(value: unknown): readonly number[] {
  if (typeof value === 'number') return [value];
  return typeof value === 'object' && value !== null ? Object.values(value).flatMap(numbers) : [];
}

describe('layTops, whatever is typed', () => {
  it('never fails, gives only finite numbers, and names every run it leaves out', () => {
    const lengths = fc.tuple(tape(1, 200), tape(1, 200), tape(1, 200));
    const angles = fc.tuple(fc.integer({ min: 20, max: 340 }), fc.integer({ min: 20, max: 340 }));
    const seen = { pieces: 0, joints: 0, seams: 0, cutouts: 0, problems: 0 };
    fc.assert(
      fc.property(anything, lengths, angles, (typed, walls, corners) => {
        const at = room(walls, corners);
        const tops = layTops(layout(typed), at, DEFAULT_SETTINGS);
        expect(numbers(tops).every(Number.isFinite)).toBe(true);
        expect(tops.pieces.every((piece) => piece.area > 0 && piece.shape.length > 2)).toBe(true);
        const laid = new Set(tops.runs.map((run) => run.id));
        const named = new Set(tops.problems.map((problem) => problem.at.run));
        expect((typed.runs ?? []).every((run) => laid.has(run.id) || named.has(run.id))).toBe(true);
        for (const key of Object.keys(seen) as (keyof typeof seen)[]) seen[key] += tops[key].length;
        for (const set of seamAlternatives(layout(typed), at, DEFAULT_SETTINGS)) {
          expect(numbers(set).every(Number.isFinite)).toBe(true);
        }
      }),
      { seed: 3, numRuns: 1500 },
    );
    // Nonsense is not all there was: things were laid, too.
    expect(Math.min(...Object.values(seen))).toBeGreaterThan(100);
  });
});
