import { useEffect, useMemo } from 'react';
import { StyleSheet, View } from 'react-native';

import type { Layout } from '@/geometry/core/layout';
import type { Point } from '@/geometry/core/point';
import { boundingBox } from '@/geometry/core/polygon';
import type { Plan } from '@/geometry/plan/types';
import type { Scene } from '@/geometry/scene/display-list';
import { legibleScene } from '@/geometry/scene/tops/legible-scene';
import { topsScene, type TopsLayers } from '@/geometry/scene/tops/tops-scene';
import { Canvas } from '../canvas/Canvas';
import { CanvasControls } from '../canvas/CanvasControls';
import { PaintSvg } from '../canvas/paint-svg';
import { useStableScene } from '../canvas/use-stable-scene';
import { useViewport, type CanvasView } from '../canvas/use-viewport';
import { fitView } from '../canvas/viewport';
import { useOpenJob } from '../editor/JobProvider';
import { Text } from '../ui/Text';
import { color, radius, space } from '../ui/tokens';
import { useWide } from '../ui/use-wide';
import type { Before } from './use-before';
import { topsTargets } from './tops-targets';
import { useTopsDrag } from './use-tops-drag';

/** A place the drawing has been asked to show, inches. A new object asks again. */
export interface CanvasFocus {
  readonly points: readonly Point[];
}

export interface TopsCanvasProps {
  readonly selected: string | null;
  readonly onSelect: (name: string | null) => void;
  /** Letters of pieces to light. */
  readonly lit: readonly string[];
  readonly focus: CanvasFocus | null;
  readonly layers: TopsLayers;
  /** px the bottom sheet covers. */
  readonly covered: number;
  /** Shown instead of the tops as they are now. */
  readonly before: Before | null;
  /** A digit typed on what is chosen; true when it opened a blade. */
  readonly onDigit: (key: string, target: string) => boolean;
}

/** Inches kept in sight round a place. */
const AROUND = 10;

/** The tops from above; seams, cutouts and islands slide under the finger. */
export function TopsCanvas(props: TopsCanvasProps) {
  const { selected, onSelect, lit, focus, layers, covered, before } = props;
  const wide = useWide();
  const { drawn: now, layout: layoutNow, mayEdit } = useOpenJob();
  const drawn: Plan = before?.drawn ?? now;
  const layout: Layout = before?.layout ?? layoutNow;
  const handles = mayEdit && !before;
  const scene = useMemo(
    () => topsScene(drawn, layout, { layers, selected, lit, handles, jointSizes: wide }),
    [drawn, layout, layers, selected, lit, handles, wide],
  );
  const targets = useMemo(() => topsTargets(drawn, layout, scene), [drawn, layout, scene]);
  const drag = useTopsDrag();
  const edge = wide ? 72 : 24;
  const insets = { top: edge, left: edge, right: edge, bottom: wide ? 96 : edge + covered };
  const canvas = useViewport(scene.bounds, insets);
  useFocusOn(canvas, focus, insets);
  return (
    <View style={styles.fill}>
      <Canvas
        label="Tops from above"
        canvas={canvas}
        targets={mayEdit ? targets : targets.map((target) => ({ ...target, draggable: false }))}
        onTap={(id) => onSelect(id)}
        onFocusTarget={onSelect}
        onDragStart={(start) => {
          onSelect(start.target);
          drag.onDragStart(start);
        }}
        onDrag={drag.onDrag}
        onDragEnd={drag.onDragEnd}
        onDragCancel={drag.onDragCancel}
        onNudge={mayEdit ? drag.nudge : undefined}
        onKey={(key, target) => mayEdit && /^[0-9]$/.test(key) && props.onDigit(key, target)}
      >
        {(pxPerInch) => <Legible scene={scene} pxPerInch={pxPerInch} />}
      </Canvas>
      {before && (
        <View style={[styles.before, { top: wide ? 88 : space.m }]} role="status">
          <Text kind="label">{`The tops ${before.words}`}</Text>
        </View>
      )}
      {wide && (
        <View style={styles.controls}>
          <CanvasControls canvas={canvas} />
        </View>
      )}
    </View>
  );
}

/** The drawing with its words and sizes placed for this zoom, so that none lies on another. */
function Legible({ scene, pxPerInch }: { readonly scene: Scene; readonly pxPerInch: number }) {
  const placed = useMemo(() => legibleScene(scene, pxPerInch), [scene, pxPerInch]);
  return <PaintSvg scene={useStableScene(placed)} pxPerInch={pxPerInch} />;
}

function useFocusOn(canvas: CanvasView, focus: CanvasFocus | null, insets: Parameters<typeof fitView>[2]): void {
  const { setView, size } = canvas;
  useEffect(() => {
    if (!focus || focus.points.length === 0 || size.width === 0) return;
    const box = boundingBox(focus.points);
    const room = { minX: box.minX - AROUND, minY: box.minY - AROUND, maxX: box.maxX + AROUND, maxY: box.maxY + AROUND };
    setView(fitView(room, size, insets));
    // Only when asked: what the person moves afterwards stays.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [focus]);
}

const styles = StyleSheet.create({
  fill: { flex: 1, minHeight: 0, backgroundColor: color.paper },
  controls: { position: 'absolute', left: 20, bottom: 20 },
  before: {
    position: 'absolute',
    alignSelf: 'center',
    paddingHorizontal: space.m,
    paddingVertical: space.s,
    borderWidth: 1.5,
    borderColor: color.chalk,
    borderRadius: radius.control,
    backgroundColor: color.card,
  },
});
