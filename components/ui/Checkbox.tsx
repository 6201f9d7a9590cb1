import { StyleSheet, View } from 'react-native';

import { Icon } from './Icon';
import { Press } from './Press';
import { Text } from './Text';
import { color, space, target } from './tokens';

export interface CheckboxProps {
  readonly label: string;
  readonly checked: boolean;
  readonly onChange: (next: boolean) => void;
  readonly hint?: string;
  readonly disabled?: boolean;
  /** px of the whole row, 44 or more; 84 at the saw. */
  readonly height?: number;
  readonly labelHidden?: boolean;
}

/** A box to tick with its words; the whole row can be pressed. */
export function Checkbox({
  label,
  checked,
  onChange,
  hint,
  disabled,
  height = target.least,
  labelHidden,
}: CheckboxProps) {
  const toggle = () => onChange(!checked);
  return (
    <Press
      role="checkbox"
      aria-checked={checked}
      aria-label={hint ? `${label}. ${hint}` : label}
      disabled={disabled}
      onPress={toggle}
      onKeyDown={(event) => {
        if (event.key !== ' ') return;
        event.preventDefault();
        if (!disabled) toggle();
      }}
      style={[styles.row, { minHeight: Math.max(height, target.least) }]}
    >
      <TickBox checked={checked} />
      {!labelHidden && (
        <View style={styles.words}>
          <Text kind="body" hidden>
            {label}
          </Text>
          {hint && (
            <Text kind="second" hidden>
              {hint}
            </Text>
          )}
        </View>
      )}
    </Press>
  );
}

/** The drawn box alone, for lists that only show what is done. */
export function TickBox({ checked, size = 22 }: { readonly checked: boolean; readonly size?: number }) {
  return (
    <View style={[styles.box, { width: size, height: size }]} aria-hidden>
      {checked && <Icon name="check" tone="chalk" size={size - 2} />}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'center', gap: space.m, minWidth: target.least },
  words: { flexShrink: 1 },
  box: {
    alignItems: 'center',
    justifyContent: 'center',
    borderWidth: 2,
    borderColor: color.ink,
    backgroundColor: color.card,
    flexShrink: 0,
  },
});
