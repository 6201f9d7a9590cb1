import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { spokenLength, type DisplayStep } from '@/geometry/tape/format-length';
import { Icon } from '../ui/Icon';
import { Press } from '../ui/Press';
import { Text } from '../ui/Text';
import { color } from '../ui/tokens';
import { webStyle } from '../ui/web-style';

import { bladeTicks } from './blade-ticks';
import { Fraction } from './Fraction';

/** set: taped once. typing: the pad writes on it. retake: disagrees, the words stand beside it. empty: not taped. twice: two readings agree. */
export type BladeState = 'set' | 'typing' | 'retake' | 'empty' | 'twice';

export interface TapeBladeProps {
  /** null shows the empty box whatever the state. */
  readonly inches: number | null;
  readonly step?: DisplayStep;
  readonly feet?: boolean;
  readonly state?: BladeState;
  /** Whose length: "Wall B". Needed when it can be pressed; read out before the length. */
  readonly name?: string;
  /** Words in the empty box; "tap to type" when left out. */
  readonly emptyWords?: string;
  /** px, 44 or more; the number is half as high. */
  readonly height?: number;
  /** px; fills what it is given when left out. */
  readonly width?: number;
  /** A computed length that nobody can type has no hook. */
  readonly hook?: boolean;
  readonly onPress?: () => void;
  readonly testID?: string;
  /** What stands on the blade instead of the length (the pad's live text). */
  readonly children?: ReactNode;
}

/** A length on a strip of tape. Yellow says: this is a measurement. */
export function TapeBlade(props: TapeBladeProps) {
  const { inches, state = 'set', height = 44, onPress } = props;
  const empty = state === 'empty' || (inches === null && props.children === undefined);
  const body = empty ? <EmptyBox words={props.emptyWords} height={height} /> : <Strip {...props} height={height} />;
  const frame = [
    styles.frame,
    { height, minWidth: 0 },
    props.width === undefined ? styles.fill : { width: props.width },
  ];
  if (!onPress) {
    return (
      <View style={frame} testID={props.testID} aria-label={undefined}>
        {body}
      </View>
    );
  }
  return (
    <Press onPress={onPress} style={frame} testID={props.testID} aria-label={bladeWords(props, empty)}>
      {body}
    </Press>
  );
}

/** What a screen reader hears of a blade: whose it is, the length, and what is up with it. */
function bladeWords({ name, inches, step = '1/16', feet, state }: TapeBladeProps, empty: boolean): string {
  const length = empty || inches === null ? 'not taped' : spokenLength(inches, step, { feet });
  const note = state === 'retake' ? 're-take' : state === 'twice' ? 'taped twice' : undefined;
  return [name, length, note].filter(Boolean).join(', ');
}

function Strip({ inches, step = '1/16', feet, state = 'set', height = 44, hook = true, children }: TapeBladeProps) {
  const ring = state === 'typing' ? color.chalk : state === 'retake' ? color.red : undefined;
  return (
    <View style={styles.row}>
      {hook && <View style={[styles.hook, ring !== undefined && styles.hookOverRing]} />}
      <View
        style={[styles.strip, webStyle(bladeTicks(height, TICK_INK)), ring ? { boxShadow: `0 0 0 3px ${ring}` } : null]}
      >
        <View style={styles.value}>
          {children ??
            (inches !== null && (
              <Fraction inches={inches} step={step} feet={feet} size={height / 2} tone="tapeInk" bold />
            ))}
        </View>
        {state === 'twice' && (
          <View style={styles.tick}>
            <Icon name="check" tone="tapeInk" size={Math.max(14, height * 0.36)} />
          </View>
        )}
      </View>
    </View>
  );
}

function EmptyBox({ words = 'tap to type', height }: { readonly words?: string; readonly height: number }) {
  return (
    <View style={styles.empty}>
      <Text kind="strong" tone="ink2" size={Math.min(20, height * 0.4)} align="center" lines={1}>
        {words}
      </Text>
    </View>
  );
}

const TICK_INK = 'rgba(20, 32, 46, 0.72)';

const styles = StyleSheet.create({
  frame: { justifyContent: 'center' },
  fill: { alignSelf: 'stretch' },
  row: { flex: 1, flexDirection: 'row', alignItems: 'stretch' },
  hook: { width: 7, marginVertical: -3, borderRadius: 1.5, backgroundColor: color.hook, zIndex: 1 },
  hookOverRing: { marginVertical: -3 },
  strip: {
    flex: 1,
    minWidth: 0,
    alignItems: 'center',
    justifyContent: 'center',
    backgroundColor: color.tape,
    borderWidth: 1.5,
    borderLeftWidth: 0,
    borderColor: color.tapeInk,
    ...webStyle({ backgroundRepeat: 'repeat-x' }),
  },
  value: { paddingTop: 3, flexDirection: 'row', alignItems: 'center' },
  tick: { position: 'absolute', right: 6, bottom: 4 },
  empty: {
    flex: 1,
    alignItems: 'center',
    justifyContent: 'center',
    paddingHorizontal: 8,
    borderWidth: 1.5,
    borderStyle: 'dashed',
    borderColor: color.ink2,
    backgroundColor: color.card,
  },
});
