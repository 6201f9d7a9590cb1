import { useState, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import type { Paper } from '@/geometry/scene/paper/sheet-head';
import { Button } from '../ui/Button';
import { Checkbox } from '../ui/Checkbox';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { pageList, type SheetItem } from './sheet-list';
import { SheetPage } from './SheetPage';
import type { SheetActions } from './use-sheet-actions';

export interface SheetPreviewProps {
  readonly item: SheetItem;
  readonly paper: Paper;
  readonly actions: SheetActions;
  readonly disabled: boolean;
  /** Choices of this kind of sheet, over its pages. */
  readonly children?: ReactNode;
}

const WIDEST = 1100;

/** Every page of one sheet as it will be printed, each to be taken or left out. */
export function SheetPreview({ item, paper, actions, disabled, children }: SheetPreviewProps) {
  const [width, setWidth] = useState(0);
  const [left, setLeft] = useState<ReadonlySet<number>>(new Set());
  const chosen = item.numbers.filter((_, i) => !left.has(i));
  const pages = pageList(chosen);
  const toggle = (index: number) =>
    setLeft((now) => {
      const next = new Set(now);
      if (!next.delete(index)) next.add(index);
      return next;
    });
  return (
    <View style={styles.preview} onLayout={(event) => setWidth(event.nativeEvent.layout.width)}>
      <View style={styles.head}>
        <View style={styles.grow}>
          <Text kind="sheetTitle" level={2}>
            {item.title}
          </Text>
        </View>
        {item.kind === 'cut' && (
          <Button
            label="All cut sheets"
            icon="download"
            busy={actions.busy === 'download'}
            disabled={disabled}
            onPress={() => actions.download('cut')}
          />
        )}
        <Button
          label="Download"
          icon="download"
          busy={actions.busy === 'download'}
          disabled={disabled || chosen.length === 0}
          onPress={() => actions.download(item.kind, pages)}
        />
        <Button
          label={chosen.length === 1 ? 'Print the page' : `Print ${chosen.length} pages`}
          icon="print"
          busy={actions.busy === 'print'}
          disabled={disabled || chosen.length === 0}
          onPress={() => actions.print(item.kind, pages)}
        />
      </View>
      {children}
      {width > 0 &&
        item.pages.map((scene, i) => (
          <View key={`${item.key} ${i}`} style={styles.page}>
            {item.pages.length > 1 && (
              <Checkbox
                label={`Page ${i + 1} of ${item.pages.length}`}
                checked={!left.has(i)}
                onChange={() => toggle(i)}
              />
            )}
            <SheetPage scene={scene} paper={paper} width={Math.min(width, WIDEST)} />
          </View>
        ))}
    </View>
  );
}

const styles = StyleSheet.create({
  preview: { flexGrow: 1, flexShrink: 1, minWidth: 0, gap: space.m },
  head: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: space.m },
  grow: { flexGrow: 1, minWidth: 0 },
  page: { gap: space.xs },
});
