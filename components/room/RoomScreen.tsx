import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { useOpenJob } from '../editor/JobProvider';
import { JobFrame } from '../shell/JobFrame';
import { Inspector } from '../ui/Inspector';
import { MoreMenu, type MenuItem } from '../ui/Menu';
import { space } from '../ui/tokens';
import { useShortcuts } from '../ui/use-shortcuts';
import { useWide } from '../ui/use-wide';
import { CornerPicture } from './CornerPicture';
import { DrawCanvas } from './DrawCanvas';
import { FitHead } from './FitReport';
import { KeysDialog } from './KeysDialog';
import { LayTops } from './LayTops';
import { PromptBar } from './PromptBar';
import { RoomCanvas } from './RoomCanvas';
import { RoomSheet } from './RoomSheet';
import { RoomSide } from './RoomSide';
import { TOOLS } from './room-tools';
import { ShapeChooser } from './ShapeChooser';
import { nextTarget, observationOf, targetName } from './tape-walk';
import { ToolBar } from './ToolBar';
import { useCornerCheck } from './use-corner-check';
import { useDraw } from './use-draw';
import { useRoomTools, type RoomTools } from './use-room-tools';
import { useRoomView, type RoomView } from './use-room-view';

/** Job > Room: what was measured, and whether it holds. */
export function RoomScreen() {
  const wide = useWide();
  const view = useRoomView();
  const tools = useRoomTools(view);
  const draw = useDraw();
  const found = useCornerCheck(view);
  const { layout, mayEdit } = useOpenJob();
  const [covered, setCovered] = useState(0);
  const [firstKey, setFirstKey] = useState<string | undefined>();
  const [keys, setKeys] = useState(false);
  const check = mayEdit ? found : null;
  const drawing = tools.tool.kind === 'draw';
  const empty = layout.room.walls.length === 0 && !drawing;
  const typing = mayEdit ? view.typing : null;
  const subtitle = useSubtitle(view, drawing);
  useRoomKeys(view, tools, () => setKeys(true), setFirstKey);

  const side = <RoomSide view={view} tools={tools} draw={draw} check={check} firstKey={firstKey} />;
  const chooser = (
    <ShapeChooser onChosen={() => view.open({ kind: 'wall', wall: 'A' })} onDraw={() => tools.take({ kind: 'draw' })} />
  );
  const canvas = drawing ? (
    <DrawCanvas draw={draw} covered={wide ? 0 : covered} />
  ) : check && !wide ? (
    <View style={[styles.fill, { paddingBottom: covered }]}>
      <CornerPicture check={check} />
    </View>
  ) : (
    <RoomCanvas view={view} tools={tools} covered={wide ? 0 : covered} onDigit={setFirstKey} />
  );
  return (
    <JobFrame
      subtitle={subtitle}
      fill
      barHidden={!wide && typing !== null}
      primary={<LayTops view={view} />}
      actions={
        empty ? undefined : <MoreMenu label="More" items={moreItems(tools, wide, mayEdit, () => setKeys(true))} />
      }
      inspector={
        empty ? undefined : (
          <Inspector
            label="Readings"
            foot={
              (typing && !check) || (view.selected && !typing) || drawing ? <FitHead view={view} boxed /> : undefined
            }
          >
            <View style={styles.side}>
              {check && <CornerPicture check={check} height={200} />}
              {side}
            </View>
          </Inspector>
        )
      }
    >
      <View style={styles.fill}>{empty ? chooser : canvas}</View>
      {!empty && <PromptBar tools={tools} />}
      {wide && !empty && mayEdit && (
        <View style={styles.bar}>
          <ToolBar tool={tools.tool} onTool={tools.take} />
        </View>
      )}
      {!wide && !empty && (
        <RoomSheet view={view} tools={tools} typing={typing} onCovers={setCovered}>
          {side}
        </RoomSheet>
      )}
      <KeysDialog open={keys} onClose={() => setKeys(false)} />
    </JobFrame>
  );
}

/** Everything of the tool bar that a phone has no room for, and the keys. */
function moreItems(tools: RoomTools, wide: boolean, mayEdit: boolean, onKeys: () => void): MenuItem[] {
  const offered = wide || !mayEdit ? [] : TOOLS.filter(({ tool }) => tool.kind !== 'wall');
  return [
    ...offered.map(({ tool, label, icon }): MenuItem => {
      const words = tool.kind === 'place' ? (PLACE_WORDS[label] ?? label) : TOOL_WORDS[tool.kind];
      return { key: label, label: words, icon, onPress: () => tools.take(tool) };
    }),
    { key: 'keys', label: 'Keys', icon: 'help', onPress: onKeys },
  ];
}

const PLACE_WORDS: Readonly<Record<string, string>> = {
  Sink: 'Put in a sink base',
  Gap: 'Leave a gap for a range',
  Window: 'Put in a window',
  'No access': 'Corner base with no access',
};

const TOOL_WORDS = {
  wall: 'Tape a wall',
  corner: 'Check a corner',
  cross: 'Tape a cross',
  bow: 'Read how a wall bows',
  draw: 'Draw the walls',
} as const;

function useRoomKeys(view: RoomView, tools: RoomTools, onKeys: () => void, onDigit: (key: string) => void): void {
  const { layout, mayEdit } = useOpenJob();
  const typed = (key: string) => () => {
    if (!view.selected) return;
    onDigit(key);
    view.open(view.selected);
  };
  const digits = Object.fromEntries([...'0123456789'].map((key) => [key, view.selected ? typed(key) : undefined]));
  const letters = Object.fromEntries(TOOLS.flatMap(({ key, tool }) => (key ? [[key, () => tools.take(tool)]] : [])));
  const next = nextTarget(layout, view.room.fit?.next ?? null, view.selected);
  useShortcuts({ '?': onKeys }, true);
  useShortcuts(
    {
      ...digits,
      ...letters,
      n: next ? () => view.open(next) : undefined,
      Delete: view.base
        ? () => void tools.remove(`base ${view.base}`)
        : view.selected?.kind === 'tie'
          ? () => void tools.remove(observationOf(view.selected!))
          : undefined,
      Escape: () => (tools.tool.kind === 'wall' ? view.select(null) : tools.putAway()),
    },
    mayEdit && view.typing === null,
  );
}

function useSubtitle(view: RoomView, drawing: boolean): string {
  const { layout, mayEdit } = useOpenJob();
  const { walls, corners } = layout.room;
  if (drawing) return 'Room: drawing the walls';
  if (walls.length === 0) return 'Room: no walls yet';
  if (view.typing?.kind === 'corner' && mayEdit) return `${targetName(layout, view.typing)}: two marks, then across`;
  const taped = walls.filter((wall) => wall.length.length > 0).length;
  const checked = corners.filter((corner) => corner.triangle || corner.angle !== undefined).length;
  if (!nextTarget(layout, null, null)) return 'Room: all readings in';
  return `Room: ${taped} of ${walls.length} walls, ${checked} of ${corners.length} corners`;
}

const styles = StyleSheet.create({
  fill: { flex: 1, minHeight: 0 },
  side: { gap: space.m },
  bar: { position: 'absolute', left: 184, right: 20, bottom: 20, flexDirection: 'row' },
});
