import fc from 'fast-check';
import { jointSeason, seasonRemedies, turnPerStrain } from '@/geometry/wood/joint-season';

const movement = (make: number, summer: number, winter: number, coefficient = 0.0025) => ({
  emc: { make, summer, winter },
  coefficient,
});

const miter = (angle: number, length = 35) => ({ kind: 'miter' as const, angles: [angle, angle] as const, length });

/** Angle between back edge and joint of a strip `width` deep that is set back `along`, after the width grew by `strain`. */
const jointAngle = (width: number, along: number, strain: number) => Math.atan2(width * (1 + strain), along);

describe('jointSeason', () => {
  it('opens a 45 degree miter by strain x length: 3 % of moisture at 0.0025 over 35 in is 0.2625 in', () => {
    expect(jointSeason(miter(45), [60, 90], movement(8, 11, 6)).seasonal).toBeCloseTo(0.2625, 9);
  });

  it('swings the longer leg by the same angle: 0.0075 over 90 in is 0.675 in', () => {
    const season = jointSeason(miter(45), [60, 90], movement(8, 11, 6));
    expect(season.swing).toBeCloseTo(0.675, 9);
    expect(season.turnWet).toBeCloseTo(0.0075, 9);
    expect(season.turnDry).toBeCloseTo(0.005, 9);
  });

  it('takes the drier side when it is further from making', () => {
    expect(jointSeason(miter(45), [0, 0], movement(8, 9, 4)).seasonal).toBeCloseTo(0.0025 * 4 * 35, 9);
  });

  it('agrees with the turn of a strip that is really stretched, within the square of the strain', () => {
    for (const [width, along] of [
      [25, 25],
      [25, 10],
      [36, 25],
      [25, 60],
    ] as const) {
      const strain = 0.01;
      const f = (Math.atan2(width, along) * 180) / Math.PI;
      const turned = jointAngle(width, along, strain) - jointAngle(width, along, 0);
      expect(Math.abs(turnPerStrain({ kind: 'miter', angles: [f, 0] }) * strain - turned)).toBeLessThan(1e-4);
    }
  });

  it('opens a square seam and a square butt not at all', () => {
    expect(jointSeason({ ...miter(90), kind: 'square' }, [0, 0], movement(8, 12, 5)).seasonal).toBeCloseTo(0, 12);
    expect(jointSeason({ ...miter(90), kind: 'butt' }, [0, 0], movement(8, 12, 5)).seasonal).toBeCloseTo(0, 12);
  });

  it('counts only the run that stops at a butt joint out of square', () => {
    const butt = turnPerStrain({ kind: 'butt', angles: [80, 80] });
    expect(butt).toBeCloseTo(turnPerStrain({ kind: 'miter', angles: [80, 80] }) / 2, 12);
  });

  it('draws the legs of an outside corner past 90 degrees of f away when the wood swells', () => {
    const outside = jointSeason(miter(135), [0, 100], movement(8, 11, 8));
    expect(outside.turnWet).toBe(0);
    expect(outside.turnDry).toBeCloseTo(0.0075, 9);
  });

  it('opens nothing in air that never changes', () => {
    expect(jointSeason(miter(45), [60, 90], movement(8, 8, 8))).toEqual({
      seasonal: 0,
      swing: 0,
      turnWet: 0,
      turnDry: 0,
    });
  });

  it('grows with joint length, with moisture and with the angle up to 45 degrees', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 5, max: 43, noNaN: true }),
        fc.double({ min: 10, max: 60, noNaN: true }),
        fc.double({ min: 0.5, max: 6, noNaN: true }),
        (angle, length, wetter) => {
          const at = (a: number, l: number, w: number) =>
            jointSeason(miter(a, l), [50, 80], movement(8, 8 + w, 8)).seasonal;
          const base = at(angle, length, wetter);
          return (
            at(angle + 1, length, wetter) > base &&
            at(angle, length + 1, wetter) > base &&
            at(angle, length, wetter + 1) > base
          );
        },
      ),
      { seed: 441 },
    );
  });
});

describe('seasonRemedies', () => {
  it('halves the opening by making at the middle of the year, and says to what', () => {
    const ways = seasonRemedies(miter(45), movement(6, 12, 6), 0.0025);
    expect(ways).toHaveLength(1);
    expect(ways[0]!.text).toContain('9.0 %');
    expect(ways[0]!.seasonal).toBeCloseTo(0.0025 * 3 * 35, 9);
  });

  it('puts edge-grain staves first where they help more', () => {
    const ways = seasonRemedies(miter(45), movement(8, 12, 5), 0.001);
    expect(ways.map((way) => way.text)[0]).toContain('edge-grain');
    expect(ways[0]!.seasonal).toBeCloseTo(0.001 * 4 * 35, 9);
  });

  it('names nothing that helps by less than a tenth', () => {
    expect(seasonRemedies(miter(45), movement(8.5, 12, 5), 0.0024)).toEqual([]);
  });
});
