import { StyleSheet, View } from 'react-native';

import { Button } from '../ui/Button';
import { Text } from '../ui/Text';
import { color, radius, space } from '../ui/tokens';
import type { RoomTools } from './use-room-tools';

/** What to do with the tool in hand, over the drawing, and the way to put it away. */
export function PromptBar({ tools }: { readonly tools: RoomTools }) {
  if (tools.tool.kind === 'wall' || tools.tool.kind === 'draw') return null;
  return (
    <View style={styles.bar}>
      <View style={styles.words} aria-live="polite">
        <Text kind="strong">{tools.prompt}</Text>
      </View>
      <Button label="Leave it" height={44} onPress={tools.putAway} />
    </View>
  );
}

const styles = StyleSheet.create({
  bar: {
    position: 'absolute',
    top: space.m,
    alignSelf: 'center',
    maxWidth: '94%',
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.m,
    padding: space.s,
    paddingLeft: space.l,
    backgroundColor: color.card,
    borderWidth: 1.5,
    borderColor: color.chalk,
    borderRadius: radius.card,
  },
  words: { flexShrink: 1 },
});
