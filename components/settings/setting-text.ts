import type { ShopSettings } from '@/geometry/core/settings';
import { formatLength, type DisplayStep } from '@/geometry/tape/format-length';
import { parseLength, parseSignedLength } from '@/geometry/tape/parse-length';
import { shopSettingsSchema } from '@/shared/contracts/shop-settings';
import type { TypedValue } from '../ui/TypedField';
import type { SettingKind } from './setting-fields';

/** The unit that stands behind the number; lengths carry their own. */
export const SETTING_UNITS: Readonly<Record<SettingKind, string | null>> = {
  length: null,
  signed: null,
  decimal: 'in',
  hours: 'h',
  coats: 'coats',
  'glue rate': 'sq ft a gallon',
  'finish rate': 'sq ft a quart',
};

const isLength = (kind: SettingKind): kind is 'length' | 'signed' => kind === 'length' || kind === 'signed';

/** Shop settings are finer than a saw: a tape error is half of what a cut is rounded to. */
const stepOf = (metric: boolean): DisplayStep => (metric ? '0.5 mm' : '1/64');

export function writeSetting(value: number, kind: SettingKind, metric: boolean): string {
  if (isLength(kind)) return formatLength(value, stepOf(metric));
  return String(Number(value.toPrecision(6)));
}

/** What was typed as a number of this kind, or a sentence that says what would be one. */
export function readSetting(text: string, kind: SettingKind, metric: boolean): TypedValue<number> {
  if (isLength(kind)) return (kind === 'signed' ? parseSignedLength : parseLength)(text, metric ? 'mm' : 'in');
  const value = text.trim() === '' ? NaN : Number(text);
  return Number.isNaN(value) ? { ok: false, message: 'This has to be a number.' } : { ok: true, value };
}

/** Why the shop cannot have these settings, or null: the server's own limits in words. */
export function settingsProblem(settings: ShopSettings): string | null {
  const issue = shopSettingsSchema.safeParse(settings).error?.issues[0];
  if (!issue) return null;
  if (issue.code === 'too_small')
    return issue.inclusive ? `This cannot be less than ${issue.minimum}.` : 'This has to be more than nothing.';
  if (issue.code === 'too_big') return `This cannot be more than ${issue.maximum}.`;
  return 'This has to be a whole number.';
}
