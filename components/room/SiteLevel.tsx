import { StyleSheet, View } from 'react-native';

import { inches } from '@/geometry/top/sentence';
import { useOpenJob } from '../editor/JobProvider';
import { LengthField } from '../measure/LengthField';
import { Button } from '../ui/Button';
import { IconButton } from '../ui/IconButton';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';

/** What a level says about floor and cabinets, and the notes made in this room. */
export function SiteLevel() {
  const { layout, run, mayEdit } = useOpenJob();
  const { cabinetsOutOfLevel, floorOutOfLevel } = layout.site;
  const say = (value: number) => inches(value, layout.step);
  return (
    <View style={styles.section}>
      <Text kind="rowTitle" level={3}>
        Floor and cabinets
      </Text>
      <LengthField
        label="Cabinet tops, highest to lowest"
        hint="Along the whole kitchen. Shims bring them level."
        value={cabinetsOutOfLevel ?? null}
        step={layout.step}
        disabled={!mayEdit}
        onLength={(value) => run({ kind: 'setSite', value: { cabinetsOutOfLevel: value } }, `cabinets out of level ${say(value)}`)} // prettier-ignore
      />
      <LengthField
        label="Floor, highest to lowest"
        value={floorOutOfLevel ?? null}
        step={layout.step}
        disabled={!mayEdit}
        onLength={(value) => run({ kind: 'setSite', value: { floorOutOfLevel: value } }, `floor out of level ${say(value)}`)} // prettier-ignore
      />
      {layout.notes.length > 0 && (
        <View role="list" aria-label="Notes">
          {layout.notes.map((note, i) => (
            <View key={note.id} role="listitem" style={styles.note}>
              <Text kind="strong">{i + 1}</Text>
              <View style={styles.grow}>
                <Text>{note.text}</Text>
              </View>
              {mayEdit && (
                <IconButton
                  icon="bin"
                  label={`Take away note ${i + 1}`}
                  onPress={() => run({ kind: 'removeItem', section: 'notes', item: note.id }, `note ${i + 1}`)}
                />
              )}
            </View>
          ))}
        </View>
      )}
    </View>
  );
}

/** Twin of the toolbar for phones and lists: what else can be done in the room. */
export function RoomActs(props: { readonly onDraw: () => void; readonly onCross: () => void }) {
  return (
    <View style={styles.acts}>
      <Button label="Draw the walls" icon="pencil" onPress={props.onDraw} />
      <Button label="Tape a cross" icon="slide" onPress={props.onCross} />
    </View>
  );
}

const styles = StyleSheet.create({
  section: { gap: space.m, paddingTop: space.m, borderTopWidth: 2, borderTopColor: color.ink },
  note: { flexDirection: 'row', alignItems: 'center', gap: space.m, minHeight: 48 },
  grow: { flex: 1, minWidth: 0 },
  acts: { flexDirection: 'row', flexWrap: 'wrap', gap: space.s },
});
