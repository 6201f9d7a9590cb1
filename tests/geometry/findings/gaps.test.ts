import { found, proveCases } from './case';
import { GAP_CASES, YEAR } from './gap-cases';
import { kitchen } from './kitchen';
import { run } from '@/tests/helpers/tops-builder';

describe('findings of the gaps at the walls', () => {
  proveCases(GAP_CASES);

  it('asks for the swelling up to the next sixteenth', () => {
    const context = kitchen({ layout: { runs: [run('1', 'A', { backGap: 0.1 })], climate: YEAR } });
    expect(found(context, 'gap-under-swelling')[0]!.action).toContain('1/4 in or more');
  });

  it('judges each run by its own depth: 12 in swell 0.105 in and go with 1/8', () => {
    const context = kitchen({ layout: { runs: [run('1', 'A', { backGap: 0.125, depth: 12 })], climate: YEAR } });
    expect(found(context, 'gap-under-swelling')).toEqual([]);
  });

  it('says that there is no backsplash when there is none', () => {
    const context = kitchen({ layout: { fixing: { rail: 1.5, backsplash: 0 } } });
    expect(found(context, 'gap-not-covered')[0]!.text).toContain('there is no backsplash');
  });

  it('says nothing of walls while the room is not solved', () => {
    const context = { ...kitchen({ layout: { fixing: { rail: 1.5, backsplash: 0 } } }), fit: null };
    expect(found(context, 'gap-not-covered')).toEqual([]);
  });
});
