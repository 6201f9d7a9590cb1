import { StyleSheet, View } from 'react-native';

import { FieldShell } from './Field';
import { Icon } from './Icon';
import type { IconName } from './icon-shapes';
import { Press } from './Press';
import { Text } from './Text';
import { color, radius, space } from './tokens';
import { useRadioKeys } from './use-radio-keys';

export interface Choice<T extends string> {
  readonly value: T;
  readonly label: string;
  readonly icon?: IconName;
  readonly disabled?: boolean;
}

export interface SegmentedProps<T extends string> {
  readonly label: string;
  readonly options: readonly Choice<T>[];
  readonly value: T | null;
  readonly onChange: (next: T) => void;
  readonly hint?: string;
  readonly error?: string;
  readonly labelHidden?: boolean;
  /** None of them can be chosen. */
  readonly disabled?: boolean;
}

/** Two to four short choices side by side; the chosen one is dark and ticked. */
export function Segmented<T extends string>({ value, onChange, disabled, ...shell }: SegmentedProps<T>) {
  const options = disabled ? shell.options.map((option) => ({ ...option, disabled })) : shell.options;
  const chosen = options.findIndex((option) => option.value === value);
  const keys = useKeys(options, chosen, onChange);
  return (
    <FieldShell {...shell}>
      {(ids) => (
        <View
          role="radiogroup"
          aria-label={shell.label}
          aria-describedby={ids.describedBy}
          {...keys.group}
          style={styles.segments}
        >
          {options.map((option, index) => (
            <Option
              key={option.value}
              option={option}
              on={index === chosen}
              tabIndex={keys.tabIndex(index)}
              onPress={() => onChange(option.value)}
              style={[styles.segment, index > 0 && styles.divided]}
              ticked
            />
          ))}
        </View>
      )}
    </FieldShell>
  );
}

export interface ChipsProps<T extends string> {
  /** What they narrow down or choose, for screen readers. */
  readonly label: string;
  readonly options: readonly Choice<T>[];
  readonly value: T | null;
  readonly onChange: (next: T) => void;
}

/** Choices that stand apart and wrap: filters such as "Mine 4", "All 11". One is on. */
export function Chips<T extends string>({ label, options, value, onChange }: ChipsProps<T>) {
  const chosen = options.findIndex((option) => option.value === value);
  const keys = useKeys(options, chosen, onChange);
  return (
    <View role="radiogroup" aria-label={label} {...keys.group} style={styles.chips}>
      {options.map((option, index) => (
        <Option
          key={option.value}
          option={option}
          on={index === chosen}
          tabIndex={keys.tabIndex(index)}
          onPress={() => onChange(option.value)}
          style={styles.chip}
        />
      ))}
    </View>
  );
}

function useKeys<T extends string>(options: readonly Choice<T>[], chosen: number, onChange: (next: T) => void) {
  return useRadioKeys(
    options.length,
    chosen,
    (index) => onChange(options[index]!.value),
    (index) => options[index]?.disabled === true,
  );
}

interface OptionProps<T extends string> {
  readonly option: Choice<T>;
  readonly on: boolean;
  readonly tabIndex: 0 | -1;
  readonly onPress: () => void;
  readonly style: object;
  readonly ticked?: boolean;
}

function Option<T extends string>({ option, on, tabIndex, onPress, style, ticked }: OptionProps<T>) {
  const tone = on ? 'paper' : option.disabled ? 'ink2' : 'ink';
  return (
    <Press
      role="radio"
      aria-checked={on}
      tabIndex={tabIndex}
      disabled={option.disabled}
      onPress={onPress}
      onKeyDown={(event) => {
        if (event.key !== ' ') return;
        event.preventDefault();
        if (!option.disabled) onPress();
      }}
      hoverGround={on ? undefined : color.chalkT}
      style={[style, on && styles.on]}
    >
      {ticked && on && <Icon name="check" tone={tone} size={18} />}
      {option.icon && <Icon name={option.icon} tone={tone} size={20} />}
      <Text kind="label" tone={tone} align="center">
        {option.label}
      </Text>
    </Press>
  );
}

const styles = StyleSheet.create({
  segments: {
    flexDirection: 'row',
    minHeight: 52,
    borderWidth: 1.5,
    borderColor: color.edge,
    borderRadius: radius.control,
    backgroundColor: color.card,
    overflow: 'hidden',
  },
  segment: {
    flex: 1,
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    alignContent: 'center',
    justifyContent: 'center',
    gap: space.s,
    paddingHorizontal: space.s,
    minWidth: 44,
    outlineOffset: -3,
  },
  divided: { borderLeftWidth: 1, borderLeftColor: color.edge },
  chips: { flexDirection: 'row', flexWrap: 'wrap', gap: space.s },
  chip: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.s,
    minHeight: 44,
    paddingHorizontal: space.l,
    borderWidth: 1.5,
    borderColor: color.edge,
    borderRadius: radius.control,
  },
  on: { backgroundColor: color.ink, borderColor: color.ink },
});
