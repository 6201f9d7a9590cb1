import { useMemo } from 'react';
import { StyleSheet, View } from 'react-native';

import { roomScene } from '@/geometry/scene/room/room-scene';
import { Canvas } from '../canvas/Canvas';
import { CanvasControls } from '../canvas/CanvasControls';
import { PaintSvg } from '../canvas/paint-svg';
import { useViewport } from '../canvas/use-viewport';
import { useOpenJob } from '../editor/JobProvider';
import { color } from '../ui/tokens';
import { useWide } from '../ui/use-wide';
import { roomTargets } from './room-targets';
import { observationOf, targetOf } from './tape-walk';
import type { RoomView } from './use-room-view';

export interface RoomCanvasProps {
  readonly view: RoomView;
  /** px the bottom sheet covers. */
  readonly covered: number;
  /** A digit typed on a selected target opens its blade. */
  readonly onDigit: (key: string) => void;
}

/** The room to scale, its readings on it. */
export function RoomCanvas({ view, covered, onDigit }: RoomCanvasProps) {
  const wide = useWide();
  const { drawn, layout } = useOpenJob();
  const selected = view.selected ? observationOf(view.selected) : null;
  const scene = useMemo(() => roomScene(drawn, layout, { selected }), [drawn, layout, selected]);
  const targets = useMemo(() => roomTargets(drawn, layout, scene), [drawn, layout, scene]);
  const edge = wide ? 96 : 76;
  const canvas = useViewport(scene.bounds, { top: edge, left: edge, right: edge, bottom: edge + covered });
  return (
    <View style={styles.fill}>
      <Canvas
        label="Plan of the room"
        canvas={canvas}
        targets={targets}
        onTap={(id) => {
          const target = id === null ? null : targetOf(layout, id);
          if (target && selected === id) view.open(target);
          else view.select(target);
        }}
        onFocusTarget={(id) => view.select(targetOf(layout, id))}
        onKey={(key, id) => {
          const target = targetOf(layout, id);
          if (!target || !/^[0-9]$/.test(key)) return false;
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

const styles = StyleSheet.create({
  fill: { flex: 1, minHeight: 0, backgroundColor: color.paper },
  controls: { position: 'absolute', left: 20, bottom: 20 },
});
