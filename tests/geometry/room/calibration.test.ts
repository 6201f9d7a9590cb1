import { fitRoom } from '@/geometry/room/fit-room';
import { seeded } from '@/tests/helpers/random';
import type { Random } from '@/tests/helpers/random';
import { tapeRoom } from '@/tests/helpers/taped-room';
import type { TapePlan } from '@/tests/helpers/taped-room';
import { DRAWINGS, trueAngleDeg, trueRoom } from '@/tests/helpers/true-rooms';

const ROOMS = 2000;
/** Two-sided 3.29 of a normal distribution. */
const FALSE_ALARM = 0.001002;

interface Tally {
  corners: number;
  inside: number;
  wallsInside: number;
  walls: number;
  /** Standardised residuals of measured readings, and alarms among them, room by room. */
  tests: number[];
  alarms: number[];
  chi2Tests: number;
  chi2Over: number;
}

/** Corners read by triangle, by protractor or not at all; the corner that closes a ring is always read. */
function randomPlan(corners: number, points: number, closed: boolean, random: Random): TapePlan {
  const hows = Array.from({ length: corners }, (_, i): TapePlan['corners'][number] => {
    const u = random.uniform(0, 1);
    if (closed && i >= corners - 2) return 'triangle';
    return u < 0.45 ? 'triangle' : u < 0.75 ? 'angle' : 'assumed';
  });
  const ties: [number, number][] = [];
  for (let k = random.below(4); k > 0; k--) {
    const from = random.below(points - 2);
    const to = from + 2 + random.below(points - from - 2);
    const neighbours = closed && from === 0 && to === points - 1;
    if (!neighbours && !ties.some(([a, b]) => a === from && b === to)) ties.push([from, to]);
  }
  return { corners: hows, ties, noise: 1 };
}

function simulate(seed: number): Tally {
  const random = seeded(seed);
  const names = Object.keys(DRAWINGS);
  const tally: Tally = {
    corners: 0,
    inside: 0,
    walls: 0,
    wallsInside: 0,
    tests: [],
    alarms: [],
    chi2Tests: 0,
    chi2Over: 0,
  };
  for (let k = 0; k < ROOMS; k++) {
    const name = names[k % names.length]!;
    const { closed, points } = DRAWINGS[name]!;
    const corners = closed ? points.length : points.length - 2;
    const plan = randomPlan(corners, points.length, closed, random);
    // An assumed corner stands within its one degree, a measured one may be further out.
    const bends = plan.corners.map((how) => random.normal() * (how === 'assumed' ? 1 : 2));
    const room = trueRoom(name, random, bends);
    const result = fitRoom(tapeRoom(room, plan, random));
    if (!result.ok) throw new Error(`room ${k}: ${result.error.message}`);
    const { fit } = result;
    fit.corners.forEach((corner, i) => {
      tally.corners++;
      if (Math.abs(corner.angleDeg - trueAngleDeg(room, i)) <= 1.96 * corner.sdDeg) tally.inside++;
    });
    fit.walls.forEach((wall, i) => {
      const [a, b] = [room.points[i]!, room.points[(i + 1) % room.points.length]!];
      tally.walls++;
      if (Math.abs(wall.adjusted - Math.hypot(b[0] - a[0], b[1] - a[1])) <= 1.96 * wall.sd) tally.wallsInside++;
    });
    const measured = [...fit.walls, ...fit.corners.filter((c) => c.measured), ...fit.ties];
    const residuals = measured.flatMap((r) => (r.standardised === null ? [] : [Math.abs(r.standardised)]));
    tally.tests.push(residuals.length);
    tally.alarms.push(residuals.filter((w) => w > 3.29).length);
    if (fit.chi2Limit !== null) {
      tally.chi2Tests++;
      if (fit.chi2 > fit.chi2Limit) tally.chi2Over++;
    }
  }
  return tally;
}

const sum = (values: readonly number[]): number => values.reduce((a, b) => a + b, 0);

describe('fitRoom over 2,000 simulated rooms', () => {
  const tally = simulate(20260105);

  it('holds 95 % of corners within 1.96 of their standard deviations', () => {
    expect(tally.corners).toBeGreaterThan(10_000);
    expect(Math.abs(tally.inside / tally.corners - 0.95)).toBeLessThan(0.015);
  });

  it('holds 95 % of wall lengths within 1.96 of their standard deviations', () => {
    expect(Math.abs(tally.wallsInside / tally.walls - 0.95)).toBeLessThan(0.015);
  });

  it('raises a false alarm once in a thousand tests, within sampling error', () => {
    // Readings of one room share their errors, so the scatter is taken from room to room, not from test to test.
    const surplus = tally.alarms.map((alarms, i) => alarms - FALSE_ALARM * tally.tests[i]!);
    const sampling = Math.sqrt(sum(surplus.map((s) => s * s)));
    expect(sum(tally.tests)).toBeGreaterThan(15_000);
    expect(Math.abs(sum(surplus))).toBeLessThan(3 * sampling);
    expect(sampling).toBeLessThan(FALSE_ALARM * sum(tally.tests));
  });

  it('finds chi2 over its 95 % limit in 5 % of rooms with a spare reading, within sampling error', () => {
    const expected = 0.05 * tally.chi2Tests;
    expect(Math.abs(tally.chi2Over - expected)).toBeLessThan(3 * Math.sqrt(expected * 0.95));
  });
});
