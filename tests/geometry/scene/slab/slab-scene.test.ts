import type { DrawItem, Scene } from '@/geometry/scene/display-list';
import { slabScene } from '@/geometry/scene/slab/slab-scene';
import { contains } from '@/geometry/core/polygon';

import { shortJob, sharedMiterJob } from '../alder-job';

const of = <K extends DrawItem['kind']>(scene: Scene, kind: K, layer: DrawItem['layer']) =>
  scene.items.filter((item): item is Extract<DrawItem, { kind: K }> => item.kind === kind && item.layer === layer);

describe('slabScene', () => {
  const { plan, layout } = sharedMiterJob();
  const scene = slabScene(plan, layout, 0);

  it('is to scale: 120 by 25 in', () => {
    expect(scene.bounds).toEqual({ minX: 0, minY: 0, maxX: 120, maxY: 25 });
  });

  it('letters by face: a disc up, a square down', () => {
    const signs = of(scene, 'mark', 'letters').filter((mark) => mark.text);
    expect(signs.map((mark) => [mark.text, mark.mark])).toEqual([['S', 'disc'], ['T', 'square']]); // prettier-ignore
    for (const sign of signs) {
      const staves = of(scene, 'staves', 'staves').find((item) => item.id === sign.text)!;
      expect(contains(staves.outline, sign.at)).toBe(true);
    }
  });

  it('runs a shared cut in chalk through both edges, and no other', () => {
    const chalk = of(scene, 'line', 'cuts').filter((line) => line.stroke.ink === 'chalk');
    expect(chalk).toHaveLength(1);
    expect(chalk[0]!.from[1]).toBe(-1);
    expect(chalk[0]!.to[1]).toBe(26);
    const miter = plan.nest!.slabs[0]!.cuts[1]!;
    if (miter.kind !== 'crosscut') throw new Error('the second cut is the miter');
    const slope = (chalk[0]!.to[0] - chalk[0]!.from[0]) / 27;
    expect(slope).toBeCloseTo((miter.back - miter.front) / 25, 9);
  });

  it('boxes the size of an offcut that goes to the rack', () => {
    const job = shortJob();
    const index = job.plan.nest!.slabs.findIndex((slab) => slab.offcuts.some((offcut) => offcut.keep));
    const kept = job.plan.nest!.slabs[index]!.offcuts.find((offcut) => offcut.keep)!;
    const [size] = of(slabScene(job.plan, job.layout, index), 'length', 'offcuts');
    expect(size).toMatchObject({ inches: kept.length, frame: 'ink' });
  });

  it('shows a defect crossed out', () => {
    const marked = { ...layout, stock: { ...layout.stock, slabs: layout.stock.slabs.map((s) => ({ ...s, defects: [{ x: 118, y: 3, w: 2, h: 6 }] })) } }; // prettier-ignore
    expect(of(slabScene(plan, marked, 0), 'line', 'defects')).toHaveLength(2);
  });

  it('gives the whole slab one seed: its staves run through its pieces', () => {
    const seeds = of(scene, 'staves', 'staves').map((item) => item.seed);
    expect(new Set(seeds).size).toBe(1);
  });
});
