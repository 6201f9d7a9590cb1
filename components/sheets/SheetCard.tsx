import { StyleSheet, View } from 'react-native';

import type { Scene } from '@/geometry/scene/display-list';
import type { Paper } from '@/geometry/scene/paper/sheet-head';
import { Press } from '../ui/Press';
import { Text } from '../ui/Text';
import { color, radius, space } from '../ui/tokens';
import { SheetPage } from './SheetPage';

export interface SheetCardProps {
  readonly title: string;
  readonly detail: string;
  readonly note: string;
  readonly scene: Scene;
  readonly paper: Paper;
  readonly current: boolean;
  readonly onPress: () => void;
}

/** A sheet in the list: its true drawing, small, and what it is. */
export function SheetCard({ title, detail, note, scene, paper, current, onPress }: SheetCardProps) {
  return (
    <View role="listitem">
      <Press
        onPress={onPress}
        aria-label={`${title}, ${detail}, ${note}`}
        aria-current={current ? 'true' : undefined}
        hoverGround={color.chalkT}
        style={[styles.card, current && styles.current]}
      >
        <View aria-hidden>
          <SheetPage scene={scene} paper={paper} width={124} />
        </View>
        <View style={styles.words}>
          <Text kind="rowTitle" hidden>
            {title}
          </Text>
          <Text kind="second" hidden>
            {detail}
          </Text>
          <Text kind="second" hidden>
            {note}
          </Text>
        </View>
      </Press>
    </View>
  );
}

const styles = StyleSheet.create({
  card: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.m,
    padding: space.m,
    backgroundColor: color.card,
    borderWidth: 1,
    borderColor: color.line,
    borderRadius: radius.card,
  },
  current: { borderColor: color.chalk, borderWidth: 2 },
  words: { flex: 1, minWidth: 0, gap: 4 },
});
