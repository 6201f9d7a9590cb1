import { useMemo, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { G, Svg } from 'react-native-svg';

import { cornerScene } from '@/geometry/scene/room/corner-scene';
import { PaintSvg } from '../canvas/paint-svg';
import { fitView } from '../canvas/viewport';
import { useOpenJob } from '../editor/JobProvider';
import { color } from '../ui/tokens';
import { triangleAngle } from './corner-marks';
import type { CornerCheck } from './use-corner-check';

/** px around the corner for blades and letters. */
const INSETS = { top: 62, right: 72, bottom: 16, left: 76 };

/** The corner as it lies in the room, its two marks and the tape between them. */
export function CornerPicture({ check, height }: { readonly check: CornerCheck; readonly height?: number }) {
  const { layout, drawn } = useOpenJob();
  const [size, setSize] = useState({ width: 0, height: 0 });
  const [a, b] = check.marks;
  const nominal = check.corner?.nominal ?? 90;
  const bearing = drawn.room?.walls.find((w) => w.id === check.target.between[0])?.bearing ?? 0;
  const angleDeg = (check.live === null ? null : triangleAngle(a, b, check.live, nominal)) ?? nominal;
  const scene = useMemo(
    () => cornerScene({ labels: check.labels, a, b, c: check.live, angleDeg, bearing, step: layout.step }),
    [check.labels, a, b, check.live, angleDeg, bearing, layout.step],
  );
  const view = fitView(scene.bounds, size, INSETS);
  return (
    <View
      role="img"
      aria-label={scene.alt}
      style={[styles.picture, height === undefined ? styles.fill : { height }]}
      onLayout={({ nativeEvent }) => setSize(nativeEvent.layout)}
    >
      {size.width > 0 && (
        <Svg width={size.width} height={size.height} aria-hidden>
          <G transform={`translate(${view.x} ${view.y})`}>
            <PaintSvg scene={scene} pxPerInch={view.scale} />
          </G>
        </Svg>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  picture: { backgroundColor: color.paper, overflow: 'hidden' },
  fill: { flex: 1, minHeight: 0 },
});
