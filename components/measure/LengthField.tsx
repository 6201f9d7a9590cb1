import type { DisplayStep } from '@/geometry/tape/format-length';
import { formatLength } from '@/geometry/tape/format-length';
import { parseLength, parseSignedLength } from '@/geometry/tape/parse-length';
import { TypedField, type TypedValue } from '../ui/TypedField';

export interface LengthFieldProps {
  readonly label: string;
  /** Inches; null shows an empty field. */
  readonly value: number | null;
  readonly step: DisplayStep;
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
  const read = (text: string): TypedValue<number> => {
    const parsed = (signed ? parseSignedLength : parseLength)(text, step.endsWith('mm') ? 'mm' : 'in');
    const why = parsed.ok ? (check?.(parsed.value) ?? null) : null;
    return why === null ? parsed : { ok: false, message: why };
  };
  return (
    <TypedField
      label={label}
      value={value}
      hint={hint}
      disabled={disabled}
      write={(inches) => formatLength(inches, step)}
      read={read}
      onValue={onLength}
    />
  );
}
