import { StyleSheet, View } from 'react-native';

import { IconButton } from '../ui/IconButton';
import { color, radius } from '../ui/tokens';
import type { CanvasView } from './use-viewport';

/** Buttons for what pinch, wheel and double tap do. */
export function CanvasControls({ canvas }: { readonly canvas: CanvasView }) {
  return (
    <View role="group" aria-label="Zoom" style={styles.bar}>
      <IconButton icon="fit" label="Show all" onPress={canvas.fit} />
      <IconButton icon="plus" label="Zoom in" onPress={() => canvas.zoomBy(1.25)} />
      <IconButton icon="minus" label="Zoom out" onPress={() => canvas.zoomBy(1 / 1.25)} />
    </View>
  );
}

const styles = StyleSheet.create({
  bar: {
    flexDirection: 'row',
    alignSelf: 'flex-start',
    borderWidth: 1,
    borderColor: color.line,
    borderRadius: radius.card,
    backgroundColor: color.card,
  },
});
