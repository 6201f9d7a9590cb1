import { StyleSheet, View } from 'react-native';

import type { Layout } from '@/geometry/core/layout';
import type { Plan } from '@/geometry/plan/types';
import { CornerBadge } from '../measure/CornerBadge';
import { TapeBlade } from '../measure/TapeBlade';
import { Icon } from '../ui/Icon';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';
import { isTaken, observationOf, targetName, type Target } from './tape-walk';

export interface ReadingRowProps {
  readonly plan: Plan;
  readonly layout: Layout;
  readonly target: Target;
  readonly retake: boolean;
  readonly onPress: () => void;
}

/** One line of the fit report: what, how it was taken, and the blade to type on. */
export function ReadingRow({ plan, layout, target, retake, onPress }: ReadingRowProps) {
  const name = targetName(layout, target);
  const taken = isTaken(layout, target);
  return (
    <View style={styles.row} role="listitem" testID={`reading-${observationOf(target)}`}>
      <Icon
        name={retake ? 'retake' : taken ? 'check' : 'tape'}
        tone={retake ? 'red' : taken ? 'chalk' : 'ink2'}
        size={22}
      />
      <View style={styles.words}>
        <Text kind="strong">{name}</Text>
        <Text kind="second">{howTaken(layout, target)}</Text>
      </View>
      <View style={styles.blade}>
        <ReadingBlade plan={plan} layout={layout} target={target} retake={retake} name={name} onPress={onPress} />
      </View>
    </View>
  );
}

function ReadingBlade(props: ReadingRowProps & { readonly name: string }) {
  const { layout, target, plan, retake, onPress, name } = props;
  const { walls, corners, ties } = layout.room;
  if (target.kind === 'corner') {
    const corner = corners.find((c) => c.between.join() === target.between.join());
    const fit = plan.room?.corners.find((c) => c.between.join() === target.between.join());
    return (
      <CornerBadge
        corner={name.replace('Corner ', '')}
        angleDeg={fit?.measured ? fit.angleDeg : null}
        nominalDeg={corner?.nominal}
        retake={retake}
        onPress={onPress}
      />
    );
  }
  const readings = target.kind === 'wall' ? (walls.find((w) => w.id === target.wall)?.length ?? []) : [];
  const tie = target.kind === 'tie' ? ties.find((t) => t.id === target.id) : undefined;
  const reading = target.kind === 'wall' ? readings[0] : tie?.length;
  return (
    <TapeBlade
      inches={reading?.value ?? null}
      step={layout.step}
      name={name}
      state={retake ? 'retake' : readings.length > 1 ? 'twice' : 'set'}
      onPress={onPress}
    />
  );
}

function howTaken(layout: Layout, target: Target): string {
  const { walls, corners, trust, ignore } = layout.room;
  const mark = observationOf(target);
  const said = trust.includes(mark) ? ', trusted' : ignore.includes(mark) ? ', left out' : '';
  if (target.kind === 'wall') {
    const count = walls.find((w) => w.id === target.wall)?.length.length ?? 0;
    return `${count === 0 ? 'not taped' : count === 1 ? 'taped once' : count === 2 ? 'taped twice' : `taped ${count} times`}${said}`;
  }
  if (target.kind === 'tie') return `${target.id === null ? 'next to tape' : 'taped'}${said}`;
  const corner = corners.find((c) => c.between.join() === target.between.join());
  if (corner?.triangle) return `${corner.triangle.a.text}, ${corner.triangle.b.text}, ${corner.triangle.c.text}${said}`;
  return corner?.angle === undefined ? `drawn at ${corner?.nominal ?? 90}, not checked` : `protractor${said}`;
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.m,
    minHeight: 60,
    paddingVertical: 6,
    borderBottomWidth: 1,
    borderBottomColor: color.line,
  },
  words: { flex: 1, minWidth: 0 },
  blade: { width: 148 },
});
