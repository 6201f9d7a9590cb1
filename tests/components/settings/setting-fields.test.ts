import { settingAt, SETTING_GROUPS, withSetting } from '@/components/settings/setting-fields';
import { readLengths } from '@/components/settings/ScrewLengths';
import { readSetting, writeSetting } from '@/components/settings/setting-text';
import { readField, usualWords } from '@/components/settings/SettingInput';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { SETTING_SOURCES } from '@/geometry/wood/setting-sources';

const fields = SETTING_GROUPS.flatMap((group) => group.fields);

/** Places of all numbers in a document, lists and texts left out. */
function numbersOf(value: unknown, path: readonly string[] = []): string[] {
  if (typeof value === 'number') return [path.join('.')];
  if (typeof value !== 'object' || value === null || Array.isArray(value)) return [];
  return Object.entries(value).flatMap(([key, inner]) => numbersOf(inner, [...path, key]));
}

describe('the fields of the shop settings', () => {
  it('are all numbers of the settings, each once', () => {
    expect(fields.map((field) => field.path.join('.')).sort()).toEqual(numbersOf(DEFAULT_SETTINGS).sort());
  });

  it.each(fields.map((field) => [field.label, field] as const))('%s has a source of the same value', (label, field) => {
    const source = SETTING_SOURCES.find((constant) => constant.name === label);
    expect(source?.value).toBe(settingAt(DEFAULT_SETTINGS, field));
  });

  it.each(fields.map((field) => [field.label, field] as const))('%s is stored where it is read', (_, field) => {
    const changed = withSetting(DEFAULT_SETTINGS, field, 7);
    expect(settingAt(changed, field)).toBe(7);
    expect(withSetting(changed, field, settingAt(DEFAULT_SETTINGS, field))).toEqual(DEFAULT_SETTINGS);
  });

  it('reads back what it writes, in inches as they are and in millimeters to half of one', () => {
    for (const field of fields) {
      const value = settingAt(DEFAULT_SETTINGS, field);
      const inches = readSetting(writeSetting(value, field.kind, false), field.kind, false);
      const metric = readSetting(writeSetting(value, field.kind, true), field.kind, true);
      if (!inches.ok || !metric.ok) throw new Error(`${field.label} does not read`);
      expect(inches.value).toBeCloseTo(value, 6);
      expect(Math.abs(metric.value - value)).toBeLessThanOrEqual(0.25 / 25.4 + 1e-9);
    }
  });

  it.each([
    ['Back gap', '-1/4', /negative/],
    ['Shortest piece', '0', /more than nothing/],
    ['Tape error for each inch', '0.5', /more than 0.05/],
    ['Coats of oil', '2.5', /whole number/],
    ['Coats of oil', '', /a number/],
    ['Clamp time', '3000', /more than 2000/],
    ['Overhang at an open end', '-13', /less than -12/],
  ])('%s refuses "%s" in words', (label, text, words) => {
    const field = fields.find((one) => one.label === label)!;
    const read = readField(text, DEFAULT_SETTINGS, field, false);
    expect(read.ok ? read.value : read.message).toMatch(words);
  });

  it('says what is usual and how well it is known', () => {
    expect(
      usualWords(
        fields.find((field) => field.label === 'Back gap')!,
        false,
      ),
    ).toBe('Usual 1/4; common practice');
    expect(
      usualWords(
        fields.find((field) => field.label === 'Back gap')!,
        true,
      ),
    ).toBe('Usual 6.5 mm; common practice');
  });
});

describe('lengths of screws on the shelf', () => {
  it('come sorted, each once, and name what is none', () => {
    expect(readLengths('3, 1 1/4; 2 1/2, 3', false)).toEqual({ ok: true, value: [1.25, 2.5, 3] });
    expect(readLengths('32 mm, 1', true)).toMatchObject({ ok: true });
    expect(readLengths('1 1/4, two', false)).toMatchObject({ ok: false, message: expect.stringContaining('"two"') });
    expect(readLengths(' , ', false)).toEqual({ ok: false, message: 'At least one length has to stand here.' });
  });
});
