import { StyleSheet, View } from 'react-native';

import type { Layout } from '@/geometry/core/layout';
import type { Suspect } from '@/geometry/room/types';
import { Fraction } from '../measure/Fraction';
import { TapeBlade } from '../measure/TapeBlade';
import { useOpenJob } from '../editor/JobProvider';
import { Button } from '../ui/Button';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';
import { observationWords, targetName, targetOf } from './tape-walk';
import { readValue } from './fit-words';
import type { RoomView } from './use-room-view';

/** The one reading that disagrees: what was taped beside what the others say, and the two ways on. */
export function RetakeCard({ view, suspect }: { readonly view: RoomView; readonly suspect: Suspect }) {
  const { layout, run, mayEdit } = useOpenJob();
  const target = targetOf(layout, suspect.observation);
  const read = target && readValue(layout, target, suspect.shouldRead);
  const doubtful = target?.kind === 'wall' ? secondOpinion(layout, target.wall, suspect.shouldRead) : null;
  if (!target || !read) return null;
  const words = observationWords(layout, suspect.observation);
  return (
    <View style={styles.card}>
      <View style={styles.row}>
        <View style={styles.side}>
          {read.unit === 'deg' ? (
            <Text kind="number">{`${read.value.toFixed(1)}°`}</Text>
          ) : (
            <TapeBlade
              inches={read.value}
              step={layout.step}
              state="retake"
              name={targetName(layout, target)}
              height={50}
            />
          )}
          <Text kind="second">you read</Text>
        </View>
        <Text kind="label">likely</Text>
        <View style={styles.side}>
          <View style={styles.likely}>
            {read.unit === 'deg' ? (
              <Text kind="number" tone="chalk">{`${suspect.shouldRead.toFixed(1)}°`}</Text>
            ) : (
              <Fraction inches={suspect.shouldRead} step={layout.step} size={24} tone="chalk" bold />
            )}
          </View>
          <Text kind="second">if the rest is right</Text>
        </View>
      </View>
      {mayEdit && (
        <View style={styles.buttons}>
          <Button
            label="Keep it"
            height={56}
            spoken={`Keep ${words}: trust it, and look elsewhere`}
            onPress={() => run({ kind: 'markReading', observation: suspect.observation, mark: 'trust' }, `keeping ${words}`)} // prettier-ignore
          />
          <View style={styles.grow}>
            {doubtful ? (
              <Button
                label={`Take ${doubtful.text} away`}
                look="primary"
                icon="bin"
                wide
                height={56}
                onPress={() => run({ kind: 'removeReading', ...doubtful.place }, `${words}, ${doubtful.text}`)}
              />
            ) : (
              <Button
                label={`Tape ${words} again`}
                look="primary"
                icon="tape"
                wide
                height={56}
                onPress={() => view.open(target)}
              />
            )}
          </View>
        </View>
      )}
    </View>
  );
}

/** Of a wall taped more than once, the reading that is far off where another one agrees with the rest. */
function secondOpinion(layout: Layout, wall: string, shouldRead: number) {
  const readings = layout.room.walls.find((w) => w.id === wall)?.length ?? [];
  if (readings.length < 2) return null;
  const off = readings.map((reading) => Math.abs(reading.value - shouldRead));
  const index = off.indexOf(Math.max(...off));
  return { text: readings[index]!.text, place: { wall, index } };
}

const styles = StyleSheet.create({
  card: { gap: space.m },
  row: { flexDirection: 'row', alignItems: 'center', gap: space.m },
  side: { flex: 1, minWidth: 0, gap: 4 },
  likely: {
    minHeight: 50,
    justifyContent: 'center',
    borderBottomWidth: 2,
    borderBottomColor: color.chalk,
    borderStyle: 'dashed',
  },
  buttons: { flexDirection: 'row', gap: space.m },
  grow: { flex: 1, minWidth: 0 },
});
