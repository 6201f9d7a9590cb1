import { memo } from 'react';
import { StyleSheet, View } from 'react-native';
import Svg, { Polygon, Polyline } from 'react-native-svg';

import { boundingBox } from '@/geometry/core/polygon';
import type { Thumbnail } from '@/shared/contracts/jobs';
import { Icon } from '../ui/Icon';
import { color } from '../ui/tokens';

export interface JobThumbnailProps {
  readonly thumbnail: Thumbnail | null;
  /** Taped and no top drawn yet, or not even that: dashed. */
  readonly dashed: boolean;
  /** px */
  readonly width: number;
  readonly height: number;
}

const INSET = 6;

/** The job's tops (or its walls until there are any) in outline, to scale. Said in words beside it, so hidden from screen readers. */
export const JobThumbnail = memo(function JobThumbnail({ thumbnail, dashed, width, height }: JobThumbnailProps) {
  const rings = thumbnail ? (thumbnail.pieces.length > 0 ? thumbnail.pieces : [thumbnail.walls]) : [];
  const points = rings.flat();
  if (points.length < 2) {
    return (
      <View style={[styles.box, { width, height }]} aria-hidden>
        <Icon name="room" tone="edge" size={28} />
      </View>
    );
  }
  const box = boundingBox(points);
  const pxPerInch = Math.min(
    (width - 2 * INSET) / Math.max(box.maxX - box.minX, 1),
    (height - 2 * INSET) / Math.max(box.maxY - box.minY, 1),
  );
  const left = (width - (box.maxX - box.minX) * pxPerInch) / 2;
  const top = (height - (box.maxY - box.minY) * pxPerInch) / 2;
  const path = (ring: readonly (readonly [number, number])[]) =>
    ring
      .map(
        ([x, y]) =>
          `${(left + (x - box.minX) * pxPerInch).toFixed(1)},${(top + (box.maxY - y) * pxPerInch).toFixed(1)}`,
      )
      .join(' ');
  const stroke = { stroke: color.ink, strokeWidth: 1.6, strokeDasharray: dashed ? '3 3' : undefined };
  return (
    <View style={{ width, height }} aria-hidden>
      <Svg width={width} height={height}>
        {thumbnail!.pieces.length > 0 || thumbnail!.closed
          ? rings.map((ring, i) => (
              <Polygon
                key={i}
                points={path(ring)}
                fill={dashed ? 'none' : '#E5CD9E'}
                strokeLinejoin="miter"
                {...stroke}
              />
            ))
          : rings.map((ring, i) => <Polyline key={i} points={path(ring)} fill="none" {...stroke} />)}
      </Svg>
    </View>
  );
});

const styles = StyleSheet.create({
  box: { alignItems: 'center', justifyContent: 'center' },
});
