import { useMemo } from 'react';
import { StyleSheet, View } from 'react-native';

import { topsScene, type TopsLayers } from '@/geometry/scene/tops/tops-scene';
import { Canvas } from '../canvas/Canvas';
import { CanvasControls } from '../canvas/CanvasControls';
import { PaintSvg } from '../canvas/paint-svg';
import { useViewport } from '../canvas/use-viewport';
import { useOpenJob } from '../editor/JobProvider';
import { color } from '../ui/tokens';
import { useWide } from '../ui/use-wide';
import { topsTargets } from './tops-targets';
import { useTopsDrag } from './use-tops-drag';

export interface TopsCanvasProps {
  readonly selected: string | null;
  readonly onSelect: (name: string | null) => void;
  readonly layers: TopsLayers;
  /** px the bottom sheet covers. */
  readonly covered: number;
}

/** The tops from above; seams and cutouts slide under the finger. */
export function TopsCanvas({ selected, onSelect, layers, covered }: TopsCanvasProps) {
  const wide = useWide();
  const { drawn, layout, mayEdit } = useOpenJob();
  const scene = useMemo(
    () => topsScene(drawn, layout, { layers, selected, handles: mayEdit }),
    [drawn, layout, layers, selected, mayEdit],
  );
  const targets = useMemo(() => topsTargets(drawn, layout, scene), [drawn, layout, scene]);
  const drag = useTopsDrag();
  const edge = wide ? 56 : 24;
  const canvas = useViewport(scene.bounds, { top: edge, left: edge, right: edge, bottom: edge + covered });
  return (
    <View style={styles.fill}>
      <Canvas
        label="Tops from above"
        canvas={canvas}
        targets={mayEdit ? targets : targets.map((target) => ({ ...target, draggable: false }))}
        onTap={(id) => onSelect(id)}
        onFocusTarget={onSelect}
        onDragStart={({ target }) => onSelect(target)}
        onDrag={drag.onDrag}
        onDragEnd={drag.onDragEnd}
        onDragCancel={drag.onDragCancel}
        onNudge={mayEdit ? drag.nudge : undefined}
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
