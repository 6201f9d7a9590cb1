import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { Icon } from '../ui/Icon';
import type { IconName } from '../ui/icon-shapes';
import { Press } from '../ui/Press';
import { Text } from '../ui/Text';
import { color, radius } from '../ui/tokens';

import { FractionParts } from './Fraction';
import { keepFocus } from './keep-focus';
import type { PadKey, PadUnit } from './pad-state';

export interface PadKeysProps {
  readonly unit: PadUnit;
  readonly nudge: -1 | 0 | 1;
  readonly onKey: (key: PadKey) => void;
  readonly onNext: () => void;
  /** Where Next goes: "Wall C", or "Done". */
  readonly next: { readonly label: string; readonly icon: IconName };
  /** Function keys at the left, for a tape held in the right hand. */
  readonly leftHanded?: boolean;
}

/** The pad's keys, each 48 high: digits, back, ft, 1/32 heavy or light, mm, and Next. */
export function PadKeys({ unit, nudge, onKey, onNext, next, leftHanded = false }: PadKeysProps) {
  const row = [styles.row, leftHanded && styles.mirrored];
  const digit = (value: string) => <DigitKey key={value} value={value} onKey={onKey} />;
  return (
    <View style={styles.keys}>
      <View style={row}>
        <View style={styles.digits}>{['7', '8', '9'].map(digit)}</View>
        <Key label="Take back" fn onPress={() => onKey({ kind: 'back' })}>
          <Icon name="bksp" size={26} />
        </Key>
      </View>
      <View style={row}>
        <View style={styles.digits}>{['4', '5', '6'].map(digit)}</View>
        {unit === 'in' ? (
          <Key label="feet" fn onPress={() => onKey({ kind: 'ft' })}>
            <KeyWord word="ft" />
          </Key>
        ) : (
          <Key label="double zero" fn onPress={() => onKey({ kind: 'doubleZero' })}>
            <KeyWord word="00" />
          </Key>
        )}
      </View>
      <View style={row}>
        <View style={styles.digits}>{['1', '2', '3'].map(digit)}</View>
        {unit === 'in' ? (
          <NudgeKey nudge={nudge} onKey={onKey} />
        ) : (
          <Key label="decimal point" fn onPress={() => onKey({ kind: 'point' })}>
            <KeyWord word="." />
          </Key>
        )}
      </View>
      <View style={row}>
        <View style={styles.low}>
          <Key
            label="millimeters"
            fn
            narrow
            pressed={unit === 'mm'}
            onPress={() => onKey({ kind: 'unit', to: unit === 'mm' ? 'in' : 'mm' })}
          >
            <KeyWord word={unit === 'mm' ? 'in' : 'mm'} />
          </Key>
          {digit('0')}
        </View>
        <View style={styles.nextCell}>
          <Press
            onPress={onNext}
            onMouseDown={keepFocus}
            hoverGround={color.chalkDeep}
            style={[styles.key, styles.next]}
            aria-label={`Next: ${next.label}`}
          >
            <Text kind="strong" tone="onchalk" size={19} lines={1}>
              {next.label}
            </Text>
            <Icon name={next.icon} tone="onchalk" size={22} />
          </Press>
        </View>
      </View>
    </View>
  );
}

function DigitKey({ value, onKey }: { readonly value: string; readonly onKey: (key: PadKey) => void }) {
  return (
    <Key label={value} onPress={() => onKey({ kind: 'digit', digit: value })}>
      <Text kind="number" size={26}>
        {value}
      </Text>
    </Key>
  );
}

const NUDGE_WORDS = {
  0: 'plus or minus one thirty-second',
  1: 'one thirty-second heavy',
  [-1]: 'one thirty-second light',
};

function NudgeKey({ nudge, onKey }: Pick<PadKeysProps, 'nudge' | 'onKey'>) {
  const on = nudge !== 0;
  return (
    <Key label={NUDGE_WORDS[nudge]} fn pressed={on} onPress={() => onKey({ kind: 'nudge', to: 'round' })}>
      {on ? (
        <Text kind="label" tone="onchalk" size={18}>
          {nudge === 1 ? 'heavy' : 'light'}
        </Text>
      ) : (
        <View style={styles.nudge}>
          <Text kind="strong" size={18}>
            ±
          </Text>
          <FractionParts numerator="1" denominator="32" size={21} bold />
        </View>
      )}
    </Key>
  );
}

const KeyWord = ({ word }: { readonly word: string }) => (
  <Text kind="strong" size={19}>
    {word}
  </Text>
);

interface KeyProps {
  readonly label: string;
  readonly fn?: boolean;
  /** As wide as a digit, so that the columns stand under each other. */
  readonly narrow?: boolean;
  readonly pressed?: boolean;
  readonly onPress: () => void;
  readonly children: ReactNode;
}

function Key({ label, fn = false, narrow = false, pressed, onPress, children }: KeyProps) {
  return (
    <Press
      onPress={onPress}
      onMouseDown={keepFocus}
      aria-label={label}
      aria-pressed={pressed}
      hoverGround={pressed ? undefined : color.chalkT}
      style={[styles.key, fn ? styles.fn : styles.digit, narrow && styles.narrow, pressed && styles.pressed]}
    >
      {children}
    </Press>
  );
}

const GAP = 6;

const styles = StyleSheet.create({
  keys: { gap: GAP },
  row: { flexDirection: 'row', gap: GAP },
  mirrored: { flexDirection: 'row-reverse' },
  digits: { flexDirection: 'row', gap: GAP, flexGrow: 258, flexBasis: 0 },
  low: { flexDirection: 'row', gap: GAP, flexGrow: 170, flexBasis: 0 },
  nextCell: { flexGrow: 190, flexBasis: 0 },
  key: {
    minHeight: 48,
    minWidth: 44,
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'center',
    borderWidth: 1,
    borderColor: color.edge,
    borderRadius: radius.control,
    flexBasis: 0,
  },
  digit: { backgroundColor: color.paper, flexGrow: 82 },
  fn: { backgroundColor: color.line, flexGrow: 102 },
  narrow: { flexGrow: 82 },
  pressed: { backgroundColor: color.chalk, borderColor: color.chalk },
  nudge: { flexDirection: 'row', alignItems: 'center', gap: 8 },
  next: { backgroundColor: color.chalk, borderColor: color.chalk, gap: 14, paddingHorizontal: 12 },
});
