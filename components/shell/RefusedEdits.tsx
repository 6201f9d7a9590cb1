import { StyleSheet, View } from 'react-native';
import { useStore } from 'zustand';

import type { Edit } from '@/shared/layout/apply-edit';
import type { RefusedEdit } from '../editor/editor-store';
import { useOpenJob } from '../editor/JobProvider';
import { Button } from '../ui/Button';
import { Icon } from '../ui/Icon';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';

/** What somebody typed and what could not be kept, with its values, until it was read. */
export function RefusedEdits() {
  const { store } = useOpenJob();
  const refused = useStore(store, (state) => state.refused);
  if (refused.length === 0) return null;
  return (
    <View role="alert" style={styles.bar}>
      <Icon name="warn" tone="red" />
      <View style={styles.words}>
        <Text kind="strong">Could not keep {refused.length === 1 ? 'one change' : `${refused.length} changes`}.</Text>
        {refused.slice(0, 5).map(({ edit, reason }: RefusedEdit) => (
          <Text key={edit.id} kind="second" tone="ink">{`${editWords(edit)} ${reason}`}</Text>
        ))}
      </View>
      <Button label="I have read it" onPress={() => store.getState().dropRefused()} />
    </View>
  );
}

/** The change with the value that was typed. */
export function editWords(edit: Edit): string {
  switch (edit.kind) {
    case 'addReading':
    case 'replaceReading':
      return `Wall ${edit.wall}, ${edit.reading.text}:`;
    case 'setTriangle':
      return `Corner ${edit.between.join('-')}, ${edit.triangle.a.text}, ${edit.triangle.b.text}, ${edit.triangle.c.text}:`;
    case 'setAngle':
      return `Corner ${edit.between.join('-')}, ${edit.angle} degrees:`;
    case 'setTie':
      return `Cross ${edit.tie.from.wall} to ${edit.tie.to.wall}, ${edit.tie.length.text}:`;
    case 'addItem':
      return `A new one of the ${edit.section} (${edit.item.id}):`;
    case 'changeItem':
      return `A change to ${edit.item}, ${Object.entries(edit.change)
        .map(([field, value]) => `${field} ${JSON.stringify(value)}`)
        .join(', ')}:`;
    case 'restore':
      return 'An undo:';
    default:
      return 'A change:';
  }
}

const styles = StyleSheet.create({
  bar: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    gap: space.m,
    alignItems: 'center',
    padding: space.m,
    backgroundColor: color.redT,
    borderLeftWidth: 6,
    borderLeftColor: color.red,
  },
  words: { flexGrow: 1, flexShrink: 1, flexBasis: 200, gap: 2 },
});
