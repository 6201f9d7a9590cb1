import { doneCount, stepState } from '@/components/work/step-state';
import { readHumidity, readTemperature, writeTemperature } from '@/components/work/climate-words';
import { arrangeWork } from '@/geometry/wood/arrange-work';
import type { WorkMark } from '@/shared/work/work-marks';

const step = (name: string, after: readonly string[]) =>
  ({ step: name, part: 'shop', after, hours: 1, waitHours: 0, pieces: [], tools: [], consumables: [] }) as const;
const STEPS = [step('Cut', []), step('Glue', ['Cut']), step('Sand', ['Glue'])];
const done = (name: string, readyAt = '2026-03-16T10:00:00.000Z'): WorkMark => ({
  step: name,
  startedAt: null,
  startedBy: null,
  doneAt: '2026-03-16T10:00:00.000Z',
  doneBy: 'Odile',
  readyAt,
});
const NOON = Date.parse('2026-03-16T12:00:00.000Z');

describe('stepState', () => {
  const [cut, glue, sand] = arrangeWork(STEPS) as [never, never, never];
  const all = [cut, glue, sand];
  const kind = (one: never, marks: Record<string, WorkMark>) => stepState(one, all, marks, NOON).kind;

  it('offers a step when what it needs is done', () => {
    expect([kind(cut, {}), kind(glue, {}), kind(sand, {})]).toEqual(['next', 'waits', 'waits']);
    expect([kind(cut, { Cut: done('Cut') }), kind(glue, { Cut: done('Cut') })]).toEqual(['done', 'next']);
  });

  it('holds the next one while glue cures, to the minute', () => {
    const marks = (ready: string) => ({ Cut: done('Cut'), Glue: done('Glue', ready) });
    expect(kind(sand, marks('2026-03-16T12:00:01.000Z'))).toBe('curing');
    expect(kind(sand, marks('2026-03-16T12:00:00.000Z'))).toBe('next');
  });

  it('offers what follows a step without a wait at once, also when the page looked at the clock before', () => {
    expect(stepState(glue, all, { Cut: done('Cut') }, Date.parse('2026-03-16T09:00:00.000Z')).kind).toBe('next');
  });

  it('lets nothing wait for a step that is left out, and counts it out', () => {
    const changes = [{ id: 'Cut', skipped: 'Comes cut.' }];
    const arranged = arrangeWork(STEPS, { changes, added: [], order: [] });
    expect(stepState(arranged[1]!, arranged, {}, NOON).kind).toBe('next');
    expect(doneCount(arranged, { Glue: done('Glue') })).toEqual({ done: 1, of: 2 });
  });
});

describe('air as it is typed', () => {
  it.each([
    ['68', false, 68],
    ['20', true, 68],
    ['20 C', false, 68],
    ['68°F', true, 68],
    ['-40 c', false, -40],
    ['21,5', true, 70.7],
  ])('reads %s', (text, metric, tempF) => {
    const read = readTemperature(text, metric);
    expect(read.ok && read.value).toBeCloseTo(tempF, 9);
  });

  it('writes it back in the unit of the job', () => {
    expect([writeTemperature(68, false), writeTemperature(68, true)]).toEqual(['68 F', '20 C']);
  });

  it('says what is wrong with what no house has', () => {
    expect(readTemperature('warm', false)).toMatchObject({ ok: false });
    expect(readTemperature('60 C', false)).toMatchObject({ ok: false });
    expect(readHumidity('101')).toMatchObject({ ok: false });
    expect(readHumidity('')).toMatchObject({ ok: false });
    expect(readHumidity('45 %')).toEqual({ ok: true, value: 45 });
  });
});
