import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import type { EditDraft } from '@/shared/layout/apply-edit';
import { useOpenJob } from '../editor/JobProvider';
import { Segmented } from '../ui/Segmented';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { Tile } from './CutInto';
import { newIsland, newRun, newStrip, type IslandForm, type StripUse } from './new-items';
import { inSentence, topName, wallName } from './tops-choice';

const FORMS: readonly { readonly form: IslandForm; readonly label: string }[] = [
  { form: 'rectangle', label: 'Rectangle' },
  { form: 'clipped', label: 'Clipped' },
  { form: 'rounded', label: 'Rounded' },
  { form: 'L', label: 'L shape' },
  { form: 'free', label: 'Any outline' },
];

const USES: readonly { readonly use: StripUse; readonly label: string }[] = [
  { use: 'backsplash', label: 'Backsplash' },
  { use: 'filler', label: 'Filler' },
  { use: 'shelf', label: 'Shelf' },
];

/** Everything that can be laid: runs along any wall, islands, strips. What is cut into them is added on the top itself. */
export function AddPanel({ onChoose }: { readonly onChoose: (name: string) => void }) {
  const { layout, plan, settings, run } = useOpenJob();
  const [side, setSide] = useState<'front' | 'back'>('front');
  const add = (edit: EditDraft, id: string, label: string) => {
    if (run(edit, label)) onChoose(`top ${id}`);
  };
  const addRun = (wall: string) => {
    const item = newRun(layout, plan, settings, wall, side);
    add(
      { kind: 'addItem', section: 'runs', item },
      item.id,
      inSentence(topName({ ...layout, runs: [...layout.runs, item] }, item.id)),
    );
  };
  return (
    <View style={styles.panel}>
      <View style={styles.section}>
        <Text kind="rowTitle" level={3}>
          A run along a wall
        </Text>
        <Segmented
          label="Side of the wall"
          labelHidden
          options={[
            { value: 'front', label: 'Room side' },
            { value: 'back', label: 'Far side' },
          ]}
          value={side}
          onChange={setSide}
        />
        <View style={styles.tiles} role="group" aria-label="Walls">
          {layout.room.walls.map((wall) => {
            const letter = wallName(layout, wall.id);
            return (
              <Tile
                key={wall.id}
                label={`Wall ${letter}`}
                spoken={`Lay a run on wall ${letter}`}
                icon="tops"
                onPress={() => addRun(wall.id)}
              />
            );
          })}
        </View>
        <Text kind="small">It takes the free part of the wall; begin, end and depth are changed on its blades.</Text>
      </View>
      <View style={styles.section}>
        <Text kind="rowTitle" level={3}>
          An island
        </Text>
        <View style={styles.tiles} role="group" aria-label="Islands">
          {FORMS.map(({ form, label }) => (
            <Tile
              key={form}
              label={label}
              spoken={`Add an island, ${label.toLowerCase()}`}
              icon="plus"
              onPress={() => {
                const item = newIsland(layout, form);
                add({ kind: 'addItem', section: 'islands', item }, item.id, `island ${item.id}`);
              }}
            />
          ))}
        </View>
      </View>
      <View style={styles.section}>
        <Text kind="rowTitle" level={3}>
          A strip
        </Text>
        <View style={styles.tiles} role="group" aria-label="Strips">
          {USES.map(({ use, label }) => (
            <Tile
              key={use}
              label={label}
              spoken={`Add a ${label.toLowerCase()}`}
              icon="grain"
              onPress={() => {
                const item = newStrip(layout, plan, use);
                add({ kind: 'addItem', section: 'strips', item }, item.id, label.toLowerCase());
              }}
            />
          ))}
        </View>
      </View>
      <Text kind="small">
        Sinks, cooktops, tap holes and notches are cut on the top they lie in: choose the top first.
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({
  panel: { gap: space.xl },
  section: { gap: space.s },
  tiles: { flexDirection: 'row', flexWrap: 'wrap', gap: space.s },
});
