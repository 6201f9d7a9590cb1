import { found, proveCases } from './case';
import { FINISH_CASES } from './finish-cases';
import { kitchen } from './kitchen';

describe('findings of edges and finish', () => {
  proveCases(FINISH_CASES);

  it('lets oil stand under food preparation', () => {
    expect(found(kitchen({ layout: { finish: { kind: 'oil', foodPrep: true } } }), 'finish-food-prep')).toEqual([]);
  });

  it('counts an open end as bare when the whole top gets no finish', () => {
    expect(found(kitchen({ layout: { finish: { kind: 'none' } } }), 'end-unfinished')).toHaveLength(2);
  });

  it('asks an island for round corners, and not one that is clipped or round already', () => {
    const island = (corner: number) =>
      kitchen({ layout: { runs: [], islands: [{ id: 'I', length: 72, depth: 24, corner, shape: 'rounded' }] } });
    expect(found(island(0.25), 'sharp-corner')).toHaveLength(1);
    expect(found(island(1), 'sharp-corner')).toEqual([]);
  });
});
