import { View, StyleSheet } from 'react-native';

import { useOpenJob } from '../editor/JobProvider';
import { Banner } from '../ui/Banner';
import { space } from '../ui/tokens';
import { CrossPanel } from './CrossPanel';
import { DrawPanel } from './DrawPanel';
import { FitReport } from './FitReport';
import { ReadingPad } from './ReadingPad';
import { SelectedPanel } from './SelectedPanel';
import { nextTarget } from './tape-walk';
import type { CornerCheck } from './use-corner-check';
import type { Draw } from './use-draw';
import type { RoomTools } from './use-room-tools';
import type { RoomView } from './use-room-view';

export interface RoomSideProps {
  readonly view: RoomView;
  readonly tools: RoomTools;
  readonly draw: Draw;
  readonly check: CornerCheck | null;
  readonly firstKey?: string;
}

/** What stands in the sheet or the inspector: the pad, the tool's list, what is selected, or the fit report. */
export function RoomSide({ view, tools, draw, check, firstKey }: RoomSideProps) {
  const { layout, mayEdit } = useOpenJob();
  const untouched = layout.room.walls.every((wall) => wall.length.length === 0);
  if (tools.tool.kind === 'draw')
    return (
      <DrawPanel
        draw={draw}
        onDone={() => {
          tools.putAway();
          const first = untouched ? nextTarget(layout, null, null) : null;
          if (first) view.open(first);
        }}
      />
    );
  if (mayEdit && view.typing) return <ReadingPad view={view} target={view.typing} check={check} firstKey={firstKey} />;
  if (tools.tool.kind === 'cross') return <CrossPanel view={view} from={tools.cross.from} onClose={tools.putAway} />;
  return (
    <View style={styles.side}>
      {!mayEdit && <Banner look="plain" icon="eye" fact="You may look at the room, not change it." />}
      {view.selected ? <SelectedPanel view={view} target={view.selected} /> : <FitReport view={view} tools={tools} />}
    </View>
  );
}

const styles = StyleSheet.create({ side: { gap: space.m } });
