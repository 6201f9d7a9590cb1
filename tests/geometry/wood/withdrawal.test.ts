import {
  allowableWithdrawalLbPerInch,
  pilotHole,
  ultimateWithdrawalLb,
  ultimateWithdrawalN,
} from '@/geometry/wood/withdrawal';

describe('ultimateWithdrawalLb', () => {
  // Wood Handbook eq. 8-10a; gravity 0.70 and a #8 shank, 1262 lb as a web source prints it.
  it('holds 1262 lb for an inch of #8 thread in gravity 0.70', () => {
    expect(Math.abs(ultimateWithdrawalLb(0.7, 0.164, 1) - 1261.6)).toBeLessThan(0.1);
    expect(Math.round(ultimateWithdrawalLb(0.7, 0.164, 1))).toBe(1262);
  });

  // Eq. 8-10a computed for #8 and #10.
  it.each([
    ['maple or red oak', 0.63, 1021.9, 1184.0],
    ['walnut', 0.55, 778.9, 902.4],
    ['cherry', 0.5, 643.7, 745.8],
  ])('holds the computed pounds an inch in %s', (_, gravity, eight, ten) => {
    // The rows were cut off at 0.1 lb.
    expect(Math.abs(ultimateWithdrawalLb(gravity, 0.164, 1) - eight)).toBeLessThan(0.1);
    expect(Math.abs(ultimateWithdrawalLb(gravity, 0.19, 1) - ten)).toBeLessThan(0.2);
  });

  it('says the same in newtons and millimeters (eq. 8-10b)', () => {
    const pounds = ultimateWithdrawalLb(0.63, 0.19, 1) * 4.4482216;
    expect(ultimateWithdrawalN(0.63, 0.19 * 25.4, 25.4) / pounds).toBeCloseTo(1, 4);
  });
});

describe('allowableWithdrawalLbPerInch', () => {
  // NDS form, worked example: gravity 0.45, shank 0.190: 109 lb/in as printed, which cuts 109.7 off.
  it('allows 109 lb an inch for gravity 0.45 and a 0.190 in shank', () => {
    expect(Math.floor(allowableWithdrawalLbPerInch(0.45, 0.19))).toBe(109);
    expect(allowableWithdrawalLbPerInch(0.45, 0.19)).toBeCloseTo(109.7, 1);
  });
});

describe('pilotHole', () => {
  // NDS commentary 11.1.2 and a code copy: 90 % of the root from 0.60, 70 % from 0.50, none below; root two thirds of the shank.
  it('drills 90 % of the root in maple, 70 % in walnut and nothing under 0.50', () => {
    expect(pilotHole(0.63, 0.19)).toBeCloseTo(0.114, 9);
    expect(pilotHole(0.6, 0.19)).toBeCloseTo(0.114, 9);
    expect(pilotHole(0.55, 0.19)).toBeCloseTo(0.0887, 4);
    expect(pilotHole(0.49, 0.19)).toBeNull();
  });
});
