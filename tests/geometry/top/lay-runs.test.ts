import type { Layout, Run } from '@/geometry/core/layout';
import { distance } from '@/geometry/core/vector';
import { layRuns } from '@/geometry/top/lay-runs';
import type { SolvedRoom } from '@/geometry/top/solved-room';
import { FLUSH, JOINT, layout, room, run, WALL } from '../../helpers/tops-builder';

const lay = (runs: readonly Run[], at: SolvedRoom, more: Partial<Layout> = {}) =>
  layRuns(layout({ runs, ...more }), at);
const rad = Math.PI / 180;

describe('layRuns, ends', () => {
  it('cuts a wall end parallel to an 88 degree side wall, 1/4 in off it', () => {
    const laid = lay([run('1', 'B', { left: WALL, right: FLUSH })], room([60, 100], [88]));
    const [own] = laid.runs;
    // Off the side wall square to it: 1/4 / sin 88 along the wall, and the lean of 1/tan 88 for every inch out.
    const along = (out: number) => 0.25 / Math.sin(88 * rad) + out / Math.tan(88 * rad);
    expect(own!.backFrom).toBeCloseTo(along(0.25), 10);
    expect(own!.frontFrom).toBeCloseTo(along(25.25), 10);
    expect(laid.problems).toEqual([]);
  });

  it('ends open runs past their marks by the overhang and appliance runs short by a gap', () => {
    const ends: Partial<Run> = {
      from: 12,
      to: 72,
      left: { kind: 'open', overhang: 1, radius: 1 },
      right: { kind: 'appliance', overhang: -0.125 },
    };
    const [own] = lay([run('1', 'A', ends)], room([96], [])).runs;
    expect([own!.backFrom, own!.frontFrom, own!.backTo, own!.frontTo]).toEqual([11, 11, 71.875, 71.875]);
  });

  it('moves the back line out by the back gap and the highest bump between its ends', () => {
    const bowed = room([120], []);
    const walls = [
      {
        ...bowed.walls[0]!,
        profile: [
          { at: 0, off: 0 },
          { at: 40, off: -0.25 },
          { at: 80, off: 0.125 },
        ],
      },
    ];
    const backOf = (from: number, to: number) =>
      lay([run('1', 'A', { from, to })], { ...bowed, walls }).runs[0]!.back.origin[1];
    expect(backOf(0, 120)).toBeCloseTo(-0.5, 12);
    // Between 60 and 120 the bump has fallen to 1/16 at the left end.
    expect(backOf(60, 120)).toBeCloseTo(-0.25 - 0.0625, 12);
    expect(backOf(80, 120)).toBeCloseTo(-0.25, 12);
  });

  it('lays the far side of a peninsula as the mirror image of the room side', () => {
    const far = run('2', 'B', { left: WALL, right: FLUSH, side: 'back' });
    const laid = lay([run('1', 'B', { left: WALL, right: FLUSH }), far], room([60, 72], [90]));
    const [front, back] = laid.runs;
    const mirrored = front!.outline.map(([x, y]) => [120 - x, y]);
    for (const [x, y] of back!.outline) {
      expect(mirrored.some((p) => Math.hypot(p[0]! - x, p[1]! - y) < 1e-9)).toBe(true);
    }
    expect(laid.decks[1]!.sign).toBe(-1);
    expect(laid.problems).toEqual([]);
  });

  it('joins the far sides of two stub walls round the same corner, seen the other way', () => {
    const runs = [run('1', 'A', { right: JOINT, side: 'back' }), run('2', 'B', { left: JOINT, side: 'back' })];
    const [joint] = lay(runs, room([60, 60], [270])).joints;
    expect(joint!.corner / rad).toBeCloseTo(90, 10);
    expect(joint!.length).toBeCloseTo(25 * Math.SQRT2, 10);
    expect(joint!.to[0]).toBeCloseTo(60 - 25.25, 10);
    expect(joint!.to[1]).toBeCloseTo(25.25, 10);
  });
});

describe('layRuns, joints', () => {
  const legs = (left: Partial<Run> = {}, right: Partial<Run> = {}) => [
    run('1', 'A', { right: JOINT, ...left }),
    run('2', 'B', { left: JOINT, ...right }),
  ];

  it('lays three runs in a U of 92 and 88 degrees, every mark as worked on paper', () => {
    const runs = [
      run('1', 'A', { right: JOINT }),
      run('2', 'B', { left: JOINT, right: JOINT }),
      run('3', 'C', { left: JOINT }),
    ];
    const laid = lay(runs, room([96, 120, 84], [92, 88]));
    const [one, two, three] = laid.runs;
    // Equal depths halve the corners: 46 and 44 degrees, 25 / sin 46 = 34.7541 and 25 / sin 44 = 35.9889 long.
    expect(laid.joints.map((joint) => joint.length)).toEqual([expect.closeTo(34.7541, 3), expect.closeTo(35.9889, 3)]);
    // The back corner stands 1/4 off both walls: 0.25 / tan 46 = 0.2414 before the wall's end, the front 25.25 / tan 46.
    expect(one!.backTo).toBeCloseTo(96 - 0.25 / Math.tan(46 * rad), 10);
    expect(one!.frontTo).toBeCloseTo(96 - 25.25 / Math.tan(46 * rad), 10);
    expect(two!.backTo - two!.backFrom).toBeCloseTo(120 - 0.2414 - 0.2589, 3);
    expect(two!.frontTo - two!.frontFrom).toBeCloseTo(120 - 24.3837 - 26.1472, 3);
    expect(three!.frontFrom).toBeCloseTo(25.25 / Math.tan(44 * rad), 10);
    expect(laid.problems).toEqual([]);
  });

  it('lays a bay of 135s with joints of 27.0598 in and fronts longer at the outside', () => {
    const ids = ['A', 'B', 'C', 'D', 'E'];
    const runs = ids.map((wall, i) =>
      run(String(i + 1), wall, { left: i ? JOINT : FLUSH, right: i < 4 ? JOINT : FLUSH }),
    );
    const laid = lay(runs, room([80, 60, 80, 60, 80], [225, 135, 135, 225]));
    expect(laid.joints.map((joint) => joint.kind)).toEqual(['miter', 'miter', 'miter', 'miter']);
    for (const joint of laid.joints) expect(joint.length).toBeCloseTo(27.0598, 4);
    // The middle run loses 25 tan 22.5 = 10.3553 in at both ends.
    expect(laid.runs[2]!.frontTo - laid.runs[2]!.frontFrom).toBeCloseTo(
      laid.runs[2]!.backTo - laid.runs[2]!.backFrom - 20.7107,
      4,
    );
    expect(laid.problems).toEqual([]);
  });

  it('makes a square seam of equal depths at 177 degrees and a step of unequal ones', () => {
    const square = lay(legs(), room([60, 60], [177])).joints[0]!;
    expect(square.kind).toBe('square');
    expect(square.angles.map((angle) => angle / rad)).toEqual([expect.closeTo(88.5, 9), expect.closeTo(88.5, 9)]);
    expect(square.length).toBeCloseTo(25 / Math.sin(88.5 * rad), 10);
    const step = lay(legs({ depth: 18 }), room([60, 60], [180]));
    expect(step.joints[0]!.kind).toBe('step');
    expect(step.joints[0]!.length).toBeCloseTo(18, 10);
    expect(step.decks[1]!.left.finished).toBe(true);
    expect(step.decks[0]!.right.finished).toBe(false);
  });

  it('turns a square seam into a miter beyond 5 degrees', () => {
    expect(lay(legs(), room([60, 60], [175.01])).joints[0]!.kind).toBe('square');
    expect(lay(legs(), room([60, 60], [174.99])).joints[0]!.kind).toBe('miter');
  });

  it('lets either run go through a butt joint: on to the other back line, the other stopping at its front', () => {
    const butt = (through: string) =>
      lay(legs(), room([80, 80], [90]), {
        joints: [{ between: ['2', '1'], kind: 'butt', through, assembled: 'site' }],
      });
    const first = butt('1');
    expect([first.runs[0]!.backTo, first.runs[0]!.frontTo]).toEqual([
      expect.closeTo(79.75, 10),
      expect.closeTo(79.75, 10),
    ]);
    expect([first.runs[1]!.backFrom, first.runs[1]!.frontFrom]).toEqual([
      expect.closeTo(25.25, 10),
      expect.closeTo(25.25, 10),
    ]);
    expect(first.joints[0]).toMatchObject({ kind: 'butt', through: '1', assembled: 'site' });
    const second = butt('2');
    expect(second.runs[0]!.backTo).toBeCloseTo(80 - 25.25, 10);
    expect(second.runs[1]!.backFrom).toBeCloseTo(0.25, 10);
  });

  it('cuts both ends of a butt joint at the corner when it is not square', () => {
    const laid = lay(legs(), room([80, 80], [84]), {
      joints: [{ between: ['1', '2'], kind: 'butt', through: '1', assembled: 'shop' }],
    });
    const [joint] = laid.joints;
    expect(joint!.angles.map((angle) => angle / rad)).toEqual([expect.closeTo(84, 9), expect.closeTo(84, 9)]);
    expect(joint!.length).toBeCloseTo(25 / Math.sin(84 * rad), 10);
  });

  it('runs the through run past an outside corner to the other front', () => {
    const laid = lay(legs(), room([60, 60], [270]), {
      joints: [{ between: ['1', '2'], kind: 'butt', through: '1', assembled: 'shop' }],
    });
    expect(laid.runs[0]!.backTo).toBeCloseTo(60 + 25.25, 10);
    expect(laid.runs[1]!.backFrom).toBeCloseTo(-0.25, 10);
  });

  it('carries the miter on to a 17 in diagonal front across a square corner', () => {
    const joints: Layout['joints'] = [{ between: ['1', '2'], kind: 'diagonal', width: 17, assembled: 'shop' }];
    const laid = lay(legs(), room([80, 80], [90]), { joints });
    const [joint] = laid.joints;
    // Half the diagonal beyond the fronts' corner; the fronts end 17 / sqrt 2 before it.
    expect(joint!.length).toBeCloseTo(25 * Math.SQRT2 + 8.5, 10);
    expect(laid.runs[0]!.frontTo).toBeCloseTo(80 - 25.25 - 17 / Math.SQRT2, 10);
    expect(laid.runs[1]!.frontFrom).toBeCloseTo(25.25 + 17 / Math.SQRT2, 10);
    const wings = laid.decks.map((deck) => deck.left.wing ?? deck.right.wing);
    expect(wings.map((wing) => wing![1])).toEqual([
      expect.closeTo(-8.5 / Math.SQRT2, 10),
      expect.closeTo(-8.5 / Math.SQRT2, 10),
    ]);
  });

  it('turns the diagonal to a chosen angle: 30 and 60 degrees off the fronts', () => {
    const joints: Layout['joints'] = [
      { between: ['1', '2'], kind: 'diagonal', width: 20, angle: 30, assembled: 'shop' },
    ];
    const laid = lay(legs(), room([80, 80], [90]), { joints });
    expect(laid.runs[0]!.frontTo).toBeCloseTo(80 - 25.25 - 20 * Math.cos(30 * rad), 10);
    expect(laid.runs[1]!.frontFrom).toBeCloseTo(25.25 + 20 * Math.sin(30 * rad), 10);
  });

  it('joins the last wall of a closed room to the first', () => {
    const closed: SolvedRoom = {
      points: [
        [0, 0],
        [120, 0],
        [120, -100],
        [0, -100],
      ],
      closed: true,
      walls: ['A', 'B', 'C', 'D'].map((id, i) => ({ id, length: i % 2 ? 100 : 120, profile: [] })),
      corners: [{ between: ['D', 'A'], angle: 90, sd: 0.25 }],
    };
    const laid = lay([run('1', 'D', { right: JOINT }), run('2', 'A', { left: JOINT })], closed);
    expect(laid.joints[0]).toMatchObject({ between: ['1', '2'], cornerSd: 0.25 });
    expect(distance(laid.joints[0]!.from, [0.25, -0.25])).toBeCloseTo(0, 10);
  });
});

describe('layRuns, what cannot be laid', () => {
  const codes = (runs: readonly Run[], at: SolvedRoom, more: Partial<Layout> = {}) =>
    lay(runs, at, more).problems.map((problem) => problem.code);

  it.each([
    [
      'a run longer than its wall',
      run('1', 'A', { to: 97 }),
      'Run 1 goes 1 in past the end of wall A, which is 96 in long.',
    ],
    ['depth 0', run('1', 'A', { depth: 0 }), 'Run 1 has no depth. Type how deep the top is.'],
    [
      'a run of no length',
      run('1', 'A', { from: 50, to: 50 }),
      'Run 1 has no length: it goes from 50 in to 50 in along wall A.',
    ],
    ['a wall that is not there', run('1', 'Z'), 'Run 1 lies on wall Z, which is not in this room.'],
    [
      'a wall end with no wall',
      run('1', 'A', { right: WALL }),
      'Run 1 ends against a wall on its right, but wall A has no neighbor there.',
    ],
    [
      'a joint end with no partner',
      run('1', 'A', { right: JOINT }),
      "Run 1 should end on a joint at its right, but wall A has no neighbor there. It is cut square at the wall's end.",
    ],
  ])('says so: %s', (_, own, sentence) => {
    expect(lay([own], room([96], [])).problems.map((problem) => problem.message)).toEqual([sentence]);
  });

  it('lays a run that is too long all the same, and every other run', () => {
    const laid = lay([run('1', 'A', { to: 100 }), run('2', 'B', { depth: 0 }), run('3', 'B')], room([96, 60], [90]));
    expect(laid.runs.map((own) => own.id)).toEqual(['1', '3']);
  });

  it('names runs that are to be joined and do not meet', () => {
    const joints: Layout['joints'] = [{ between: ['1', '2'], kind: 'miter', assembled: 'shop' }];
    const laid = lay([run('1', 'A'), run('2', 'C')], room([60, 60, 60], [90, 90]), { joints });
    expect(laid.problems).toEqual([
      expect.objectContaining({
        code: 'joint-impossible',
        message: 'Runs 1 and 2 cannot be joined as chosen: they do not meet at a corner.',
      }),
    ]);
  });

  it('lays a miter where the chosen joint cannot be made', () => {
    const joints: Layout['joints'] = [{ between: ['1', '2'], kind: 'diagonal', assembled: 'shop' }];
    const runs = [run('1', 'A', { right: JOINT }), run('2', 'B', { left: JOINT })];
    const laid = lay(runs, room([60, 60], [90]), { joints });
    expect(laid.joints[0]!.kind).toBe('miter');
    expect(laid.problems[0]!.message).toBe(
      'Runs 1 and 2 cannot be joined as chosen: the diagonal front has no width. A miter is laid instead.',
    );
  });

  it('warns of a corner of 50 degrees and refuses the middle of a U narrower than its legs', () => {
    const pair = [run('1', 'A', { right: JOINT }), run('2', 'B', { left: JOINT })];
    expect(codes(pair, room([90, 90], [50]))).toEqual(['joint-sharp']);
    const u = [
      run('1', 'A', { right: JOINT }),
      run('2', 'B', { left: JOINT, right: JOINT }),
      run('3', 'C', { left: JOINT }),
    ];
    const laid = lay(u, room([90, 40, 90], [90, 90]));
    expect(laid.problems.map((problem) => problem.code)).toEqual(['run-too-short']);
    expect(laid.runs.map((own) => own.id)).toEqual(['1', '3']);
    expect(laid.joints).toEqual([]);
  });

  it('does not end a run against a wall that turns away', () => {
    expect(codes([run('1', 'A', { right: WALL })], room([60, 60], [270]))).toEqual(['end-no-wall']);
  });

  it('warns of a bump beside a wall end that is higher than the clearance', () => {
    const bumpy = room([60, 60], [90]);
    const walls = bumpy.walls.map((wall) => ({ ...wall, profile: wall.id === 'B' ? [{ at: 10, off: -0.5 }] : [] }));
    const laid = lay([run('1', 'A', { right: WALL })], { ...bumpy, walls });
    expect(laid.problems).toEqual([
      expect.objectContaining({
        severity: 'warn',
        message: 'Wall B sticks out 1/2 in beside run 1, more than the clearance of 1/4 in.',
      }),
    ]);
  });
});
