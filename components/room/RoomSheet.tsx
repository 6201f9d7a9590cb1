import { useState, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { useOpenJob } from '../editor/JobProvider';
import { Sheet } from '../ui/Sheet';
import type { SheetPosition } from '../ui/sheet-drag';
import { space } from '../ui/tokens';
import { fitWords } from './fit-words';
import { LayTops } from './LayTops';
import { NoteButton } from './NoteButton';
import type { Target } from './tape-walk';
import type { RoomTools } from './use-room-tools';
import type { RoomView } from './use-room-view';

/** px of the sheet that holds the pad and its one line above. */
const PAD_HEIGHT = 536;
/** px while walls are drawn: the page above is what matters. */
const DRAW_HEIGHT = 264;

export interface RoomSheetProps {
  readonly view: RoomView;
  readonly tools: RoomTools;
  readonly typing: Target | null;
  readonly onCovers: (px: number) => void;
  readonly children: ReactNode;
}

/** The bottom sheet of a phone: pad, tool, selection or report. */
export function RoomSheet({ view, tools, typing, onCovers, children }: RoomSheetProps) {
  const [position, setPosition] = useState<SheetPosition>('half');
  const { layout, mayEdit } = useOpenJob();
  const { kind } = tools.tool;
  const red = ['retake', 'unsure', 'broken'].includes(fitWords(layout, view.room).mood);
  const content = <View style={styles.padded}>{children}</View>;
  if (typing && kind !== 'draw')
    return (
      <Sheet
        key="pad"
        label="Type a reading"
        position="half"
        half={PAD_HEIGHT}
        onPosition={(next) => next === 'peek' && view.stopTyping()}
        onClose={view.stopTyping}
        onCovers={onCovers}
      >
        {content}
      </Sheet>
    );
  if (kind === 'draw' || kind === 'cross')
    return (
      <Sheet
        key={kind}
        label={kind === 'draw' ? 'Draw the walls' : 'A cross'}
        position={position}
        half={kind === 'draw' ? DRAW_HEIGHT : undefined}
        onPosition={setPosition}
        onClose={layout.room.walls.length > 0 || kind === 'cross' ? tools.putAway : undefined}
        onCovers={onCovers}
      >
        {content}
      </Sheet>
    );
  return (
    <Sheet
      key="report"
      label={view.selected ? 'Selected' : 'Fit report'}
      position={position}
      onPosition={setPosition}
      onClose={view.selected ? () => view.select(null) : undefined}
      edge={red ? 'red' : 'ink'}
      onCovers={onCovers}
      foot={
        view.selected ? undefined : (
          <View style={styles.foot}>
            {mayEdit && <NoteButton target={null} />}
            <View style={styles.grow}>
              <LayTops view={view} wide />
            </View>
          </View>
        )
      }
    >
      {content}
    </Sheet>
  );
}

const styles = StyleSheet.create({
  padded: { paddingHorizontal: space.xs },
  foot: { flexDirection: 'row', gap: space.m },
  grow: { flex: 1, minWidth: 0 },
});
