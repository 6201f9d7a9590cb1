import type { Layout } from '@/geometry/core/layout';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { layTops } from '@/geometry/seams/lay-tops';
import { orderOfWork } from '@/geometry/wood/schedule';
import { JOINT, layout, room, run } from '@/tests/helpers/tops-builder';

function order(overrides: Partial<Layout> = {}, lengths: readonly number[] = [80, 90]) {
  const drawn = layout({
    runs: [run('1', 'A', { right: JOINT }), run('2', 'B', { left: JOINT })],
    joints: [{ between: ['1', '2'], kind: 'miter', assembled: 'shop' }],
    ...overrides,
  });
  const tops = layTops(drawn, room(lengths, lengths.length > 1 ? [90] : []), DEFAULT_SETTINGS);
  return orderOfWork({ layout: drawn, settings: DEFAULT_SETTINGS, tops });
}

const sink = { id: 'c1', on: '2', kind: 'sink', centre: 55, setback: 2, width: 30, depth: 21, radius: 0.75 } as const;

describe('orderOfWork', () => {
  it('goes from receiving slabs to handing over, shop before site', () => {
    const steps = order();
    expect(steps.map((s) => s.step)).toEqual([
      'Receive and check the slabs',
      'Let the slabs settle in the shop',
      'Cut the pieces',
      'Mortise the joints and dry fit',
      'Glue up P to Q',
      'Profile the edges',
      'Sand',
      'Seal all faces',
      'Load',
      'Clear and level the cabinets',
      'Carry in and set',
      'Scribe to the walls',
      'Fasten from below',
      'Finish coat 2',
      'Finish coat 3',
      'Clean up and hand over',
    ]);
    const site = steps.findIndex((s) => s.part === 'site');
    expect(steps.slice(site).every((s) => s.part === 'site')).toBe(true);
  });

  it('has names that are all different, and follows only steps that come before', () => {
    const steps = order(
      { joints: [{ between: ['1', '2'], kind: 'miter', assembled: 'site' }], cutouts: [sink] },
      [80, 130],
    );
    const seen = new Set<string>();
    for (const step of steps) {
      expect(seen.has(step.step)).toBe(false);
      for (const before of step.after) expect(seen.has(before)).toBe(true);
      seen.add(step.step);
    }
    expect(steps[0]!.after).toEqual([]);
    expect(steps.slice(1).every((s) => s.after.length > 0)).toBe(true);
  });

  it('waits 72 h for the slabs, 2 h in clamps and 24 h between coats of oil', () => {
    const wait = (name: string) => order().find((s) => s.step === name)!.waitHours;
    expect(wait('Let the slabs settle in the shop')).toBe(72);
    expect(wait('Glue up P to Q')).toBe(2);
    expect(wait('Finish coat 2')).toBe(24);
    expect(wait('Clean up and hand over')).toBe(720);
  });

  it('closes a site joint after fastening, and cures it 24 h', () => {
    const steps = order({ joints: [{ between: ['1', '2'], kind: 'miter', assembled: 'site' }] });
    const close = steps.find((s) => s.step === 'Close P to Q on site')!;
    expect(close).toMatchObject({ part: 'site', waitHours: 24, after: ['Fasten from below'], pieces: ['P', 'Q'] });
    expect(steps.some((s) => s.step.startsWith('Glue up'))).toBe(false);
  });

  it('cuts a sink in the shop, and on site after the cure when a seam runs through it', () => {
    const whole = order({ cutouts: [sink] });
    expect(whole.find((s) => s.step === 'Cut the openings')).toMatchObject({ part: 'shop', pieces: ['Q'] });
    const long = order({ cutouts: [{ ...sink, centre: 65 }] }, [80, 130]);
    const cut = long.find((s) => s.step === 'Cut the openings that a seam runs through')!;
    expect(cut.part).toBe('site');
    expect(cut.after).toEqual(['Close Q to R on site']);
    expect(long.some((s) => s.step === 'Cut the openings')).toBe(false);
  });

  it('stops the edge profile short of a seam and says nothing of it without one', () => {
    const profile = (steps: ReturnType<typeof order>) => steps.find((s) => s.step === 'Profile the edges')!;
    expect(profile(order({}, [80, 130])).caution).toContain('Stop 2 in short');
    expect(profile(order()).caution).toBeUndefined();
  });

  it('leaves out sealing and coats for bare wood, and all joints for a single run', () => {
    const bare = order({ finish: { kind: 'none' } });
    expect(bare.some((s) => s.step.startsWith('Seal') || s.step.startsWith('Finish coat'))).toBe(false);
    const single = order({ runs: [run('1', 'A')], joints: [] }, [80]);
    expect(single.some((s) => s.step.includes('dry fit') || s.step.startsWith('Glue up'))).toBe(false);
  });

  it('warns of rags with oil, of dust when sanding, of hands when loading', () => {
    const caution = (name: string) => order().find((s) => s.step === name)!.caution;
    expect(caution('Seal all faces')).toContain('rags');
    expect(caution('Sand')).toContain('dust');
    expect(caution('Load')).toContain('lifting equation');
    expect(caution('Fasten from below')).toContain('1/2 in of wood is left');
  });

  it('glues joints that share a piece one after the other', () => {
    const drawn = layout({
      runs: [
        run('1', 'A', { right: JOINT }),
        run('2', 'B', { left: JOINT, right: JOINT }),
        run('3', 'C', { left: JOINT }),
      ],
      joints: [
        { between: ['1', '2'], kind: 'miter', assembled: 'shop' },
        { between: ['2', '3'], kind: 'miter', assembled: 'shop' },
      ],
    });
    const tops = layTops(drawn, room([80, 90, 80], [90, 90]), DEFAULT_SETTINGS);
    const steps = orderOfWork({ layout: drawn, settings: DEFAULT_SETTINGS, tops });
    expect(steps.find((s) => s.step === 'Glue up Q to R')!.after).toEqual(['Glue up P to Q']);
    expect(steps.find((s) => s.step === 'Profile the edges')!.after).toEqual(['Glue up P to Q', 'Glue up Q to R']);
  });

  it('has nothing to do where there is nothing to make', () => {
    expect(order({ runs: [], joints: [] })).toEqual([]);
  });
});
