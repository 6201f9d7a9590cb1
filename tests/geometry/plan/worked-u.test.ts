import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { makePlan } from '@/geometry/plan/make-plan';
import { formatLength } from '@/geometry/tape/format-length';
import { parseJobFile } from '@/shared/layout/parse-job-file';

/**
 * A U worked on paper. Walls A 96, B 120, C 84 in; corners 91 degrees (A to B) and 88 degrees (B to C) by protractor, no
 * reading to spare. Back gap 1/4 in all round. Depths 25, 25 and 24 in. The run on A begins at 14 with 1 in of overhang
 * (13 on the wall), the run on C stops 1/8 in before a range at 60 (59 7/8). Sink 30 by 17 in at 60 on B, 3 in from the
 * front; no slab is over 96 in, so that the run on B is parted at the sink's middle.
 *
 * Lines p and q off the two walls of a corner t meet at (q + p cos t) / sin t from the corner along the first wall, and
 * at (p + q cos t) / sin t along the second: plane trigonometry, nothing of the program.
 */
const rad = Math.PI / 180;
const T1 = 91 * rad;
const T2 = 88 * rad;
const meet = (p: number, q: number, t: number) => (q + p * Math.cos(t)) / Math.sin(t);

const joint = { kind: 'joint' } as const;
const JOB = {
  format: 'offsquare-job',
  version: 1,
  name: 'Worked U',
  units: 'in',
  step: '1/16',
  room: {
    closed: false,
    walls: [
      { id: 'A', length: '96' },
      { id: 'B', length: '120' },
      { id: 'C', length: '84' },
    ],
    corners: [
      { between: ['A', 'B'], nominal: 90, angle: 91 },
      { between: ['B', 'C'], nominal: 90, angle: 88 },
    ],
    ties: [],
  },
  bases: [{ id: 'b1', wall: 'B', from: 42, to: 78, kind: 'sink base' }],
  runs: [
    { id: '1', wall: 'A', from: 14, to: 'end', depth: 25, backGap: 0.25, left: { kind: 'open', overhang: 1, radius: 1 }, right: joint }, // prettier-ignore
    { id: '2', wall: 'B', from: 0, to: 'end', depth: 25, backGap: 0.25, left: joint, right: joint },
    { id: '3', wall: 'C', from: 0, to: 60, depth: 24, backGap: 0.25, left: joint, right: { kind: 'appliance', overhang: -0.125 } }, // prettier-ignore
  ],
  joints: [
    { between: ['1', '2'], kind: 'miter', assembled: 'site' },
    { between: ['2', '3'], kind: 'miter', assembled: 'site' },
  ],
  cutouts: [
    {
      id: 'c1',
      on: '2',
      kind: 'sink',
      mount: 'undermount',
      centre: 60,
      setback: 3,
      width: 30,
      depth: 17,
      radius: 0.75,
    },
  ],
  material: { species: 'hard maple', thickness: 1.5, slabDepth: 25, stave: 1.75, faces: 'both', grain: 'mixed' },
  stock: { slabs: [{ id: 'M96', length: 96, depth: 25, price: 37_900, count: null }], kerf: 0.125, trim: 0.5 },
} as const;

function plan() {
  const parsed = parseJobFile(JOB);
  if (!parsed.ok) throw new Error(parsed.errors[0]!.message);
  return makePlan({ layout: parsed.layout, settings: DEFAULT_SETTINGS, nest: null });
}

describe('a U worked on paper, mark by mark', () => {
  const { pieces, joints, seams, cutouts, findings } = plan();
  const piece = (letter: string) => pieces.find((one) => one.letter === letter)!;

  it('cuts four pieces and has nothing that must be fixed', () => {
    expect(pieces.map((one) => one.letter)).toEqual(['P', 'Q', 'R', 'S']);
    expect(findings.filter((one) => one.severity === 'stop')).toEqual([]);
  });

  // Back and front edge of each piece: worked out to 1e-6, and as they are marked with a tape.
  const EDGES = [
    ['P', 96 - meet(0.25, 0.25, T1) - 13, '82 3/4', 96 - meet(25.25, 25.25, T1) - 13, '58 3/16'],
    ['Q', 60 - meet(0.25, 0.25, T1), '59 3/4', 60 - meet(25.25, 25.25, T1), '35 3/16'],
    ['R', 60 - meet(0.25, 0.25, T2), '59 3/4', 60 - meet(25.25, 24.25, T2), '34 7/8'],
    ['S', 59.875 - meet(0.25, 0.25, T2), '59 5/8', 59.875 - meet(24.25, 25.25, T2), '33 3/4'],
  ] as const;

  it.each(EDGES)('marks %s from point to point, behind and in front', (letter, back, backMark, front, frontMark) => {
    const one = piece(letter);
    expect(Math.abs(one.back - back)).toBeLessThan(1e-6);
    expect(Math.abs(one.front - front)).toBeLessThan(1e-6);
    expect([one.back, one.front].map((inches) => formatLength(inches, '1/16'))).toEqual([backMark, frontMark]);
    expect(Math.abs(one.area - ((back + front) / 2) * one.depth)).toBeLessThan(1e-4);
  });

  it('cuts the first corner at half its angle and the second, of 25 on 24 in, so that both faces are one length', () => {
    const f = Math.atan2(25 * Math.sin(T2), 24 + 25 * Math.cos(T2));
    const marks = [
      [25 / Math.sin(45.5 * rad), '35 1/16', 45.5, 45.5],
      [25 / Math.sin(f), '35 1/4', f / rad, 88 - f / rad],
    ] as const;
    expect(Math.abs(25 / Math.sin(f) - 24 / Math.sin(T2 - f))).toBeLessThan(1e-9);
    marks.forEach(([length, mark, left, right], i) => {
      expect(Math.abs(joints[i]!.length - length)).toBeLessThan(1e-6);
      expect(formatLength(joints[i]!.length, '1/16')).toBe(mark);
      expect(Math.abs(joints[i]!.angles[0] - left)).toBeLessThan(1e-6);
      expect(Math.abs(joints[i]!.angles[1] - right)).toBeLessThan(1e-6);
    });
    // On the pieces: the long point is at the back of all four, the free ends are square.
    const ends = pieces.map(({ left, right }) => [left.angle, right.angle]);
    const on = (angles: readonly number[]) => angles.map((angle) => expect.closeTo(angle, 6) as number);
    expect(ends).toEqual([on([90, 45.5]), on([45.5, 90]), on([90, f / rad]), on([88 - f / rad, 90])]);
    // The front corner of Q is set back 25 / tan 45.5 from its long point.
    expect(piece('Q').back - piece('Q').front).toBeCloseTo(25 / Math.tan(45.5 * rad), 9);
  });

  it('parts the long run at 60 in, in the middle of the sink, where 3 and 5 in of seam show', () => {
    expect(seams).toHaveLength(1);
    expect(seams[0]).toMatchObject({ on: '2', letters: ['Q', 'R'], inCutout: 'c1', pinned: false });
    expect(Math.abs(seams[0]!.at - 60)).toBeLessThan(1e-6);
    expect(Math.abs(seams[0]!.visible - 8)).toBeLessThan(1e-6);
    expect([cutouts[0]!.frontStrip, cutouts[0]!.backStrip]).toEqual([3, 5]);
    expect(cutouts[0]!.endGrain).toBe(34);
  });

  it('marks the sink on both halves: 44 3/4 in from the long point of Q, and 15 in into R from its seam', () => {
    const box = (letter: string) => {
      const { outline } = piece(letter).cutouts[0]!;
      const [xs, ys] = [outline.map(([x]) => x), outline.map(([, y]) => y)];
      return [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
    };
    const long = meet(0.25, 0.25, T1);
    const near = (values: readonly number[]) => values.map((value) => expect.closeTo(value, 6) as number);
    expect(box('Q')).toEqual(near([45 - long, 60 - long, 3, 20]));
    expect(formatLength(45 - long, '1/16')).toBe('44 3/4');
    expect(box('R')).toEqual(near([0, 15, 3, 20]));
    // Half the sink: 15 by 17 in less two corners of 3/4 in radius, (1 - pi / 4) r^2 each; arcs are chords to 1/128 in.
    const hole = 15 * 17 - 2 * (1 - Math.PI / 4) * 0.75 ** 2;
    for (const letter of ['Q', 'R']) expect(piece(letter).area - piece(letter).netArea).toBeCloseTo(hole, 1);
  });
});
