import { StyleSheet, View } from 'react-native';

import type { DatedStep } from '@/geometry/wood/dated-schedule';
import type { WorkStep } from '@/geometry/wood/arrange-work';
import type { WorkMark } from '@/shared/work/work-marks';
import { Card } from '../ui/Card';
import { Icon } from '../ui/Icon';
import { MoreMenu, type MenuItem } from '../ui/Menu';
import { PieceLetter } from '../ui/PieceLetter';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';
import { useWide } from '../ui/use-wide';
import { GlueClock } from './GlueClock';
import type { StepState } from './step-state';
import { TickButton, type TickButtonProps } from './TickButton';
import { firstName, hoursWords, plannedWords, whenWords } from './work-words';

export interface StepCardProps extends Omit<TickButtonProps, 'step'> {
  readonly step: WorkStep;
  readonly number: number;
  readonly mark: WorkMark | undefined;
  readonly dated: DatedStep | undefined;
  readonly menu: readonly MenuItem[];
}

/** One step of the order of work: what, with what, when, what to mind, and the button to tick it. */
export function StepCard({ step, number, mark, dated, menu, ...tick }: StepCardProps) {
  const wide = useWide();
  const { state } = tick;
  return (
    <View role="listitem" aria-label={`Step ${number}, ${step.step}, ${spokenState(state)}`}>
      <Card frame={state.kind === 'next' ? 'chalk' : 'plain'}>
        <View style={[styles.card, wide && styles.wide]}>
          <View style={[styles.words, wide && styles.grow]}>
            <View style={styles.head}>
              <View style={[styles.disc, state.kind === 'done' && styles.discDone]}>
                <Text kind="labelLarge" tone={state.kind === 'done' ? 'paper' : 'ink'}>
                  {String(number)}
                </Text>
              </View>
              <View style={styles.grow}>
                <Text kind="rowTitle" level={3}>
                  {step.step}
                </Text>
              </View>
              {menu.length > 0 && <MoreMenu label={`More for ${step.step}`} items={menu} />}
            </View>
            <StepFacts step={step} mark={mark} dated={dated} />
          </View>
          <View style={[styles.button, wide && styles.side]}>
            <TickButton {...tick} step={step.step} />
          </View>
        </View>
      </Card>
    </View>
  );
}

function StepFacts({ step, mark, dated }: Pick<StepCardProps, 'step' | 'mark' | 'dated'>) {
  const with_ = [...step.tools, ...step.consumables].join(', ');
  return (
    <>
      {step.pieces.length > 0 && (
        <View style={styles.letters}>
          {step.pieces.map((letter) => (
            <PieceLetter key={letter} letter={letter} size={26} />
          ))}
        </View>
      )}
      {with_ !== '' && <Text kind="second">{capital(with_)}.</Text>}
      <Text kind="second">{timeWords(step, mark, dated)}</Text>
      {step.skipped !== null && <Text kind="strong">Left out: {step.skipped}</Text>}
      {step.caution && !mark?.doneAt && step.skipped === null && (
        <View style={styles.caution}>
          <Icon name="look" tone="red" size={20} />
          <View style={styles.grow}>
            <Text kind="second" tone="ink">
              {step.caution}
            </Text>
          </View>
        </View>
      )}
      {step.clock && mark && <GlueClock clock={step.clock} mark={mark} />}
    </>
  );
}

function timeWords(step: WorkStep, mark: WorkMark | undefined, dated: DatedStep | undefined): string {
  if (mark?.doneAt) return `Done ${whenWords(mark.doneAt)} by ${firstName(mark.doneBy ?? '')}`;
  const wait = step.waitHours > 0 ? `, then ${hoursWords(step.waitHours)} to wait` : '';
  const work = `About ${hoursWords(step.hours)}${wait}`;
  const begun = mark?.startedAt ? ` Begun ${whenWords(mark.startedAt)} by ${firstName(mark.startedBy ?? '')}.` : '';
  return dated ? `${plannedWords(dated.starts, dated.startsAt)}. ${work}.${begun}` : `${work}.${begun}`;
}

const spokenState = (state: StepState): string =>
  ({ done: 'done', skipped: 'left out', next: 'next', curing: 'waits for glue or finish', waits: 'not yet' })[
    state.kind
  ];

const capital = (text: string): string => `${text.charAt(0).toUpperCase()}${text.slice(1)}`;

const styles = StyleSheet.create({
  card: { gap: space.m },
  wide: { flexDirection: 'row', alignItems: 'center', gap: space.xl },
  words: { gap: space.s, minWidth: 0 },
  grow: { flex: 1, minWidth: 0 },
  head: { flexDirection: 'row', alignItems: 'center', gap: space.m },
  disc: {
    width: 40,
    height: 40,
    borderRadius: 20,
    borderWidth: 2,
    borderColor: color.ink,
    alignItems: 'center',
    justifyContent: 'center',
  },
  discDone: { backgroundColor: color.ink },
  letters: { flexDirection: 'row', flexWrap: 'wrap', gap: space.xs },
  caution: { flexDirection: 'row', gap: space.s, alignItems: 'flex-start' },
  button: { alignSelf: 'stretch' },
  side: { width: 300, justifyContent: 'center' },
});
