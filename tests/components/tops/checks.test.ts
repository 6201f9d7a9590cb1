import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { findingsAt, placeOf, pointsOf } from '@/components/tops/finding-places';
import { cutoutPlaceProblem, runPlaceProblem, someLength } from '@/components/tops/length-checks';
import { newCutout, newIsland, newRun, newStrip, type IslandForm } from '@/components/tops/new-items';
import { pieceDifferences } from '@/components/tops/plan-differences';
import { after, planOf, scullery } from './tops-job';

describe('lengths that cannot be', () => {
  const layout = scullery();
  const plan = planOf(layout);
  const run = layout.runs.find((one) => one.id === '3')!;

  it('a run longer than its wall says how far it would go past', () => {
    expect(runPlaceProblem(run, { to: 90 }, plan, layout)).toMatch(/^Wall C is 86 1\/16 in long; the run would go 3 15\/16 in past its end\.$/); // prettier-ignore
    expect(runPlaceProblem(run, { to: 86 }, plan, layout)).toBeNull();
    expect(runPlaceProblem(run, { from: 60, to: 50 }, plan, layout)).toMatch(/^The run has no length/);
  });

  it('a cutout past the back edge says by how much; notches and apron fronts may', () => {
    const cutout = { setback: 10, depth: 17, kind: 'sink' };
    expect(cutoutPlaceProblem(layout, '2', cutout)).toBe(
      'The top is 25 in deep; the cutout would reach 2 in past its back edge.',
    );
    expect(cutoutPlaceProblem(layout, '2', { ...cutout, setback: 8 })).toBeNull();
    expect(cutoutPlaceProblem(layout, '2', { ...cutout, kind: 'notch' })).toBeNull();
  });

  it('nothing is no depth', () => {
    expect(someLength('A top’s depth')(0)).toBe('A top’s depth has to be more than nothing.');
    expect(someLength('A top’s depth')(1 / 16)).toBeNull();
  });
});

describe('what can be added', () => {
  it.each<IslandForm>(['rectangle', 'clipped', 'rounded', 'L', 'free'])(
    'lays an island, %s, as one more top',
    (form) => {
      const layout = scullery();
      const item = newIsland(layout, form);
      const plan = planOf(after(layout, { kind: 'addItem', section: 'islands', item }));
      expect(plan.tops.problems).toEqual([]);
      expect(plan.pieces.filter((piece) => piece.on === item.id).length).toBeGreaterThanOrEqual(1);
    },
  );

  it('lays a run on the free part of a wall: past the range it begins where the other ends', () => {
    const layout = scullery();
    const item = newRun(layout, planOf(layout), DEFAULT_SETTINGS, 'C', 'front');
    expect([item.from, item.to, item.left.kind, item.right.kind]).toEqual([56, 'end', 'open', 'open']);
    const far = newRun(layout, planOf(layout), DEFAULT_SETTINGS, 'C', 'back');
    expect([far.from, far.to, far.side]).toEqual([0, 'end', 'back']);
  });

  it('makes a backsplash as long as the longest run', () => {
    const layout = scullery();
    const plan = planOf(layout);
    const longest = Math.max(...plan.tops.runs.map((run) => run.backTo - run.backFrom));
    expect(Math.abs(newStrip(layout, plan, 'backsplash').length - longest)).toBeLessThanOrEqual(1 / 32);
  });

  it('cuts a sink over the sink base that has none, a tap behind it, and keeps both on the top', () => {
    const layout = after(scullery(), { kind: 'removeItem', section: 'cutouts', item: 'c1' });
    const sink = newCutout(layout, planOf(layout), '2', 'sink');
    expect([sink.centre, sink.setback + sink.depth <= 23]).toEqual([75, true]);
    const plan = planOf(after(layout, { kind: 'addItem', section: 'cutouts', item: sink }));
    expect(plan.tops.problems).toEqual([]);
    expect(newCutout(layout, planOf(layout), '2', 'tap').centre).toBe(75);
  });
});

describe('findings and their places', () => {
  it('each that names something laid has points to zoom to, and is listed where it is chosen', () => {
    const layout = scullery();
    const plan = planOf(layout);
    const placed = plan.findings.filter((finding) => placeOf(finding, plan) !== null);
    expect(placed.length).toBeGreaterThan(3);
    for (const finding of placed) expect(pointsOf(finding, plan).length).toBeGreaterThan(1);
    const joint = findingsAt({ kind: 'joint', between: ['1', '2'] }, plan);
    expect(joint.some((finding) => /^Joint P to Q opens/.test(finding.text))).toBe(true);
  });
});

describe('before and after', () => {
  it('lists what a tape can tell: new, gone and changed pieces, in the order of their letters', () => {
    const layout = scullery();
    const island = newIsland(layout, 'rectangle');
    const deeper = after(layout, { kind: 'changeItem', section: 'runs', item: '1', change: { depth: 24 } });
    const [before, now] = [
      planOf(layout),
      planOf(after(deeper, { kind: 'addItem', section: 'islands', item: island })),
    ];
    const found = pieceDifferences(before, now, '1/16');
    expect(found.find((one) => one.letter === 'P')).toMatchObject({ kind: 'changed', depth: [25, 24] });
    expect(found.filter((one) => one.kind === 'new').length).toBeGreaterThanOrEqual(1);
    expect(pieceDifferences(now, before, '1/16').some((one) => one.kind === 'gone')).toBe(true);
    // S is at the other corner: nothing of it changes.
    expect(found.some((one) => one.letter === 'S')).toBe(false);
  });

  it('passes over what is less than the step', () => {
    const layout = scullery();
    const hair = after(layout, { kind: 'changeItem', section: 'runs', item: '3', change: { to: 56.01 } });
    expect(pieceDifferences(planOf(layout), planOf(hair), '1/16')).toEqual([]);
  });
});
