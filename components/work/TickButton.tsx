import { StyleSheet, View } from 'react-native';

import { TickBox } from '../ui/Checkbox';
import { Icon } from '../ui/Icon';
import { Press } from '../ui/Press';
import { Text } from '../ui/Text';
import { color, radius, space, target } from '../ui/tokens';
import type { StepState } from './step-state';
import { whenWords } from './work-words';

/** ms, as everywhere on the drawings. */
const LONG_PRESS_MS = 500;

export interface TickButtonProps {
  readonly state: StepState;
  /** Words of the step, for whoever hears the button and does not see where it stands. */
  readonly step: string;
  readonly mayTick: boolean;
  readonly onTick: () => void;
  readonly onUndo: () => void;
}

/** The one big button of a step, for a thumb in a glove: tick, ticked, or why not yet. */
export function TickButton({ state, step, mayTick, onTick, onUndo }: TickButtonProps) {
  if (state.kind === 'next')
    return (
      <Press
        disabled={!mayTick}
        onPress={onTick}
        aria-label={`Tick when done: ${step}`}
        hoverGround={color.chalkDeep}
        style={[styles.button, mayTick ? styles.next : styles.closed]}
      >
        <View style={styles.box} aria-hidden />
        <Text kind="strong" size={20} tone={mayTick ? 'onchalk' : 'ink2'}>
          Tick when done
        </Text>
      </Press>
    );
  if (state.kind === 'done')
    return (
      <Press
        disabled={!mayTick}
        onLongPress={onUndo}
        delayLongPress={LONG_PRESS_MS}
        aria-label={`Done: ${step}. Hold to undo`}
        style={[styles.button, styles.done]}
      >
        <Icon name="check" size={28} />
        <Text kind="strong" size={20}>
          {mayTick ? 'Done. Hold to undo' : 'Done'}
        </Text>
      </Press>
    );
  return (
    <View style={[styles.button, styles.closed]}>
      {state.kind === 'skipped' ? <TickBox checked={false} /> : <Icon name="clock" tone="ink2" />}
      <View style={styles.words}>
        <Text kind="strong" size={18} tone="ink2" align="center">
          {closedWords(state)}
        </Text>
      </View>
    </View>
  );
}

function closedWords(state: Exclude<StepState, { kind: 'next' | 'done' }>): string {
  if (state.kind === 'skipped') return 'Left out';
  if (state.kind === 'waits') return `After: ${state.behind.step}`;
  return `Ready ${whenWords(state.until)}`;
}

const styles = StyleSheet.create({
  button: {
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'center',
    gap: space.m,
    minHeight: target.atTheSaw,
    paddingHorizontal: space.l,
    borderWidth: 1.5,
    borderRadius: radius.control,
    borderColor: color.ink,
  },
  next: { backgroundColor: color.chalk, borderColor: color.chalk },
  done: { backgroundColor: color.card },
  closed: { borderStyle: 'dashed', borderColor: color.edge },
  box: { width: 30, height: 30, borderWidth: 3, borderColor: color.onchalk },
  words: { flexShrink: 1 },
});
