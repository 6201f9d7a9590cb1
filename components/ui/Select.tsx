import { useState, type CSSProperties } from 'react';
import { StyleSheet, View } from 'react-native';

import { FieldShell, type FieldShellProps } from './Field';
import { Icon } from './Icon';
import type { Choice } from './Segmented';
import { color, font, fontStack, radius } from './tokens';

export interface SelectProps<T extends string> extends FieldShellProps {
  readonly options: readonly Choice<T>[];
  readonly value: T | null;
  readonly onChange: (next: T) => void;
  /** Shown while nothing is chosen. */
  readonly placeholder?: string;
  readonly disabled?: boolean;
}

/** One of many: the device's own list, which every phone and screen reader knows. */
export function Select<T extends string>(props: SelectProps<T>) {
  const { options, value, onChange, placeholder = 'Choose', disabled } = props;
  const [focused, setFocused] = useState(false);
  return (
    <FieldShell label={props.label} hint={props.hint} error={props.error} labelHidden={props.labelHidden}>
      {(ids) => (
        <View
          style={[styles.box, focused && styles.focused, props.error ? styles.wrong : null, disabled && styles.off]}
        >
          <select
            id={ids.control}
            aria-label={props.label}
            aria-describedby={ids.describedBy}
            aria-invalid={props.error ? true : undefined}
            disabled={disabled}
            value={value ?? ''}
            onFocus={() => setFocused(true)}
            onBlur={() => setFocused(false)}
            onChange={(event) => onChange(event.target.value as T)}
            data-ring="none"
            style={selectStyle}
          >
            {value === null && (
              <option value="" disabled>
                {placeholder}
              </option>
            )}
            {options.map((option) => (
              <option key={option.value} value={option.value} disabled={option.disabled}>
                {option.label}
              </option>
            ))}
          </select>
          <View style={styles.arrow} aria-hidden>
            <Icon name="down" size={20} />
          </View>
        </View>
      )}
    </FieldShell>
  );
}

export interface DateFieldProps extends FieldShellProps {
  /** 2026-03-18, or '' for none. */
  readonly value: string;
  readonly onChange: (next: string) => void;
  readonly disabled?: boolean;
}

/** A day, by the device's own calendar. */
export function DateField({ value, onChange, disabled, ...shell }: DateFieldProps) {
  const [focused, setFocused] = useState(false);
  return (
    <FieldShell {...shell}>
      {(ids) => (
        <View
          style={[styles.box, focused && styles.focused, shell.error ? styles.wrong : null, disabled && styles.off]}
        >
          <input
            type="date"
            id={ids.control}
            aria-label={shell.label}
            aria-describedby={ids.describedBy}
            aria-invalid={shell.error ? true : undefined}
            disabled={disabled}
            value={value}
            onFocus={() => setFocused(true)}
            onBlur={() => setFocused(false)}
            onChange={(event) => onChange(event.target.value)}
            data-ring="none"
            style={inputStyle}
          />
        </View>
      )}
    </FieldShell>
  );
}

const inputStyle: CSSProperties = {
  width: '100%',
  minHeight: 49,
  padding: '0 12px',
  border: 0,
  margin: 0,
  boxSizing: 'border-box',
  background: 'transparent',
  color: color.ink,
  fontFamily: fontStack(font.body400),
  fontSize: 17,
};

const selectStyle: CSSProperties = {
  ...inputStyle,
  appearance: 'none',
  paddingRight: 44,
  textOverflow: 'ellipsis',
  cursor: 'pointer',
};

const styles = StyleSheet.create({
  box: {
    minHeight: 52,
    justifyContent: 'center',
    borderWidth: 1.5,
    borderColor: color.edge,
    borderRadius: radius.control,
    backgroundColor: color.card,
  },
  focused: { borderColor: color.chalk, boxShadow: `0 0 0 1.5px ${color.chalk}` },
  wrong: { borderColor: color.red },
  off: { borderStyle: 'dashed', backgroundColor: 'transparent' },
  arrow: { position: 'absolute', right: 12, pointerEvents: 'none' },
});
