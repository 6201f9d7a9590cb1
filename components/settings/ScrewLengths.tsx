import { TypedField, type TypedValue } from '../ui/TypedField';
import { readSetting, writeSetting } from './setting-text';

export interface ScrewLengthsProps {
  /** Inches. */
  readonly lengths: readonly number[];
  readonly metric: boolean;
  readonly disabled: boolean;
  readonly onLengths: (lengths: readonly number[]) => void;
}

/** The screws on the shelf: plans take the longest of these that leaves enough wood above its point. */
export function ScrewLengths({ lengths, metric, disabled, onLengths }: ScrewLengthsProps) {
  return (
    <TypedField
      label="Lengths on the shelf"
      hint="With commas between them. The longest that leaves enough wood above its point is taken."
      value={lengths}
      write={(list) => list.map((length) => writeSetting(length, 'length', metric)).join(', ')}
      read={(text) => readLengths(text, metric)}
      maxLength={400}
      disabled={disabled}
      onValue={onLengths}
    />
  );
}

/** Shortest first, each once; the sentence names the one that is none. */
export function readLengths(text: string, metric: boolean): TypedValue<readonly number[]> {
  const found: number[] = [];
  for (const part of text
    .split(/[,;]/)
    .map((one) => one.trim())
    .filter(Boolean)) {
    // prettier-ignore
    const read = readSetting(part, 'length', metric);
    if (!read.ok) return { ok: false, message: `"${part}": ${read.message}` };
    if (read.value === 0) return { ok: false, message: `"${part}": a screw has some length.` };
    found.push(read.value);
  }
  if (found.length === 0) return { ok: false, message: 'At least one length has to stand here.' };
  if (found.length > 40) return { ok: false, message: 'No more than 40 lengths.' };
  return { ok: true, value: [...new Set(found)].sort((a, b) => a - b) };
}
