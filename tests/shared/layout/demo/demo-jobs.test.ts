import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { nest } from '@/geometry/nest/nest';
import { makePlan } from '@/geometry/plan/make-plan';
import { DEMO_JOBS, type DemoJob } from '@/shared/layout/demo/demo-jobs';
import { parseJobFile } from '@/shared/layout/parse-job-file';

const NAMES = Object.keys(DEMO_JOBS) as DemoJob[];

/** Enough for jobs of a dozen pieces; the same on every machine. */
const WORK = 200_000;

function solve(name: DemoJob) {
  const parsed = parseJobFile(DEMO_JOBS[name]);
  if (!parsed.ok) throw new Error(parsed.errors.map(({ path, message }) => `${path}: ${message}`).join('; '));
  const input = { layout: parsed.layout, settings: DEFAULT_SETTINGS };
  const found = nest(makePlan({ ...input, nest: null }).instance, { workLimit: WORK });
  if ('error' in found) throw new Error(found.error.message);
  return { layout: parsed.layout, plan: makePlan({ ...input, nest: found }) };
}

describe.each(NAMES)('the demo job %s', (name) => {
  it('closes: its readings agree within the 95 % limit and none is a suspect', () => {
    const { room, roomError, untaped } = solve(name).plan;

    expect(roomError).toBeNull();
    expect(untaped).toEqual([]);
    expect(room?.dof).toBeGreaterThanOrEqual(2);
    expect(room?.chi2).toBeLessThan(room?.chi2Limit ?? 0);
    expect(room?.suspects).toEqual([]);
  });

  it('lays every run and leaves nothing that has to be fixed', () => {
    const { layout, plan } = solve(name);

    expect(plan.tops.problems).toEqual([]);
    expect(new Set(plan.pieces.map(({ on }) => on)).size).toBe(layout.runs.length + layout.islands.length);
    expect(plan.findings.filter(({ severity }) => severity === 'stop')).toEqual([]);
  });

  it("is nested on the demo shop's slabs, every piece once", () => {
    const { plan } = solve(name);
    const nested = plan.nest?.slabs.flatMap((slab) => slab.parts.map(({ id }) => id)) ?? [];

    expect(nested.sort()).toEqual(plan.pieces.map(({ letter }) => letter).sort());
  });
});

describe('the Quay Street scullery', () => {
  it('has a middle run longer than the longest slab, with its seam in the sink', () => {
    const { layout, plan } = solve('quay-street-scullery');
    const longest = Math.max(...layout.stock.slabs.map(({ length }) => length));
    const middle = plan.tops.runs.find(({ id }) => id === '2');

    expect((middle?.backTo ?? 0) - (middle?.backFrom ?? 0)).toBeGreaterThan(longest);
    expect(plan.seams.map(({ on, inCutout }) => [on, inCutout])).toEqual([['2', 'c1']]);
  });

  it('has miters as long as depth / sin(half the corner), both corners off square', () => {
    const { plan } = solve('quay-street-scullery');

    // Hand formula for two runs of one depth D meeting at a corner c: the miter runs over D / sin(c / 2).
    for (const joint of plan.joints) {
      expect(joint.length).toBeCloseTo(25 / Math.sin((joint.corner / 2) * (Math.PI / 180)), 9);
      expect(Math.abs(joint.corner - 90)).toBeGreaterThan(1);
    }
    // 36-48 triangles of 60 1/2 and 59 1/4, law of cosines: 91.04 and 88.55 degrees before the ties have their say.
    const byTriangle = (c: number) => (Math.acos((36 ** 2 + 48 ** 2 - c ** 2) / (2 * 36 * 48)) * 180) / Math.PI;
    expect(plan.joints[0]?.corner).toBeCloseTo(byTriangle(60.5), 1);
    expect(plan.joints[1]?.corner).toBeCloseTo(byTriangle(59.25), 1);
  });
});
