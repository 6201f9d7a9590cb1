import type { ShopSettings } from '@/geometry/core/settings';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { SETTING_SOURCES } from '@/geometry/wood/setting-sources';
import { sourceText } from '@/geometry/wood/sourced';
import { Text } from '../ui/Text';
import { TypedField, type TypedValue } from '../ui/TypedField';
import { settingAt, withSetting, type SettingField } from './setting-fields';
import { readSetting, SETTING_UNITS, settingsProblem, writeSetting } from './setting-text';

export interface SettingInputProps {
  readonly settings: ShopSettings;
  readonly field: SettingField;
  readonly metric: boolean;
  readonly disabled: boolean;
  readonly onValue: (value: number) => void;
}

/** One number of the shop's settings, with its usual value and where that is from. */
export function SettingInput({ settings, field, metric, disabled, onValue }: SettingInputProps) {
  const unit = SETTING_UNITS[field.kind];
  return (
    <TypedField
      label={field.label}
      value={settingAt(settings, field)}
      write={(value) => writeSetting(value, field.kind, metric)}
      read={(text) => readField(text, settings, field, metric)}
      hint={usualWords(field, metric)}
      disabled={disabled}
      after={unit && <Text kind="second">{unit}</Text>}
      onValue={onValue}
    />
  );
}

/** What was typed into a field, where the shop may have it. */
export function readField(
  text: string,
  settings: ShopSettings,
  field: SettingField,
  metric: boolean,
): TypedValue<number> {
  const read = readSetting(text, field.kind, metric);
  const problem = read.ok ? settingsProblem(withSetting(settings, field, read.value)) : null;
  return problem === null ? read : { ok: false, message: problem };
}

/** "Usual 1/4; common practice" */
export function usualWords(field: SettingField, metric: boolean): string {
  const source = SETTING_SOURCES.find((constant) => constant.name === field.label);
  const usual = writeSetting(settingAt(DEFAULT_SETTINGS, field), field.kind, metric);
  return source ? `Usual ${usual}; ${sourceText(source)}` : `Usual ${usual}`;
}
