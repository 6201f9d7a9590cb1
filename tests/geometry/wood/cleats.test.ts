import { seamCleats } from '@/geometry/wood/cleats';

const seam = { from: [60, -0.25], to: [60, -25.25] } as const;
const cutout = (from: number, to: number) => ({
  outline: [
    [from, -23],
    [to, -23],
    [to, -2],
    [from, -2],
  ] as const,
});

describe('seamCleats', () => {
  it('screws 6 in cleats on both sides of a seam in the middle of a 30 in sink, 2 in inside the cutout', () => {
    const cleats = seamCleats(seam, cutout(45, 75))!;
    expect(cleats.left).toBe(6);
    expect(cleats.right).toBe(6);
    expect(cleats.at[0]).toBeCloseTo(1.75 + 2, 9);
    expect(cleats.at[1]).toBeCloseTo(22.75 - 2, 9);
  });

  it('shortens the cleat on the side with less waste', () => {
    const cleats = seamCleats(seam, cutout(55, 75))!;
    expect(cleats.left).toBeCloseTo(4, 9);
    expect(cleats.right).toBe(6);
  });

  it('gives none when one side keeps less than 3 in of waste clear of the finished edge', () => {
    expect(seamCleats(seam, cutout(56, 75))).not.toBeNull();
    expect(seamCleats(seam, cutout(56.01, 75))).toBeNull();
    expect(seamCleats(seam, cutout(61, 75))).toBeNull();
  });

  it('gives none in a slit too shallow for two', () => {
    const slit = {
      outline: [
        [45, -5],
        [75, -5],
        [75, -2],
        [45, -2],
      ] as const,
    };
    expect(seamCleats(seam, slit)).toBeNull();
  });
});
