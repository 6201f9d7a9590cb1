import { found, proveCases } from './case';
import { kitchen, nestOf } from './kitchen';
import { SLAB_CASES } from './slab-cases';

describe('findings of slabs', () => {
  proveCases(SLAB_CASES);

  it('follows the grain when both pieces are turned, in the reverse order', () => {
    const seamed = kitchen({ walls: [140] });
    const turned = (first: string, second: string) =>
      found(
        {
          ...seamed,
          nest: nestOf([
            { id: first, x: 1, turned: true },
            { id: second, x: 60, turned: true },
          ]),
        },
        'grain-breaks-at-seam',
      );
    expect(turned('Q', 'P')).toEqual([]);
    expect(turned('P', 'Q')).toHaveLength(1);
  });

  it('breaks the grain when one of the two lies face down or something lies between them', () => {
    const seamed = kitchen({ walls: [140] });
    const over = nestOf([
      { id: 'P', turnedOver: true },
      { id: 'Q', x: 60, turnedOver: true },
    ]);
    expect(found({ ...seamed, nest: over }, 'grain-breaks-at-seam')).toHaveLength(1);
    expect(found({ ...seamed, nest: nestOf(['P', 'X', 'Q']) }, 'grain-breaks-at-seam')).toHaveLength(1);
  });

  it('says when no slab is both long and deep enough though one is each', () => {
    const context = kitchen();
    const [slab] = context.layout.stock.slabs;
    const stock = {
      ...context.layout.stock,
      slabs: [
        { ...slab!, id: 'long', depth: 20 },
        { ...slab!, id: 'deep', length: 60 },
      ],
    };
    const [both] = found({ ...context, layout: { ...context.layout, stock } }, 'piece-over-slab');
    expect(both!.text).toContain('no slab is both 90 in long and 25 in deep');
  });
});
