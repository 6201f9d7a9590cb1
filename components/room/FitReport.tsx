import { StyleSheet, View } from 'react-native';

import type { NextMeasurement, RoomFit } from '@/geometry/room/types';
import { inches } from '@/geometry/top/sentence';
import { useOpenJob } from '../editor/JobProvider';
import { Button } from '../ui/Button';
import { Icon } from '../ui/Icon';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';
import { fitWords, type FitWords } from './fit-words';
import { FractionText } from './FractionText';
import { RetakeCard } from './RetakeCard';
import { RoomActs, SiteLevel } from './SiteLevel';
import type { RoomTools } from './use-room-tools';
import { ReadingRow } from './ReadingRow';
import type { RoomView } from './use-room-view';
import { observationOf, targetName, walkOf, type Target } from './tape-walk';

const LOOK: Readonly<Record<FitWords['mood'], { icon: 'check' | 'warn' | 'look' | 'retake' | 'tape'; red: boolean }>> =
  {
    empty: { icon: 'tape', red: false },
    missing: { icon: 'tape', red: false },
    right: { icon: 'check', red: false },
    bare: { icon: 'look', red: false },
    retake: { icon: 'retake', red: true },
    unsure: { icon: 'look', red: true },
    broken: { icon: 'warn', red: true },
  };

/** The fact on top: closes, re-take, still missing. Read out when it changes. */
export function FitHead({ view, boxed = false }: { readonly view: RoomView; readonly boxed?: boolean }) {
  const { layout } = useOpenJob();
  const words = fitWords(layout, view.room);
  const look = LOOK[words.mood];
  return (
    <View
      style={[styles.head, boxed && [styles.box, look.red && styles.boxRed]]}
      aria-live="polite"
      testID="fit-report"
    >
      {boxed ? (
        <Icon name={look.icon} tone={look.red ? 'red' : 'chalk'} size={28} />
      ) : (
        <View style={[styles.square, look.red && styles.squareRed]}>
          <Icon name={look.icon} tone="onchalk" size={28} />
        </View>
      )}
      <View style={styles.grow}>
        <FractionText kind="sheetTitle" level={2} tone={look.red ? 'red' : 'ink'} number={20} bold>
          {words.fact}
        </FractionText>
        <FractionText kind="second" tone="ink" number={17}>
          {words.detail}
        </FractionText>
      </View>
    </View>
  );
}

/** The whole report: the fact, what to measure next and why, and every reading. */
export function FitReport({ view, tools }: { readonly view: RoomView; readonly tools: RoomTools }) {
  const { layout, plan, mayEdit } = useOpenJob();
  const { room } = view;
  const words = fitWords(layout, room);
  const retakes = new Set(room.fit?.suspects.filter((s) => s.orElse.length === 0).map((s) => s.observation));
  const next = room.fit?.next ?? null;
  return (
    <View style={styles.report}>
      <FitHead view={view} />
      {words.mood === 'retake' && room.fit?.suspects[0] && <RetakeCard view={view} suspect={room.fit.suspects[0]} />}
      {words.target && mayEdit && words.mood !== 'retake' && (
        <Button
          label={`${words.target.kind === 'corner' ? 'Check' : 'Tape'} ${lower(targetName(layout, words.target))}`}
          look="primary"
          icon="tape"
          wide
          onPress={() => view.open(words.target!)}
        />
      )}
      {next && (
        <View style={styles.next}>
          <Text kind="label">Next</Text>
          <Text kind="second" tone="ink">
            {next.why}
          </Text>
          {mayEdit && (
            <Button
              label={next.kind === 'tie' ? 'Tape this cross' : 'Check this corner'}
              icon="tape"
              wide
              onPress={() => view.open(toTarget(next))}
            />
          )}
        </View>
      )}
      <View role="list" aria-label="Readings">
        {walkOf(layout, next).map((target: Target) => (
          <ReadingRow
            key={observationOf(target)}
            plan={plan}
            layout={layout}
            target={target}
            retake={retakes.has(observationOf(target))}
            onPress={() => view.open(target)}
          />
        ))}
      </View>
      {room.fit && <JointUncertainty fit={room.fit} />}
      {mayEdit && (
        <RoomActs onDraw={() => tools.take({ kind: 'draw' })} onCross={() => tools.take({ kind: 'cross' })} />
      )}
      <SiteLevel />
    </View>
  );
}

/** What a corner's uncertainty does at the end of its joint, where there is one. */
function JointUncertainty({ fit }: { readonly fit: RoomFit }) {
  const { plan, layout } = useOpenJob();
  if (plan.joints.length === 0) return null;
  const loosest = plan.joints.reduce((worst, joint) => (joint.openingPerSd > worst.openingPerSd ? joint : worst));
  const corner = fit.corners.find((c) => Math.abs(c.angleDeg - loosest.corner) < 1e-9);
  if (!corner) return null;
  const fine = layout.step.endsWith('mm') ? '0.5 mm' : '1/32';
  return (
    <Text kind="small">
      {`The loosest corner is known to ${corner.sdDeg.toFixed(2)} degrees: ${inches(loosest.openingPerSd, fine)} at the end of joint ${loosest.letters.join(' to ')}.`}
    </Text>
  );
}

const toTarget = (next: NextMeasurement): Target =>
  next.kind === 'tie'
    ? { kind: 'tie', id: null, from: next.from, to: next.to }
    : { kind: 'corner', between: next.between };

const lower = (text: string): string => text[0]!.toLowerCase() + text.slice(1);

const styles = StyleSheet.create({
  report: { gap: space.m },
  head: { flexDirection: 'row', gap: space.m, alignItems: 'center' },
  square: { width: 48, height: 48, alignItems: 'center', justifyContent: 'center', backgroundColor: color.chalk },
  squareRed: { backgroundColor: color.red },
  box: { borderWidth: 1.5, borderColor: color.chalk, padding: space.m },
  boxRed: { borderColor: color.red },
  grow: { flex: 1, minWidth: 0 },
  next: {
    padding: space.m,
    borderLeftWidth: 4,
    borderLeftColor: color.chalk,
    backgroundColor: color.chalkT,
    gap: space.s,
  },
});
