import { useMemo } from 'react';
import { StyleSheet, View } from 'react-native';

import { perspectiveScene } from '@/geometry/scene/perspective/perspective-scene';
import { Canvas } from '../canvas/Canvas';
import { CanvasControls } from '../canvas/CanvasControls';
import { PaintSvg } from '../canvas/paint-svg';
import { useStableScene } from '../canvas/use-stable-scene';
import { useViewport } from '../canvas/use-viewport';
import { useOpenJob } from '../editor/JobProvider';
import { color } from '../ui/tokens';
import { useWide } from '../ui/use-wide';

/** The finished tops as somebody in the room would see them, from the plan's own numbers. */
export function PictureView({ covered }: { readonly covered: number }) {
  const wide = useWide();
  const { drawn, layout } = useOpenJob();
  const scene = useStableScene(useMemo(() => perspectiveScene(drawn, layout), [drawn, layout]));
  const edge = wide ? 40 : 12;
  const canvas = useViewport(scene.bounds, { top: edge, left: edge, right: edge, bottom: edge + covered });
  return (
    <View style={styles.fill}>
      <Canvas label={scene.alt ?? 'Picture of the tops'} canvas={canvas} targets={[]} onTap={() => undefined}>
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
  fill: { flex: 1, minHeight: 0, backgroundColor: color.card },
  controls: { position: 'absolute', left: 20, bottom: 20 },
});
