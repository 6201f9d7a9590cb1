import { found, proveCases } from './case';
import { kitchen, sink } from './kitchen';
import { SEAM_CASES } from './seam-cases';

describe('findings of seams', () => {
  proveCases(SEAM_CASES);

  it('measures inside a cutout from its corner radius: 1 3/4 in clear is enough, 1 1/2 is not', () => {
    const inside = (at: number) =>
      kitchen({ walls: [140], layout: { seams: [{ on: '1', at }], cutouts: [sink({ centre: 70 })] } });
    expect(found(inside(56.75), 'seam-near-cutout')).toEqual([]);
    expect(found(inside(56.5), 'seam-near-cutout')[0]!.text).toContain('1 1/2 in inside');
  });

  it('says of a bad pin once, with the place where it may go', () => {
    const context = SEAM_CASES['seam-near-cutout']!.raises();
    const [near] = found(context, 'seam-near-cutout');
    expect(context.tops.problems.some((p) => p.code === 'pin-not-allowed')).toBe(true);
    expect(near!.action).toMatch(/The nearest allowed place is .+ in\.$/);
    expect(found(context, 'cannot-lay')).toEqual([]);
  });
});
