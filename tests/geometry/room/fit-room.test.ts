import type { RoomFit } from '@/geometry/room/types';
import { fitted, roomInput, walls, WORKED_EXAMPLE } from '@/tests/builders/room-input';

function expectPoints(fit: RoomFit, points: readonly (readonly [number, number])[], digits = 6): void {
  expect(fit.points).toHaveLength(points.length);
  fit.points.forEach((p, i) => {
    expect(p[0]).toBeCloseTo(points[i]![0], digits);
    expect(p[1]).toBeCloseTo(points[i]![1], digits);
  });
}

describe('fitRoom on the worked example of the file format', () => {
  const fit = fitted(WORKED_EXAMPLE, { next: true });

  it('gives the printed points', () => {
    const printed = [
      [0, 0],
      [96.2501, 0],
      [98.327, -118.608],
      [14.328, -118.196],
    ] as const;
    fit.points.forEach((p, i) => {
      expect(Math.abs(p[0] - printed[i]![0])).toBeLessThan(5.1e-4);
      expect(Math.abs(p[1] - printed[i]![1])).toBeLessThan(5.1e-4);
    });
  });

  it('gives one degree of freedom, chi2 0.009 and its limit 3.84', () => {
    expect(fit.dof).toBe(1);
    expect(fit.chi2).toBeCloseTo(0.009, 3);
    expect(fit.chi2Limit).toBeCloseTo(3.84, 2);
  });

  it('gives wall A its printed figures', () => {
    const [a] = fit.walls;
    expect(a).toMatchObject({ id: 'A', taped: 96.25, ignored: false });
    expect(a!.adjusted).toBeCloseTo(96.2501, 4);
    expect(a!.sd).toBeCloseTo(0.056, 3);
    expect(a!.residual).toBeCloseTo(0.0001, 4);
    expect(a!.redundancy).toBeCloseTo(0.0004, 4);
    expect(a!.standardised).toBeCloseTo(0.095, 3);
  });

  it('gives both corners their printed figures', () => {
    const [ab, bc] = fit.corners;
    expect(ab).toMatchObject({ between: ['A', 'B'], measured: true, taped: 60.5 });
    expect(ab!.angleDeg).toBeCloseTo(91.003, 3);
    expect(ab!.sdDeg).toBeCloseTo(0.084, 3);
    expect(ab!.adjusted).toBeCloseTo(60.502, 3);
    expect(ab!.residual).toBeCloseTo(0.002, 3);
    expect(ab!.redundancy).toBeCloseTo(0.211, 3);
    expect(ab!.standardised).toBeCloseTo(0.095, 3);
    expect(bc!.angleDeg).toBeCloseTo(88.716, 3);
    expect(bc!.sdDeg).toBeCloseTo(0.105, 3);
  });

  it('accuses nobody and asks for the other diagonal', () => {
    expect(fit.suspects).toEqual([]);
    expect(fit.checkCorner).toBeNull();
    expect(fit.next).toMatchObject({ kind: 'tie', from: { wall: 'A', at: 'end' }, to: { wall: 'C', at: 'end' } });
    expect(fit.next!.worstCornerSdNowDeg).toBeCloseTo(0.105, 3);
    expect(fit.next!.worstCornerSdThenDeg).toBeLessThan(0.105);
  });

  it('looks for the next reading only when asked', () => {
    expect(fitted(WORKED_EXAMPLE).next).toBeNull();
  });
});

describe('fitRoom on rooms worked by hand', () => {
  it('lays a single wall along +x with the sd of its reading', () => {
    const fit = fitted(roomInput({ walls: walls(96) }));
    expectPoints(fit, [
      [0, 0],
      [96, 0],
    ]);
    expect(fit).toMatchObject({ dof: 0, chi2Limit: null, corners: [] });
    expect(fit.walls[0]!.sd).toBeCloseTo(1 / 32 + 96 / 3840, 10);
    expect(fit.walls[0]!.standardised).toBeNull();
  });

  it('lays a U of assumed corners square, room below wall A', () => {
    const fit = fitted(roomInput({}));
    expectPoints(fit, [
      [0, 0],
      [96, 0],
      [96, -120],
      [12, -120],
    ]);
    expect(fit.dof).toBe(0);
    fit.corners.forEach((c) => {
      expect(c).toMatchObject({ measured: false, kind: 'assumed', taped: null, standardised: null });
      expect(c.sdDeg).toBeCloseTo(1, 8);
    });
    expect(fit.walls.map((w) => Math.round((w.bearing * 180) / Math.PI))).toEqual([0, -90, 180]);
  });

  it('finds 90 degrees from a 3-4-5 triangle, with the sd that the law of cosines gives', () => {
    const corners = [{ between: ['A', 'B'] as const, triangle: { a: 36, b: 48, c: 60 } }];
    const [corner] = fitted(roomInput({ walls: walls(96, 120), corners })).corners;
    expect(corner!.angleDeg).toBeCloseTo(90, 8);
    // dc/dt = a b sin t / c = 36 x 48 / 60 in per radian, and c carries 1/32 + 60/3840 in.
    const sd = ((1 / 32 + 60 / 3840) / ((36 * 48) / 60)) * (180 / Math.PI);
    expect(corner!.sdDeg).toBeCloseTo(sd, 8);
  });

  it('puts a triangle at an outside corner on the outside', () => {
    const corners = [{ between: ['A', 'B'] as const, nominalDeg: 270, triangle: { a: 36, b: 48, c: 60 } }];
    const fit = fitted(roomInput({ walls: walls(96, 120), corners }));
    expect(fit.corners[0]!.angleDeg).toBeCloseTo(270, 8);
    expectPoints(fit, [
      [0, 0],
      [96, 0],
      [96, 120],
    ]);
  });

  it('takes the side of the sketch for a triangle whose corner was never named inside or outside', () => {
    const corners = [{ between: ['A', 'B'] as const, triangle: { a: 36, b: 48, c: 60 } }];
    const sketch = [
      [0, 0],
      [80, 5],
      [95, 90],
    ] as const;
    expect(fitted(roomInput({ walls: walls(96, 120), corners, sketch })).corners[0]!.angleDeg).toBeCloseTo(270, 8);
  });

  it('goes round a pipe column: 90, 270, 270, 90', () => {
    const nominal = [90, 270, 270, 90];
    const pairs = ['AB', 'BC', 'CD', 'DE'];
    const corners = pairs.map((p, i) => ({ between: [p[0]!, p[1]!] as const, nominalDeg: nominal[i]! }));
    expectPoints(fitted(roomInput({ walls: walls(60, 12, 18, 12, 50), corners })), [
      [0, 0],
      [60, 0],
      [60, -12],
      [78, -12],
      [78, 0],
      [128, 0],
    ]);
  });

  it('closes a rectangle clockwise from four lengths and one corner', () => {
    const fit = fitted(roomInput({ closed: true, walls: walls(144, 120, 144, 120) }));
    expectPoints(fit, [
      [0, 0],
      [144, 0],
      [144, -120],
      [0, -120],
    ]);
    // 4 lengths + 4 assumed corners - 5 unknowns
    expect(fit.dof).toBe(3);
    expect(fit.corners.map((c) => c.between.join('-'))).toEqual(['A-B', 'B-C', 'C-D', 'D-A']);
  });

  it('closes a regular hexagon of side 80 at 120 degrees', () => {
    const pairs = ['AB', 'BC', 'CD', 'DE', 'EF', 'FA'];
    const corners = pairs.map((p) => ({ between: [p[0]!, p[1]!] as const, nominalDeg: 120 }));
    const fit = fitted(roomInput({ closed: true, walls: walls(80, 80, 80, 80, 80, 80), corners }));
    fit.corners.forEach((c) => expect(c.angleDeg).toBeCloseTo(120, 8));
    expect(fit.points[3]![1]).toBeCloseTo(-160 * Math.sin(Math.PI / 3), 6);
  });

  it('finds a bay of 135 and 225 degrees from angles', () => {
    const corners = [
      { between: ['A', 'B'] as const, nominalDeg: 225, angleDeg: 225 },
      { between: ['B', 'C'] as const, nominalDeg: 135, angleDeg: 135 },
    ];
    const leg = 30 * Math.SQRT1_2;
    expectPoints(fitted(roomInput({ walls: walls(60, 30, 40), corners })), [
      [0, 0],
      [60, 0],
      [60 + leg, leg],
      [100 + leg, leg],
    ]);
  });

  it('finds a corner from a diagonal alone, square when it is the root of the sum of squares', () => {
    const ties = [{ id: 'd', from: { wall: 'A', at: 0 }, to: { wall: 'B', at: 'end' as const }, length: 150 }];
    const fit = fitted(roomInput({ walls: walls(90, 120), ties }));
    expect(fit.corners[0]!.angleDeg).toBeCloseTo(90, 8);
    expect(fit.dof).toBe(1);
    expect(fit.corners[0]!.sdDeg).toBeLessThan(0.1);
  });

  it('takes a tie between marks within two walls', () => {
    const ties = [{ id: 'm', from: { wall: 'A', at: 60 }, to: { wall: 'B', at: 48 }, length: 60 }];
    const fit = fitted(roomInput({ walls: walls(96, 120), ties }));
    // Marks 36 in from the corner on A and 48 in on B, 60 apart: square.
    expect(fit.corners[0]!.angleDeg).toBeCloseTo(90, 6);
  });
});

describe('fitRoom with unknown walls and repeated readings', () => {
  it('finds a wall that nobody taped from the ring it closes', () => {
    const fit = fitted(roomInput({ closed: true, walls: walls(144, 120, null, 120) }));
    expect(fit.walls[2]).toMatchObject({ taped: null, residual: null, standardised: null, readings: [] });
    expect(fit.walls[2]!.adjusted).toBeCloseTo(144, 6);
    expect(fit.walls[2]!.sd).toBeGreaterThan(0.05);
  });

  it('finds a wall that nobody taped from a diagonal', () => {
    const corners = [{ between: ['A', 'B'] as const, triangle: { a: 36, b: 48, c: 60 } }];
    const ties = [{ id: 'd', from: { wall: 'A', at: 0 }, to: { wall: 'B', at: 'end' as const }, length: 150 }];
    const fit = fitted(roomInput({ walls: walls(90, null), corners, ties }));
    expect(fit.walls[1]!.adjusted).toBeCloseTo(120, 6);
    expect(fit.dof).toBe(0);
  });

  it('takes two readings of a wall as two observations and lands between them', () => {
    const fit = fitted(roomInput({ walls: walls([96, 96.0625]) }));
    expect(fit.dof).toBe(1);
    expect(fit.walls[0]!.adjusted).toBeCloseTo(96.03125, 3);
    expect(fit.walls[0]!.readings.map((r) => r.taped)).toEqual([96, 96.0625]);
    expect(fit.walls[0]!.sd).toBeCloseTo((1 / 32 + 96 / 3840) / Math.SQRT2, 4);
    expect(fit.walls[0]!.readings[0]!.redundancy).toBeCloseTo(0.5, 3);
  });

  it('reports of two readings the one that fits worst', () => {
    const corners = [{ between: ['A', 'B'] as const, triangle: { a: 36, b: 48, c: 60 } }];
    const ties = [{ id: 'd', from: { wall: 'A', at: 0 }, to: { wall: 'B', at: 'end' as const }, length: 150 }];
    const fit = fitted(roomInput({ walls: walls([90, 90, 90.5], 120), corners, ties }));
    expect(fit.walls[0]!.taped).toBe(90.5);
    expect(fit.walls[0]!.readings).toHaveLength(3);
  });

  it('lets a reading bring its own standard deviation', () => {
    const loose = fitted(roomInput({ walls: [{ id: 'A', lengths: [96], sd: 0.5 }] }));
    expect(loose.walls[0]!.sd).toBeCloseTo(0.5, 10);
  });

  it('takes a triangle and a protractor at one corner as two observations', () => {
    const corners = [{ between: ['A', 'B'] as const, triangle: { a: 36, b: 48, c: 60 }, angleDeg: 90.1 }];
    const fit = fitted(roomInput({ walls: walls(96, 120), corners }));
    expect(fit.dof).toBe(1);
    expect(fit.corners[0]!.readings).toHaveLength(2);
    expect(fit.corners[0]!.angleDeg).toBeGreaterThan(90);
    expect(fit.corners[0]!.angleDeg).toBeLessThan(90.1);
  });
});

describe('fitRoom with readings left out', () => {
  it('leaves an ignored tie out of the fit and says what it should have read', () => {
    const honest = fitted({ ...WORKED_EXAMPLE, ties: [] });
    const fit = fitted({ ...WORKED_EXAMPLE, ignore: ['tie t1'] });
    expect(fit.points).toEqual(honest.points);
    expect(fit.dof).toBe(0);
    const [tie] = fit.ties;
    expect(tie).toMatchObject({ ignored: true, taped: 119.0625, redundancy: null, standardised: null });
    const [a, , , d] = fit.points;
    expect(tie!.adjusted).toBeCloseTo(Math.hypot(d![0] - a![0], d![1] - a![1]), 10);
    expect(tie!.residual).toBeCloseTo(tie!.adjusted - 119.0625, 10);
  });

  it('still lists an ignored wall with its predicted length', () => {
    const input = roomInput({ closed: true, walls: walls(144, 120, 150, 120), ignore: ['wall C'] });
    const [, , c] = fitted(input).walls;
    expect(c).toMatchObject({ ignored: true, taped: 150, standardised: null });
    expect(c!.adjusted).toBeCloseTo(144, 6);
  });

  it('assumes a corner whose only reading is ignored when nothing else holds it', () => {
    const corners = [{ between: ['A', 'B'] as const, nominalDeg: 90, triangle: { a: 36, b: 48, c: 55 } }];
    const fit = fitted(roomInput({ walls: walls(96, 120), corners, ignore: ['corner A-B'] }));
    expect(fit.corners[0]).toMatchObject({ measured: false, ignored: true });
    expect(fit.corners[0]!.angleDeg).toBeCloseTo(90, 8);
    expect(fit.corners[0]!.sdDeg).toBeCloseTo(1, 8);
  });

  it('does not assume it when a diagonal holds it', () => {
    const corners = [{ between: ['A', 'B'] as const, triangle: { a: 36, b: 48, c: 55 } }];
    const ties = [{ id: 'd', from: { wall: 'A', at: 0 }, to: { wall: 'B', at: 'end' as const }, length: 150 }];
    const fit = fitted(roomInput({ walls: walls(90, 120), corners, ties, ignore: ['corner A-B'] }));
    expect(fit.dof).toBe(0);
    expect(fit.corners[0]!.angleDeg).toBeCloseTo(90, 8);
    expect(fit.corners[0]).toMatchObject({ kind: 'triangle', taped: 55, ignored: true, measured: false });
    expect(fit.corners[0]!.adjusted).toBeCloseTo(60, 8);
  });
});
