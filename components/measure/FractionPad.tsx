import { useEffect, useRef, useState, type KeyboardEvent, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { spokenLength } from '@/geometry/tape/format-length';
import type { IconName } from '../ui/icon-shapes';
import { useLeftHandPad, usePadUnit } from '../ui/preferences';
import { HiddenText, Text } from '../ui/Text';

import { Fraction, FractionParts } from './Fraction';
import { InchRuler } from './InchRuler';
import { padKeyOf } from './pad-keyboard';
import {
  emptyPad,
  litMark,
  padParts,
  padWith,
  pressPad,
  readPad,
  type PadKey,
  type PadReading,
  type PadState,
} from './pad-state';
import { PadKeys } from './PadKeys';
import { TapeBlade } from './TapeBlade';

export interface PadLength {
  /** As typed on a tape: `8' 4 3/16"`, `100 3/16`, `2545 mm`. `parseLength` reads the value back from it. */
  readonly text: string;
  /** Inches. */
  readonly value: number;
}

export interface FractionPadProps {
  /** What is measured: "Wall B". */
  readonly title: string;
  /** How: "corner to corner". Dropped first where room is short. */
  readonly hint?: string;
  /** Where Next goes: "Wall C" with 'next', "Done" with 'check'. */
  readonly next: { readonly label: string; readonly icon: IconName };
  readonly onNext: (length: PadLength) => void;
  /** Escape, or the sheet was closed. */
  readonly onCancel: () => void;
  /** Says why a length cannot be, or null; checked at Next. */
  readonly check?: (inches: number) => string | null;
  /** Replaces the converted length at the right of the title, for instance the angle a reading would give. */
  readonly aside?: (inches: number | null) => ReactNode;
  /** Starts from a length already taped, in the text and the unit it was typed in. */
  readonly start?: string;
  /** A key that was typed to open the pad; it counts as the first. */
  readonly firstKey?: string;
  /** Takes the keyboard when it opens; on when left out. */
  readonly autoFocus?: boolean;
}

/**
 * The pad that lengths are typed on; content for a Sheet or an Inspector. Give it a `key` that changes with what is
 * measured, so that Next starts it afresh. Units and the left-hand layout are remembered for the person.
 */
export function FractionPad(props: FractionPadProps) {
  const { title, hint, next, onNext, onCancel, check, aside, autoFocus = true } = props;
  const [unit, rememberUnit] = usePadUnit();
  const [leftHanded] = useLeftHandPad();
  const [state, setState] = useState<PadState>(() => startingState(props, unit));
  const [refusal, setRefusal] = useState<string | null>(null);
  const root = useRef<View>(null);
  const reading = readPad(state);
  const value = reading.kind === 'length' ? reading.value : null;

  useEffect(() => {
    if (autoFocus) (root.current as unknown as HTMLElement | null)?.focus({ preventScroll: true });
  }, [autoFocus]);

  const press = (key: PadKey) => {
    setRefusal(null);
    setState((now) => pressPad(now, key));
    if (key.kind === 'unit') rememberUnit(key.to);
  };
  const finish = () => {
    const why = refuse(reading, check);
    if (why !== null) setRefusal(why);
    else if (reading.kind === 'length') onNext({ text: reading.text, value: reading.value });
  };
  const onKeyDown = (event: KeyboardEvent<HTMLElement>) => {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    // A key reached by Tab is pressed by Enter and space like any button.
    const onButton = event.target !== event.currentTarget;
    if (onButton && (event.key === 'Enter' || event.key === ' ')) return;
    const key = padKeyOf(event.key, state.unit);
    if (key === null) return;
    event.preventDefault();
    event.stopPropagation();
    if (key === 'next') finish();
    else if (key === 'cancel') onCancel();
    else press(key);
  };

  return (
    <View
      ref={root}
      role="group"
      aria-label={`Length of ${title}`}
      tabIndex={-1}
      dataSet={{ ring: 'none' }}
      onKeyDown={onKeyDown}
      style={styles.pad}
    >
      <View style={styles.head}>
        <View style={styles.names}>
          <Text kind="sheetTitle" level={2} lines={1}>
            {title}
          </Text>
          {hint && (
            <View style={styles.hint}>
              <Text kind="second" size={16} lines={1}>
                {hint}
              </Text>
            </View>
          )}
        </View>
        <View style={styles.aside}>{aside ? aside(value) : <Converted state={state} value={value} />}</View>
      </View>
      <View style={styles.blade}>
        <TapeBlade inches={value} state="typing" height={52}>
          <View style={styles.live}>
            <FractionParts {...padParts(state)} size={31} tone="tapeInk" bold />
            <View style={styles.caret} />
          </View>
        </TapeBlade>
        <View aria-live="assertive">
          {refusal !== null && (
            <View style={styles.refusal}>
              <Text kind="second" tone="red">
                {refusal}
              </Text>
            </View>
          )}
        </View>
      </View>
      <HiddenText live="polite">{spokenPad(state, value)}</HiddenText>
      {state.unit === 'in' && (
        <InchRuler lit={litMark(state.inches)} onMark={(sixteenths) => press({ kind: 'mark', sixteenths })} />
      )}
      <PadKeys
        unit={state.unit}
        nudge={state.inches.nudge}
        onKey={press}
        onNext={finish}
        next={next}
        leftHanded={leftHanded}
      />
    </View>
  );
}

function startingState({ start, firstKey }: FractionPadProps, unit: 'in' | 'mm'): PadState {
  const state = start === undefined ? emptyPad(unit) : padWith(start);
  const key = firstKey === undefined ? null : padKeyOf(firstKey, state.unit);
  return key === null || key === 'next' || key === 'cancel' ? state : pressPad(state, key);
}

/** Why Next cannot go on, or null. */
function refuse(reading: PadReading, check: FractionPadProps['check']): string | null {
  if (reading.kind === 'empty') return 'Nothing is typed here. Type the length first.';
  if (reading.kind === 'unfinished') return reading.message;
  return check?.(reading.value) ?? null;
}

/** The same length the other way: inches for feet and for millimeters. */
function Converted({ state, value }: { readonly state: PadState; readonly value: number | null }) {
  const shown = value !== null && (state.unit === 'mm' || state.inches.feet !== null);
  if (!shown) return null;
  return (
    <View style={styles.converted}>
      <Text kind="second" size={17}>
        {state.unit === 'mm' ? 'about' : '='}
      </Text>
      <Fraction inches={value} step={state.unit === 'mm' ? '1/16' : '1/64'} size={18} tone="ink2" silent />
    </View>
  );
}

function spokenPad(state: PadState, value: number | null): string {
  if (value === null) return '';
  if (state.unit === 'mm') return `${state.mm} millimeters, about ${spokenLength(value, '1/16')}`;
  return spokenLength(value, '1/64', { feet: state.inches.feet !== null });
}

const styles = StyleSheet.create({
  pad: { gap: 8, outlineWidth: 0 },
  head: { flexDirection: 'row', alignItems: 'baseline', justifyContent: 'space-between', gap: 8, minHeight: 30 },
  // One line high: what wraps to a second line is out of sight, and the hint wraps first.
  names: {
    flex: 1,
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'baseline',
    columnGap: 6,
    height: 28,
    overflow: 'hidden',
  },
  hint: { flexShrink: 0 },
  aside: { flexShrink: 0 },
  converted: { flexDirection: 'row', alignItems: 'center', gap: 8 },
  blade: { marginTop: -3, paddingTop: 3, paddingRight: 3, paddingBottom: 1 },
  refusal: { paddingTop: 8 },
  live: { flexDirection: 'row', alignItems: 'center', gap: 6 },
  caret: { width: 3, height: 30, backgroundColor: '#1A5AA8' },
});
