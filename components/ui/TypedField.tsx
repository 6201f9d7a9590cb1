import { useEffect, useRef, useState } from 'react';

import { Field, type FieldProps } from './Field';

export type TypedValue<T> = { readonly ok: true; readonly value: T } | { readonly ok: false; readonly message: string };

export interface TypedFieldProps<T> extends Pick<FieldProps, 'label' | 'hint' | 'disabled' | 'after' | 'labelHidden'> {
  /** null shows an empty field. */
  readonly value: T | null;
  readonly write: (value: T) => string;
  readonly read: (text: string) => TypedValue<T>;
  readonly kind?: 'text' | 'decimal' | 'number';
  readonly maxLength?: number;
  /** A value that reads and is another than before, when the field is left or Enter is pressed. */
  readonly onValue: (value: T) => void;
}

/** A value typed as text: what was typed stays, with a sentence under it while it is none. */
export function TypedField<T>(props: TypedFieldProps<T>) {
  const { value, write, read, onValue } = props;
  const written = value === null ? '' : write(value);
  const [text, setText] = useState(written);
  const [error, setError] = useState<string | undefined>();
  const touched = useRef(false);
  // Somebody else changed it, or undo did: follow, unless something is being typed here.
  useEffect(() => {
    if (!touched.current) setText(written);
  }, [written]);
  const commit = () => {
    if (!touched.current) return;
    const typed = read(text);
    setError(typed.ok ? undefined : typed.message);
    if (!typed.ok) return;
    touched.current = false;
    setText(write(typed.value));
    if (value === null || write(typed.value) !== written) onValue(typed.value);
  };
  return (
    <Field
      label={props.label}
      labelHidden={props.labelHidden}
      value={text}
      hint={props.hint}
      error={error}
      disabled={props.disabled}
      after={props.after}
      kind={props.kind ?? 'text'}
      autoComplete="off"
      maxLength={props.maxLength ?? 24}
      onChange={(next) => {
        touched.current = true;
        setText(next);
      }}
      onBlur={commit}
      onSubmit={commit}
    />
  );
}
