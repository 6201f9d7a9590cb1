import fc from 'fast-check';

import { area, boundingBox } from '@/geometry/core/polygon';
import type { Plan } from '@/geometry/plan/types';
import { placeSlab } from '@/geometry/scene/slab/placed-slab';

import { alderJob, stripsJob, sharedMiterJob } from '../alder-job';

const job = alderJob();

/** The alder job with its first piece laid alone on its slab as told. */
function lay(turned: boolean, turnedOver: boolean, x = 1.5, y = 0) {
  const nest = job.plan.nest!;
  const slab = { stock: 'HM-120', parts: [{ id: 'Q', x, y, turned, turnedOver }], cuts: [], offcuts: [] };
  const plan: Plan = { ...job.plan, nest: { ...nest, slabs: [slab] } };
  return placeSlab(plan, job.layout, 0).pieces[0]!;
}

describe('placeSlab', () => {
  it('puts the smallest x and y of a piece where the plan says, in all four moves, with its size kept', () => {
    fc.assert(
      fc.property(fc.boolean(), fc.boolean(), fc.double({ min: 0, max: 60, noNaN: true }), (turned, over, x) => {
        const { outline, piece } = lay(turned, over, x, 2);
        const box = boundingBox(outline);
        return (
          Math.abs(box.minX - x) < 1e-9 && Math.abs(box.minY - 2) < 1e-9 && Math.abs(area(outline) - piece.area) < 1e-6
        );
      }),
      { seed: 3, numRuns: 60 },
    );
  });

  it('mirrors front to back when a piece lies face down, and swaps ends when it is turned', () => {
    const long = (over: boolean, turned: boolean) => {
      const { outline } = lay(turned, over);
      const top = Math.max(...outline.map((p) => p[1]));
      const at = (y: number) => outline.filter((p) => Math.abs(p[1] - y) < 1e-6).map((p) => p[0]);
      const length = (xs: number[]) => Math.max(...xs) - Math.min(...xs);
      return { longEdge: length(at(top)) > length(at(0)) ? 'back' : 'front', squareEnd: Math.min(...at(0)) === Math.min(...at(top)) ? 'left' : 'right' }; // prettier-ignore
    };
    expect(long(false, false)).toEqual({ longEdge: 'back', squareEnd: 'left' });
    expect(long(true, false)).toEqual({ longEdge: 'front', squareEnd: 'left' });
    expect(long(false, true)).toEqual({ longEdge: 'front', squareEnd: 'right' });
    expect(long(true, true)).toEqual({ longEdge: 'back', squareEnd: 'right' });
  });

  it('knows which edge of the slab goes to the wall', () => {
    expect(lay(false, false).wallEdge).toBe('back');
    expect(lay(false, true).wallEdge).toBe('front');
    expect(lay(true, false).wallEdge).toBe('front');
    expect(lay(true, true).wallEdge).toBe('back');
  });

  it('numbers slabs of one kind and names a rack piece', () => {
    const { plan, layout } = stripsJob();
    const names = plan.nest!.slabs.map((_, i) => placeSlab(plan, layout, i).name);
    expect(names).toContain('rack 0207');
    expect(names).toContain('slab HM-96 no. 1');
    expect(names).toContain('slab HM-96 no. 2');
  });

  it('says that a sink goes on in the next piece when a seam runs through it', () => {
    const { plan, layout } = sharedMiterJob();
    const s = placeSlab(plan, layout, 0).pieces.find((p) => p.letter === 'S')!;
    expect(s.cutouts).toHaveLength(1);
    expect(s.cutouts[0]).toMatchObject({ label: 'sink', part: true });
  });

  it('refuses a slab that the plan does not have, and pieces and stock that the job does not have', () => {
    expect(() => placeSlab(job.plan, job.layout, 99)).toThrow(/no number 100/);
    const broken = (change: object): Plan => ({
      ...job.plan,
      nest: { ...job.plan.nest!, slabs: [{ ...job.plan.nest!.slabs[0]!, ...change }] },
    });
    expect(() => placeSlab(broken({ stock: 'X9' }), job.layout, 0)).toThrow(/"X9", which is not in stock/);
    const parts = [{ id: 'ZZ', x: 0, y: 0, turned: false, turnedOver: false }];
    expect(() => placeSlab(broken({ parts }), job.layout, 0)).toThrow(/"ZZ", which is not a piece/);
  });
});
