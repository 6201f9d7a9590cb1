import { datedSchedule, USUAL_CALENDAR } from '@/geometry/wood/dated-schedule';
import type { Step } from '@/geometry/wood/types';

const step = (name: string, hours: number, waitHours = 0, after: readonly string[] = []): Step => ({
  step: name,
  part: 'shop',
  after,
  hours,
  waitHours,
  pieces: [],
  tools: [],
  consumables: [],
});

describe('datedSchedule', () => {
  it('starts at 8 on a Monday and ends the same day when 8 hours are enough', () => {
    // 5 January 2026 is a Monday.
    const [first] = datedSchedule([step('cut', 8)], '2026-01-05');
    expect(first).toMatchObject({
      starts: '2026-01-05',
      startsAt: 8,
      ends: '2026-01-05',
      endsAt: 16,
      ready: '2026-01-05',
    });
  });

  it('goes on the next morning past 16, and skips the weekend', () => {
    const [first, second] = datedSchedule([step('cut', 10), step('sand', 30, 0, ['cut'])], '2026-01-05');
    expect(first).toMatchObject({ ends: '2026-01-06', endsAt: 10 });
    expect(second).toMatchObject({ starts: '2026-01-06', startsAt: 10, ends: '2026-01-09', endsAt: 16 });
    const [, , third] = datedSchedule([step('a', 10), step('b', 30, 0, ['a']), step('c', 1, 0, ['b'])], '2026-01-05');
    expect(third).toMatchObject({ starts: '2026-01-12', startsAt: 8 });
  });

  it('waits for a cure by day and night, and starts in the next working hour', () => {
    const [glue, cut] = datedSchedule([step('glue', 2, 24), step('cut', 1, 0, ['glue'])], '2026-01-09');
    expect(glue).toMatchObject({ ends: '2026-01-09', endsAt: 10, ready: '2026-01-10', readyAt: 10 });
    expect(cut).toMatchObject({ starts: '2026-01-12', startsAt: 8 });
  });

  it('lets the crew go on with what need not wait', () => {
    const steps = [step('glue', 1, 24), step('edges', 2), step('sand', 1, 0, ['glue', 'edges'])];
    const [, edges, sand] = datedSchedule(steps, '2026-01-05');
    expect(edges).toMatchObject({ starts: '2026-01-05', startsAt: 9, ends: '2026-01-05', endsAt: 11 });
    expect(sand).toMatchObject({ starts: '2026-01-06', startsAt: 9 });
  });

  it('starts on the first working day when the first day is none, and keeps days off', () => {
    const saturday = datedSchedule([step('cut', 1)], '2026-01-10')[0];
    expect(saturday?.starts).toBe('2026-01-12');
    const closed = { ...USUAL_CALENDAR, closed: ['2026-01-12'] };
    expect(datedSchedule([step('cut', 1)], '2026-01-10', closed)[0]?.starts).toBe('2026-01-13');
  });

  it('goes over the end of February in a leap year', () => {
    // 28 February 2028 is a Monday.
    expect(datedSchedule([step('cut', 12)], '2028-02-28')[0]).toMatchObject({ ends: '2028-02-29', endsAt: 12 });
  });

  it('refuses a date that is none and a calendar without a working day', () => {
    expect(() => datedSchedule([step('cut', 1)], '2026-02-30')).toThrow('2026-02-30 is no date');
    expect(() => datedSchedule([step('cut', 1)], 'Monday')).toThrow(RangeError);
    expect(() => datedSchedule([step('cut', 1)], '2026-01-05', { ...USUAL_CALENDAR, workDays: [] })).toThrow(
      RangeError,
    );
  });
});
