import { found, proveCases } from './case';
import { CUTOUT_CASES } from './cutout-cases';
import { base, kitchen, sink } from './kitchen';

describe('findings of cutouts', () => {
  proveCases(CUTOUT_CASES);

  it('lets the front of an apron sink be open', () => {
    const context = kitchen({ layout: { cutouts: [sink({ mount: 'apron', setback: 0 })] } });
    expect(found(context, 'narrow-strip').map((f) => f.at.detail)).not.toContain('front');
    expect(found(context, 'cutout-off-top')).toEqual([]);
  });

  it('leaves tap holes and notches out of it', () => {
    const tap = sink({ kind: 'tap', width: 1.5, depth: 1.5, setback: 22.5, radius: 0.75 });
    expect(found(kitchen({ layout: { cutouts: [tap] } }), 'narrow-strip')).toEqual([]);
  });

  it('says that a cutout lies off the top only once', () => {
    const context = kitchen({ layout: { cutouts: [sink({ centre: 14 })] } });
    expect(context.tops.problems).toHaveLength(1);
    expect(found(context, 'cutout-off-top')).toEqual([]);
    expect(found(context, 'cannot-lay')).toHaveLength(1);
  });

  it('says nothing of a base where none is drawn', () => {
    const context = kitchen({ layout: { cutouts: [sink({ width: 60 })] } });
    expect(found(context, 'sink-wider-than-base')).toEqual([]);
  });

  it('warns of the heat of a range as of a cooktop, once a top stands beside it', () => {
    const range = base({ kind: 'range', from: 30, to: 60 });
    expect(found(kitchen({ layout: { bases: [range] } }), 'cooktop-heat')[0]!.text).toContain('A range on wall A');
    expect(found(kitchen({ layout: { runs: [], bases: [range] } }), 'cooktop-heat')).toEqual([]);
  });
});
