import { useRouter } from 'expo-router';
import { useRef, useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { firstTops } from '@/shared/layout/first-tops';
import type { EditDraft } from '@/shared/layout/apply-edit';
import { useOpenJob } from '../editor/JobProvider';
import { JobFrame } from '../shell/JobFrame';
import { useReachStage } from '../shell/use-reach-stage';
import { Button } from '../ui/Button';
import { Inspector } from '../ui/Inspector';
import { Sheet } from '../ui/Sheet';
import type { SheetPosition } from '../ui/sheet-drag';
import { space } from '../ui/tokens';
import { useWide } from '../ui/use-wide';
import { FitHead, FitReport } from './FitReport';
import { fitWords } from './fit-words';
import { ReadingPad } from './ReadingPad';
import { RoomCanvas } from './RoomCanvas';
import { SelectedPanel } from './SelectedPanel';
import { ShapeChooser } from './ShapeChooser';
import { nextTarget } from './tape-walk';
import { useRoomView, type RoomView } from './use-room-view';

/** px of the sheet that holds the pad: more for a corner, whose marks are chosen above it. */
const PAD_HEIGHT = 492;
const CORNER_PAD_HEIGHT = 640;

/** Job > Room: what was measured, and whether it holds. */
export function RoomScreen() {
  const wide = useWide();
  const view = useRoomView();
  const { layout, mayEdit } = useOpenJob();
  const [covered, setCovered] = useState(0);
  const [firstKey, setFirstKey] = useState<string | undefined>();
  const subtitle = useSubtitle(view);
  const empty = layout.room.walls.length === 0;
  const typing = mayEdit ? view.typing : null;
  const pad = typing && <ReadingPad view={view} target={typing} firstKey={firstKey} />;
  const canvas = empty ? (
    <ShapeChooser
      onChosen={() => {
        view.open({ kind: 'wall', wall: 'A' });
      }}
    />
  ) : (
    <RoomCanvas view={view} covered={wide ? 0 : covered} onDigit={setFirstKey} />
  );
  return (
    <JobFrame
      subtitle={subtitle}
      fill
      barHidden={!wide && typing !== null}
      primary={<LayTops view={view} />}
      inspector={
        empty ? undefined : (
          <Inspector label="Readings" foot={typing || view.selected ? <FitHead view={view} /> : undefined}>
            <View style={styles.side}>
              {pad ??
                (view.selected ? <SelectedPanel view={view} target={view.selected} /> : <FitReport view={view} />)}
            </View>
          </Inspector>
        )
      }
    >
      <View style={styles.fill}>{canvas}</View>
      {!wide && !empty && <RoomSheet view={view} pad={pad} onCovers={setCovered} />}
    </JobFrame>
  );
}

function RoomSheet({
  view,
  pad,
  onCovers,
}: {
  readonly view: RoomView;
  readonly pad: React.ReactNode;
  readonly onCovers: (px: number) => void;
}) {
  const [position, setPosition] = useState<SheetPosition>('half');
  const { layout } = useOpenJob();
  const red = ['retake', 'unsure', 'broken'].includes(fitWords(layout, view.room).mood);
  if (pad)
    return (
      <Sheet
        key="pad"
        label="Type a reading"
        position="half"
        half={view.typing?.kind === 'corner' ? CORNER_PAD_HEIGHT : PAD_HEIGHT}
        onPosition={(next) => next === 'peek' && view.stopTyping()}
        onClose={view.stopTyping}
        onCovers={onCovers}
      >
        <View style={styles.padded}>{pad}</View>
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
        <View style={styles.foot}>
          <LayTops view={view} wide />
        </View>
      }
    >
      <View style={styles.padded}>
        {view.selected ? <SelectedPanel view={view} target={view.selected} /> : <FitReport view={view} />}
      </View>
    </Sheet>
  );
}

/** The way on: lays the first tops where there are none, then goes to them. */
function LayTops({ view, wide = false }: { readonly view: RoomView; readonly wide?: boolean }) {
  const router = useRouter();
  const { job, layout, plan, run, settings, mayEdit } = useOpenJob();
  const reach = useReachStage();
  const laid = useRef(false);
  const ready = view.room.fit !== null && view.room.error === null && view.room.untaped.length === 0;
  const has = layout.runs.length > 0 || layout.islands.length > 0;
  const go = () => {
    if (!has && mayEdit && !laid.current) {
      laid.current = true;
      const lengths = new Map(plan.room?.walls.map((wall) => [wall.id, wall.adjusted]));
      const { runs, cutouts } = firstTops(layout, lengths, settings);
      const edits: [EditDraft, string][] = [
        ...runs.map((item): [EditDraft, string] => [{ kind: 'addItem', section: 'runs', item }, `run ${item.id}`]),
        ...cutouts.map((item): [EditDraft, string] => [{ kind: 'addItem', section: 'cutouts', item }, 'sink cutout']),
      ];
      for (const [edit, label] of edits) run(edit, label);
    }
    reach('measured');
    router.navigate(`/jobs/${job.id}/tops` as never);
  };
  return (
    <Button
      label={has ? 'To the tops' : 'Lay the tops'}
      look={ready ? 'primary' : 'secondary'}
      iconAfter="next"
      wide={wide}
      height={wide ? 56 : 48}
      disabled={!ready}
      onPress={go}
    />
  );
}

function useSubtitle(view: RoomView): string {
  const { layout } = useOpenJob();
  const { walls, corners } = layout.room;
  if (walls.length === 0) return 'Room: no walls yet';
  const taped = walls.filter((wall) => wall.length.length > 0).length;
  const checked = corners.filter((corner) => corner.triangle || corner.angle !== undefined).length;
  if (!nextTarget(layout, null, null)) return 'Room: all readings in';
  return `Room: ${taped} of ${walls.length} walls, ${checked} of ${corners.length} corners`;
}

const styles = StyleSheet.create({
  fill: { flex: 1, minHeight: 0 },
  side: { padding: space.l },
  padded: { paddingHorizontal: space.l, paddingBottom: space.m },
  foot: { padding: space.m },
});
