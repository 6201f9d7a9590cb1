import { useEffect, useRef, useState } from 'react';

import type { Step } from '@/geometry/core/layout';
import { formatLength } from '@/geometry/tape/format-length';
import { parseLength, parseSignedLength } from '@/geometry/tape/parse-length';
import { Field } from '../ui/Field';

export interface LengthFieldProps {
  readonly label: string;
  /** Inches; null shows an empty field. */
  readonly value: number | null;
  readonly step: Step;
  /** Takes a leading minus: an overhang that is a gap. */
  readonly signed?: boolean;
  readonly hint?: string;
  /** Says why a length cannot be, or null. */
  readonly check?: (inches: number) => string | null;
  /** A length that reads and passes the check, when the field is left or Enter is pressed. */
  readonly onLength: (inches: number) => void;
  readonly disabled?: boolean;
}

/** A typed length: what was typed stays, with a sentence under it while it is none. */
export function LengthField({ label, value, step, signed, hint, check, onLength, disabled }: LengthFieldProps) {
  const written = value === null ? '' : formatLength(value, step);
  const [text, setText] = useState(written);
  const [error, setError] = useState<string | undefined>();
  const touched = useRef(false);
  // Somebody else changed it, or undo did: follow, unless something is being typed here.
  useEffect(() => {
    if (!touched.current) setText(written);
  }, [written]);
  const commit = () => {
    if (!touched.current) return;
    const parsed = (signed ? parseSignedLength : parseLength)(text, step.endsWith('mm') ? 'mm' : 'in');
    const why = parsed.ok ? (check?.(parsed.value) ?? null) : parsed.message;
    setError(why ?? undefined);
    if (!parsed.ok || why !== null) return;
    touched.current = false;
    setText(formatLength(parsed.value, step));
    if (parsed.value !== value) onLength(parsed.value);
  };
  return (
    <Field
      label={label}
      value={text}
      hint={hint}
      error={error}
      disabled={disabled}
      kind="text"
      autoComplete="off"
      maxLength={24}
      onChange={(next) => {
        touched.current = true;
        setText(next);
      }}
      onBlur={commit}
      onSubmit={commit}
    />
  );
}
