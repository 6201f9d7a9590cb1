import fc from 'fast-check';

import type { WorkPlan } from '@/geometry/core/layout';
import { arrangeWork, moveStep, stepsToDate, type WorkStep } from '@/geometry/wood/arrange-work';
import { datedSchedule } from '@/geometry/wood/dated-schedule';
import type { Step } from '@/geometry/wood/types';

const step = (name: string, part: Step['part'], after: readonly string[], pieces: readonly string[] = []): Step => ({
  step: name,
  part,
  after,
  hours: 1,
  waitHours: 0,
  pieces,
  tools: [],
  consumables: [],
});

const STEPS: readonly Step[] = [
  step('Cut the pieces', 'shop', [], ['P', 'Q', 'R']),
  step('Cut the openings', 'shop', ['Cut the pieces'], ['Q']),
  step('Profile the edges', 'shop', ['Cut the openings'], ['P', 'Q', 'R']),
  step('Sand', 'shop', ['Profile the edges'], ['P', 'Q', 'R']),
  step('Clear and level the cabinets', 'site', ['Sand']),
  step('Carry in and set', 'site', ['Clear and level the cabinets'], ['P', 'Q', 'R']),
  step('Close P to Q on site', 'site', ['Carry in and set'], ['P', 'Q']),
  step('Close Q to R on site', 'site', ['Close P to Q on site'], ['Q', 'R']),
];
const NONE: WorkPlan = { changes: [], added: [], order: [] };
const keys = (steps: readonly WorkStep[]) => steps.map((one) => one.key);
const after = (steps: readonly WorkStep[], key: string, by: -1 | 1) => {
  const order = moveStep(steps, key, by);
  return order && keys(arrangeWork(STEPS, { ...NONE, order }));
};

describe('arrangeWork', () => {
  it('leaves the generated order as it is while nobody changed it', () => {
    expect(keys(arrangeWork(STEPS))).toEqual(STEPS.map((one) => one.step));
  });

  it('puts an added step where it was added, or at the end of its part', () => {
    const added = [
      { id: 'a1', text: 'Ring the plumber', part: 'site', hours: 0.25, before: 'Carry in and set' },
      { id: 'a2', text: 'Stamp the underside', part: 'shop', hours: 0.1 },
    ] as const;
    const arranged = arrangeWork(STEPS, { ...NONE, added });
    expect(keys(arranged).indexOf('a1')).toBe(keys(arranged).indexOf('Carry in and set') - 1);
    expect(keys(arranged).indexOf('a2')).toBe(keys(arranged).indexOf('Sand') + 1);
    expect(arranged.find((one) => one.key === 'a1')).toMatchObject({
      step: 'Ring the plumber',
      added: true,
      needs: [],
    });
  });

  it('changes words, caution and hours under the same key, and says what is left out', () => {
    const arranged = arrangeWork(STEPS, {
      ...NONE,
      changes: [
        { id: 'Sand', text: 'Sand to 220', hours: 5 },
        { id: 'Cut the openings', skipped: 'The sink comes later.' },
      ],
    });
    expect(arranged.find((one) => one.key === 'Sand')).toMatchObject({ step: 'Sand to 220', hours: 5, changed: true });
    expect(arranged.find((one) => one.key === 'Cut the openings')!.skipped).toBe('The sink comes later.');
    expect(stepsToDate(arranged).map((one) => one.step)).not.toContain('Cut the openings');
  });

  it('lets the house be made ready at any time before the tops come, and edges and openings change places', () => {
    const arranged = arrangeWork(STEPS);
    expect(after(arranged, 'Clear and level the cabinets', -1)!.slice(3, 5)).toEqual([
      'Clear and level the cabinets',
      'Sand',
    ]);
    expect(after(arranged, 'Profile the edges', -1)!.slice(1, 3)).toEqual(['Profile the edges', 'Cut the openings']);
  });

  it('moves nothing before what it needs', () => {
    const arranged = arrangeWork(STEPS);
    expect(moveStep(arranged, 'Sand', -1)).toBeNull();
    expect(moveStep(arranged, 'Cut the pieces', -1)).toBeNull();
    expect(moveStep(arranged, 'Clear and level the cabinets', 1)).toBeNull();
    // They share Q.
    expect(moveStep(arranged, 'Close Q to R on site', -1)).toBeNull();
    expect(moveStep(arranged, 'Close Q to R on site', 1)).toBeNull();
  });

  it('gives every step once and none before what it needs, whatever order is stored', () => {
    const names = [...STEPS.map((one) => one.step), 'gone', 'a1'];
    const added = [{ id: 'a1', text: 'Ring the plumber', part: 'site', hours: 0.25 }] as const;
    fc.assert(
      fc.property(fc.shuffledSubarray(names), (order) => {
        const arranged = arrangeWork(STEPS, { ...NONE, added, order });
        expect(keys(arranged).sort()).toEqual([...STEPS.map((one) => one.step), 'a1'].sort());
        arranged.forEach((one, i) => {
          for (const key of one.needs) expect(keys(arranged).indexOf(key)).toBeLessThan(i);
        });
        // Whatever order it is in, it can be dated.
        expect(datedSchedule(stepsToDate(arranged), '2026-03-16')).toHaveLength(arranged.length);
      }),
    );
  });
});
