import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { Press } from './Press';
import { Text } from './Text';
import { color, radius, space } from './tokens';
import { useRadioKeys } from './use-radio-keys';

export interface RadioOption<T extends string> {
  readonly value: T;
  readonly title: string;
  /** At the right of the title: a price, "In use", a warning. */
  readonly aside?: ReactNode;
  readonly body?: ReactNode;
  /** What `aside` and `body` say, for the accessible name. */
  readonly spoken?: string;
  readonly disabled?: boolean;
}

export interface RadioCardsProps<T extends string> {
  /** What is chosen here, for screen readers. */
  readonly label: string;
  readonly options: readonly RadioOption<T>[];
  readonly value: T | null;
  readonly onChange: (next: T) => void;
  /** Side by side where there is room; under each other when left out. */
  readonly across?: boolean;
}

/** Cards of which one is chosen. */
export function RadioCards<T extends string>({ label, options, value, onChange, across }: RadioCardsProps<T>) {
  const chosen = options.findIndex((option) => option.value === value);
  const keys = useRadioKeys(
    options.length,
    chosen,
    (index) => onChange(options[index]!.value),
    (index) => options[index]?.disabled === true,
  );
  return (
    <View role="radiogroup" aria-label={label} {...keys.group} style={[styles.group, across && styles.across]}>
      {options.map((option, index) => (
        <RadioCard
          key={option.value}
          option={option}
          chosen={index === chosen}
          tabIndex={keys.tabIndex(index)}
          onPress={() => onChange(option.value)}
          across={across}
        />
      ))}
    </View>
  );
}

interface RadioCardProps<T extends string> {
  readonly option: RadioOption<T>;
  readonly chosen: boolean;
  readonly tabIndex: 0 | -1;
  readonly onPress: () => void;
  readonly across?: boolean;
}

function RadioCard<T extends string>({ option, chosen, tabIndex, onPress, across }: RadioCardProps<T>) {
  return (
    <Press
      role="radio"
      aria-checked={chosen}
      aria-label={[option.title, option.spoken].filter(Boolean).join(', ')}
      tabIndex={tabIndex}
      disabled={option.disabled}
      onPress={onPress}
      onKeyDown={(event) => {
        if (event.key !== ' ') return;
        event.preventDefault();
        if (!option.disabled) onPress();
      }}
      style={[styles.card, across && styles.share, chosen && styles.chosen, option.disabled && styles.off]}
    >
      <View style={styles.head}>
        <View style={[styles.ring, chosen && styles.ringOn]}>{chosen && <View style={styles.dot} />}</View>
        <View style={styles.title}>
          <Text kind="rowTitle">{option.title}</Text>
        </View>
        {option.aside}
      </View>
      {option.body}
    </Press>
  );
}

const styles = StyleSheet.create({
  group: { gap: space.m },
  across: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'stretch' },
  share: { flexGrow: 1, flexBasis: 240, minWidth: 0 },
  card: {
    gap: space.s,
    padding: space.m,
    borderWidth: 1,
    borderColor: color.edge,
    borderRadius: radius.card,
    backgroundColor: color.card,
  },
  chosen: { borderColor: color.chalk, boxShadow: `0 0 0 1.5px ${color.chalk}` },
  off: { backgroundColor: color.paper },
  head: { flexDirection: 'row', alignItems: 'center', gap: space.m },
  title: { flex: 1, minWidth: 0 },
  ring: {
    width: 24,
    height: 24,
    borderRadius: 12,
    borderWidth: 2,
    borderColor: color.edge,
    alignItems: 'center',
    justifyContent: 'center',
  },
  ringOn: { borderColor: color.chalk },
  dot: { width: 12, height: 12, borderRadius: 6, backgroundColor: color.chalk },
});
