import { useMemo } from 'react';
import { StyleSheet, View } from 'react-native';

import { roomScene } from '@/geometry/scene/room/room-scene';
import { Canvas, type CanvasTarget } from '../canvas/Canvas';
import { CanvasControls } from '../canvas/CanvasControls';
import { REACH } from '../canvas/hit-test';
import { PaintSvg } from '../canvas/paint-svg';
import { useViewport } from '../canvas/use-viewport';
import { useOpenJob } from '../editor/JobProvider';
import { color } from '../ui/tokens';
import { useWide } from '../ui/use-wide';
import { drawable, roomTargets } from './room-targets';
import { observationOf, targetOf } from './tape-walk';
import { useBaseDrag } from './use-base-drag';
import type { RoomTools } from './use-room-tools';
import type { RoomView } from './use-room-view';
import { wallUnder } from './wall-under';

export interface RoomCanvasProps {
  readonly view: RoomView;
  readonly tools: RoomTools;
  /** px the bottom sheet covers. */
  readonly covered: number;
  /** A digit typed on a selected target opens its blade. */
  readonly onDigit: (key: string) => void;
}

/** px kept free for blades, badges and bars. */
const WIDE_EDGES = { top: 96, left: 96, right: 96, bottom: 116 };
const PHONE_EDGES = { top: 78, left: 84, right: 84, bottom: 26 };

/** The room to scale, its readings on it. What a tap does is up to the tool in hand. */
export function RoomCanvas({ view, tools, covered, onDigit }: RoomCanvasProps) {
  const wide = useWide();
  const { drawn, layout, turn, mayEdit } = useOpenJob();
  const selected = view.selected ? observationOf(view.selected) : null;
  const plan = useMemo(() => drawable(drawn, layout, turn), [drawn, layout, turn]);
  const { base, largeBows } = view;
  const mark = tools.cross.from;
  const wrong = useWrong(view);
  const pending = view.typing?.kind === 'tie' && view.typing.id === null ? view.typing : null;
  const scene = useMemo(
    () => roomScene(plan, layout, { selected, base, largeBows, mark, wrong, cross: pending, plain: !wide }),
    [plan, layout, selected, base, largeBows, mark, wrong, pending, wide],
  );
  const all = useMemo(() => roomTargets(plan, layout, scene, base), [plan, layout, scene, base]);
  const targets = useMemo(() => targetsFor(all, tools.tool.kind, mayEdit), [all, tools.tool.kind, mayEdit]);
  const edges = wide ? WIDE_EDGES : PHONE_EDGES;
  const canvas = useViewport(scene.bounds, { ...edges, bottom: edges.bottom + covered });
  const reach = REACH / canvas.view.scale;
  const drag = useBaseDrag(plan, view);
  return (
    <View style={styles.fill}>
      <Canvas
        label="Plan of the room"
        canvas={canvas}
        targets={targets}
        onTap={(id, at) => tools.tap(id, at, wallUnder(plan, at, reach * 1.5), reach)}
        onFocusTarget={(id) => {
          if (tools.tool.kind === 'wall' && !id.startsWith('base ')) view.select(targetOf(layout, id));
        }}
        onDragStart={drag.start}
        onDrag={drag.move}
        onDragEnd={drag.end}
        onDragCancel={drag.cancel}
        onNudge={mayEdit ? drag.nudge : undefined}
        onKey={(key, id) => {
          if (key === 'Delete') return tools.remove(id);
          const target = targetOf(layout, id);
          if (!target || !/^[0-9]$/.test(key) || !mayEdit) return false;
          onDigit(key);
          view.open(target);
          return true;
        }}
      >
        {(pxPerInch) => <PaintSvg scene={scene} pxPerInch={pxPerInch} />}
      </Canvas>
      {wide && (
        <View style={styles.controls}>
          <CanvasControls canvas={canvas} />
        </View>
      )}
    </View>
  );
}

/** The reading that the error names, where the readings contradict each other and nothing could be fitted. */
function useWrong(view: RoomView): readonly string[] | undefined {
  const { layout } = useOpenJob();
  const path = view.room.fit ? undefined : view.room.error?.path;
  return useMemo(() => {
    const found = path === undefined ? null : /^(walls|corners|ties)\[(\d+)\]/.exec(path);
    if (!found) return undefined;
    const index = Number(found[2]);
    const { walls, corners, ties } = layout.room;
    if (found[1] === 'walls') return walls[index] && [`wall ${walls[index].id}`];
    if (found[1] === 'ties') return ties[index] && [`tie ${ties[index].id}`];
    return corners[index] && [`corner ${corners[index].between.join('-')}`];
  }, [path, layout.room]);
}

/** With a tool for walls in hand the cabinets stand back: a tap goes through them to the wall. */
function targetsFor(all: readonly CanvasTarget[], tool: string, mayEdit: boolean): readonly CanvasTarget[] {
  const held = mayEdit ? all : all.map((target) => ({ ...target, draggable: false }));
  return tool === 'wall' ? held : held.filter((target) => !target.id.startsWith('base '));
}

const styles = StyleSheet.create({
  fill: { flex: 1, minHeight: 0, backgroundColor: color.paper },
  controls: { position: 'absolute', left: 20, bottom: 20 },
});
