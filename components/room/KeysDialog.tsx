import { StyleSheet, View } from 'react-native';

import { Dialog } from '../ui/Dialog';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';
import { TOOLS } from './room-tools';

const KEYS: readonly (readonly [string, string])[] = [
  ['Tab', 'walk the walls, corners and crosses'],
  ['0 to 9', 'type a reading for what is selected'],
  ['Enter', 'open it; on the pad: store it and go on'],
  ['Esc', 'close the pad, put the tool away'],
  ['Arrows', 'move what stands on a wall, or a drawn corner, by 1/16 in; with Shift by 1 in'],
  ['N', 'the next reading to take'],
  ['Delete', 'take away what is selected'],
  ['Ctrl Z, Shift Ctrl Z', 'undo, redo'],
  ...TOOLS.flatMap(({ key, label }): [string, string][] => (key ? [[key.toUpperCase(), `tool: ${label}`]] : [])),
  ['?', 'this list'],
];

/** What the keyboard does on this screen. */
export function KeysDialog({ open, onClose }: { readonly open: boolean; readonly onClose: () => void }) {
  return (
    <Dialog open={open} title="Keys" onClose={onClose}>
      <View role="list">
        {KEYS.map(([key, does]) => (
          <View key={key} role="listitem" style={styles.row}>
            <View style={styles.key}>
              <Text kind="strong">{key}</Text>
            </View>
            <View style={styles.does}>
              <Text>{does}</Text>
            </View>
          </View>
        ))}
      </View>
      <Text kind="small">Keys of a single letter can be turned off in your account.</Text>
    </Dialog>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', gap: space.m, paddingVertical: 6, borderBottomWidth: 1, borderBottomColor: color.line },
  key: { width: 128 },
  does: { flex: 1, minWidth: 0 },
});
