import { StyleSheet, View } from 'react-native';

import { spokenLength, splitLength, type DisplayStep, type LengthStyle } from '@/geometry/tape/format-length';
import { HiddenText, Text } from '../ui/Text';
import { color, type ColorName } from '../ui/tokens';
import { webStyle } from '../ui/web-style';

/** Size of numerator and denominator against the whole number, and the smallest that can still be read. */
const STACK_RATIO = 0.66;
const LEAST_PX = 11;
const UNIT_RATIO = 0.7;

export interface FractionProps {
  /** Any finite length. */
  readonly inches: number;
  /** What it is rounded to; 1/16 when left out. */
  readonly step?: DisplayStep;
  /** Feet and inches: 8 ft 4 3/16 in. */
  readonly feet?: boolean;
  /** px of the whole number; 16 when left out. */
  readonly size?: number;
  readonly tone?: ColorName;
  /** Bold numbers (blades, headings); regular in running text when left out. */
  readonly bold?: boolean;
  /** Shows "in", "mm"; on when left out. */
  readonly unit?: boolean;
  /** Nothing is read out; the words around it already say the length. */
  readonly silent?: boolean;
}

/**
 * A length with its fraction stacked, for blades, tables and running text (it may stand inside Text).
 * A screen reader hears the length in words instead.
 */
export function Fraction({ inches, step = '1/16', feet = false, unit = true, silent = false, ...look }: FractionProps) {
  const style: LengthStyle = { feet };
  const split = splitLength(inches, step, style);
  return (
    <View style={[styles.inline, split.whole === 0 && styles.alone]}>
      {!silent && <HiddenText>{spokenLength(inches, step, style)}</HiddenText>}
      <FractionParts
        {...look}
        negative={split.negative}
        feet={split.feet === undefined ? undefined : String(split.feet)}
        whole={split.whole === 0 && split.numerator > 0 ? undefined : String(split.whole)}
        numerator={split.numerator ? String(split.numerator) : undefined}
        denominator={split.numerator ? String(split.denominator) : undefined}
        unit={unit ? split.unit : undefined}
      />
    </View>
  );
}

export interface FractionPartsProps extends Pick<FractionProps, 'size' | 'tone' | 'bold'> {
  readonly negative?: boolean;
  readonly feet?: string;
  readonly whole?: string;
  readonly numerator?: string;
  /** May be empty while it is typed. */
  readonly denominator?: string;
  readonly unit?: string;
}

/** The drawn parts alone, hidden from screen readers: what a typed but unfinished length needs. */
export function FractionParts({ size = 16, tone = 'ink', bold = false, ...parts }: FractionPartsProps) {
  const kind = bold ? 'number' : 'body';
  const unitSize = Math.max(LEAST_PX, size * UNIT_RATIO);
  return (
    <View style={[styles.inline, { columnGap: size * 0.14 }]} aria-hidden>
      {parts.negative && <Digits text="−" {...{ kind, size, tone }} />}
      {parts.feet !== undefined && (
        <>
          <Digits text={parts.feet} {...{ kind, size, tone }} />
          <View style={{ marginRight: size * 0.16 }}>
            <Text kind="body" tone={tone} size={unitSize}>
              ft
            </Text>
          </View>
        </>
      )}
      {parts.whole !== undefined && <Digits text={parts.whole} {...{ kind, size, tone }} />}
      {parts.numerator !== undefined && (
        <Stack over={parts.numerator} under={parts.denominator ?? ''} {...{ kind, size, tone }} />
      )}
      {parts.unit !== undefined && (
        <View style={{ marginLeft: size * 0.08 }}>
          <Text kind="body" tone={tone} size={unitSize}>
            {parts.unit}
          </Text>
        </View>
      )}
    </View>
  );
}

interface Look {
  readonly kind: 'number' | 'body';
  readonly size: number;
  readonly tone: ColorName;
}

function Digits({ text, kind, size, tone }: Look & { readonly text: string }) {
  return (
    <Text kind={kind} size={size} tone={tone} tabular>
      {text}
    </Text>
  );
}

function Stack({ over, under, kind, size, tone }: Look & { readonly over: string; readonly under: string }) {
  const small = Math.max(LEAST_PX, size * STACK_RATIO);
  const tight = { lineHeight: Math.round(small * 1.02) };
  return (
    <View style={styles.stack}>
      <Text kind={kind} size={small} tone={tone} align="center" tabular style={tight}>
        {over}
      </Text>
      <View
        style={[styles.bar, { height: kind === 'number' ? Math.max(1.5, size / 16) : 1, backgroundColor: color[tone] }]}
      />
      <Text kind={kind} size={small} tone={tone} align="center" tabular style={tight}>
        {under || ' '}
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({
  inline: { flexDirection: 'row', alignItems: 'center', position: 'relative' },
  // A fraction without a whole number has no base line of its own in running text.
  alone: webStyle({ verticalAlign: 'middle', marginLeft: '0.08em' }),
  stack: { alignItems: 'center' },
  bar: { alignSelf: 'stretch', marginVertical: 1, minWidth: 10 },
});
