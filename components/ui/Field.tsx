import { useId, useState, type ReactNode, type Ref } from 'react';
import { StyleSheet, TextInput, View, type TextInputProps } from 'react-native';

import { Icon } from './Icon';
import type { IconName } from './icon-shapes';
import { Text } from './Text';
import { color, fontStack, font, radius, space } from './tokens';

export interface FieldShellProps {
  readonly label: string;
  /** Stays under the field. */
  readonly hint?: string;
  /** A sentence: what is wrong and what would be right. What was typed is kept. */
  readonly error?: string;
  /** The label is read out but not shown (search boxes). */
  readonly labelHidden?: boolean;
}

/** Ids that tie a label, a hint and an error sentence to a control. */
export interface FieldIds {
  readonly control: string;
  readonly label: string;
  /** For aria-describedby; undefined when there is neither hint nor error. */
  readonly describedBy: string | undefined;
}

/** Label above, hint and error below, tied to whatever control `children` draws with the ids. */
export function FieldShell(props: FieldShellProps & { readonly children: (ids: FieldIds) => ReactNode }) {
  const id = useId();
  const hintId = `${id}-hint`;
  const errorId = `${id}-error`;
  const describedBy = [props.error && errorId, props.hint && hintId].filter(Boolean).join(' ') || undefined;
  return (
    <View style={styles.shell}>
      {!props.labelHidden && (
        <View style={styles.label}>
          <Text kind="label" id={`${id}-label`}>
            {props.label}
          </Text>
        </View>
      )}
      {props.children({ control: id, label: `${id}-label`, describedBy })}
      {/* Kept in the page while empty, so that a screen reader hears the sentence when it comes. */}
      <View aria-live="polite" id={errorId}>
        {props.error && (
          <View style={[styles.under, styles.error]}>
            <Icon name="warn" tone="red" size={18} />
            <View style={styles.grow}>
              <Text kind="second" tone="red">
                {props.error}
              </Text>
            </View>
          </View>
        )}
      </View>
      {props.hint && (
        <View style={styles.under}>
          <Text kind="second" id={hintId}>
            {props.hint}
          </Text>
        </View>
      )}
    </View>
  );
}

export interface FieldProps extends FieldShellProps {
  readonly value: string;
  readonly onChange: (next: string) => void;
  readonly onBlur?: () => void;
  /** Enter was pressed. */
  readonly onSubmit?: () => void;
  readonly kind?: 'text' | 'email' | 'password' | 'number' | 'decimal' | 'phone' | 'search';
  /** What the browser may fill in: 'email', 'current-password', 'name', 'street-address' and so on. */
  readonly autoComplete?: TextInputProps['autoComplete'];
  readonly placeholder?: string;
  /** More than one line; grows with what is typed. */
  readonly rowCount?: number;
  readonly required?: boolean;
  readonly disabled?: boolean;
  readonly icon?: IconName;
  /** Something at the right end: a unit, a key hint, a clear button. */
  readonly after?: ReactNode;
  readonly maxLength?: number;
  readonly autoFocus?: boolean;
  readonly inputRef?: Ref<TextInput>;
  readonly testID?: string;
}

/** One line or a few lines of text. It never changes what was typed. */
export function Field(props: FieldProps) {
  const [focused, setFocused] = useState(false);
  const { kind = 'text', rowCount = 1 } = props;
  return (
    <FieldShell label={props.label} hint={props.hint} error={props.error} labelHidden={props.labelHidden}>
      {(ids) => (
        <View
          style={[
            styles.box,
            focused && styles.focused,
            props.error ? styles.wrong : null,
            props.disabled && styles.off,
          ]}
        >
          {props.icon && <Icon name={props.icon} size={20} tone="ink2" />}
          <TextInput
            ref={props.inputRef}
            id={ids.control}
            testID={props.testID}
            value={props.value}
            onChangeText={props.onChange}
            onFocus={() => setFocused(true)}
            onBlur={() => {
              setFocused(false);
              props.onBlur?.();
            }}
            onSubmitEditing={props.onSubmit}
            aria-label={props.label}
            aria-describedby={ids.describedBy}
            aria-invalid={props.error ? true : undefined}
            aria-required={props.required || undefined}
            readOnly={props.disabled}
            aria-disabled={props.disabled || undefined}
            {...inputKinds[kind]}
            autoComplete={props.autoComplete}
            autoFocus={props.autoFocus}
            placeholder={props.placeholder}
            multiline={rowCount > 1}
            rows={rowCount}
            maxLength={props.maxLength}
            dataSet={{ ring: 'none' }}
            style={[styles.input, rowCount > 1 && styles.tall]}
          />
          {props.after}
        </View>
      )}
    </FieldShell>
  );
}

const inputKinds: Readonly<Record<NonNullable<FieldProps['kind']>, TextInputProps>> = {
  text: {},
  email: { inputMode: 'email', autoCapitalize: 'none' },
  password: { secureTextEntry: true, autoCapitalize: 'none' },
  number: { inputMode: 'numeric' },
  decimal: { inputMode: 'decimal' },
  phone: { inputMode: 'tel' },
  search: { inputMode: 'search', enterKeyHint: 'search' },
};

const styles = StyleSheet.create({
  shell: {},
  label: { marginBottom: 6 },
  under: { marginTop: 6 },
  grow: { flex: 1 },
  error: { flexDirection: 'row', gap: space.s, alignItems: 'flex-start' },
  box: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.s,
    minHeight: 52,
    paddingHorizontal: space.m,
    borderWidth: 1.5,
    borderColor: color.edge,
    borderRadius: radius.control,
    backgroundColor: color.card,
  },
  focused: { borderColor: color.chalk, boxShadow: `0 0 0 1.5px ${color.chalk}` },
  wrong: { borderColor: color.red },
  off: { borderStyle: 'dashed', backgroundColor: 'transparent' },
  input: {
    flex: 1,
    minWidth: 0,
    // As high as the box, so that a finger anywhere in it hits the field.
    minHeight: 49,
    paddingVertical: space.s,
    fontFamily: fontStack(font.body400),
    fontSize: 17,
    color: color.ink,
    backgroundColor: 'transparent',
    borderWidth: 0,
  },
  tall: { minHeight: 96 },
});
