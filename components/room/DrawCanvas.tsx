import { useMemo } from 'react';
import { StyleSheet, View } from 'react-native';

import { wallLabel } from '@/geometry/core/layout';
import { boundingBox } from '@/geometry/core/polygon';
import type { Scene } from '@/geometry/scene/display-list';
import { sketchScene } from '@/geometry/scene/room/sketch-scene';
import { spokenLength } from '@/geometry/tape/format-length';
import { Canvas, type CanvasDrag, type CanvasTarget } from '../canvas/Canvas';
import { CanvasControls } from '../canvas/CanvasControls';
import { REACH } from '../canvas/hit-test';
import { PaintSvg } from '../canvas/paint-svg';
import { useViewport } from '../canvas/use-viewport';
import { useOpenJob } from '../editor/JobProvider';
import { endsOf, lengthOf, type Sketch } from '../editor/tools/sketch';
import { color } from '../ui/tokens';
import { useWide } from '../ui/use-wide';
import type { Draw } from './use-draw';

/** Half of the page there is to draw on, inches. */
const HALF_PAGE = 90;
const GROUND = 4000;

/** The walls under the pencil: taps add, drags move. */
export function DrawCanvas({ draw, covered }: { readonly draw: Draw; readonly covered: number }) {
  const wide = useWide();
  const { layout, mayEdit } = useOpenJob();
  const scene = useMemo(
    () => sketchScene(draw.shown, layout, { selected: draw.state.selected, first: draw.state.first }),
    [draw.shown, layout, draw.state],
  );
  const page = useMemo(() => pageFor(draw.sketch), [draw.sketch]);
  const targets = useMemo(() => drawTargets(draw.sketch, layout.step), [draw.sketch, layout.step]);
  const edge = wide ? 72 : 40;
  const canvas = useViewport(page, { top: edge, left: edge, right: edge, bottom: (wide ? 128 : edge) + covered });
  const reach = REACH / canvas.view.scale;
  const sendDrag = (kind: 'drag' | 'drop') => (drag: CanvasDrag) =>
    draw.send({ kind, target: drag.target, from: drag.from, to: drag.to, on: null, reach });
  return (
    <View style={styles.fill}>
      <Canvas
        label="Walls as drawn"
        canvas={canvas}
        targets={targets}
        onTap={(target, at) => mayEdit && draw.send({ kind: 'tap', at, target, on: null, reach })}
        onFocusTarget={draw.select}
        onDrag={sendDrag('drag')}
        onDragEnd={sendDrag('drop')}
        onDragCancel={() => draw.send({ kind: 'cancel' })}
        onNudge={(target, by) => draw.send({ kind: 'nudge', target, by, on: null })}
        onKey={(key, target) => {
          if (key !== 'Delete' || !target.startsWith('wall ')) return false;
          draw.removeWall(target.slice(5));
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

/** The page stays where it is while one draws on it, and grows with the walls. */
function pageFor({ points }: Sketch): Scene['bounds'] {
  if (points.length === 0) return { minX: -HALF_PAGE, minY: -HALF_PAGE, maxX: HALF_PAGE, maxY: HALF_PAGE };
  const box = boundingBox(points);
  const [x, y] = [(box.minX + box.maxX) / 2, (box.minY + box.maxY) / 2];
  // Few walls say little about how large the room will be.
  if (points.length > 3) return box;
  const half = { x: Math.max(HALF_PAGE, (box.maxX - box.minX) / 2), y: Math.max(HALF_PAGE, (box.maxY - box.minY) / 2) };
  return { minX: x - half.x, minY: y - half.y, maxX: x + half.x, maxY: y + half.y };
}

function drawTargets(sketch: Sketch, step: '1/16' | '1/32' | '1 mm' | '0.5 mm'): CanvasTarget[] {
  const walls = sketch.walls.map((id, i): CanvasTarget => {
    const [from, to] = endsOf(sketch, i);
    const name = `Wall ${wallLabel(i)} as drawn, about ${spokenLength(Math.round(lengthOf(sketch, i)), step)}`;
    return { id: `wall ${id}`, name, shape: { kind: 'segment', from, to }, draggable: true };
  });
  const corners = sketch.points.map((at, i): CanvasTarget => {
    return { id: `point ${i}`, name: cornerWords(sketch, i), shape: { kind: 'point', at }, rank: 1, draggable: true };
  });
  const ground: CanvasTarget = {
    id: 'ground',
    name: 'Free ground',
    unlisted: true,
    rank: -5,
    draggable: !sketch.closed,
    shape: {
      kind: 'area',
      outline: [
        [-GROUND, -GROUND],
        [GROUND, -GROUND],
        [GROUND, GROUND],
        [-GROUND, GROUND],
      ],
    },
  };
  // Tab goes round the room: corner, wall, corner …
  const walk = corners.flatMap((corner, i) => (walls[i] ? [corner, walls[i]] : [corner]));
  return sketch.closed ? walk : [...walk, ground];
}

function cornerWords({ walls, closed }: Sketch, index: number): string {
  const count = walls.length;
  const before = index > 0 ? index - 1 : closed ? count - 1 : null;
  const after = index < count ? index : null;
  if (before === null) return 'Left end of the walls';
  if (after === null) return 'Right end of the walls';
  return `Corner ${wallLabel(before)}-${wallLabel(after)} as drawn`;
}

const styles = StyleSheet.create({
  fill: { flex: 1, minHeight: 0, backgroundColor: color.paper },
  controls: { position: 'absolute', left: 20, bottom: 20 },
});
