import { Svg } from 'react-native-svg';

import type { Point } from '@/geometry/core/point';
import type { Scene } from '@/geometry/scene/display-list';
import { PaintSvg } from './paint-svg';

export interface WoodSwatchProps {
  readonly species: string;
  /** px */
  readonly width?: number;
  readonly height?: number;
  /** Share of the left and the right end that an angled cut takes off, as a run over the whole height, px. */
  readonly slant?: { readonly left: number; readonly right: number };
}

const PX_PER_INCH = 4;

/** A bit of a wood with its staves and figure; the wood is always named in words beside it. */
export function WoodSwatch({ species, width = 48, height = 28, slant }: WoodSwatchProps) {
  const [w, h] = [width / PX_PER_INCH, height / PX_PER_INCH];
  const [left, right] = [(slant?.left ?? 0) / PX_PER_INCH, (slant?.right ?? 0) / PX_PER_INCH];
  const outline: readonly Point[] = [
    [Math.max(0, -left), -h],
    [w - Math.max(0, -right), -h],
    [w - Math.max(0, right), 0],
    [Math.max(0, left), 0],
  ];
  const scene: Scene = {
    bounds: { minX: 0, minY: -h, maxX: w, maxY: 0 },
    items: [
      { layer: 'staves', kind: 'staves', outline, along: [1, 0], origin: [0, -h], width: 1.75, species, seed: species },
      { layer: 'staves', kind: 'polygon', outline, stroke: { ink: 'ink', width: 2 } },
    ],
  };
  return (
    <Svg width={width} height={height} aria-hidden>
      <PaintSvg scene={scene} pxPerInch={PX_PER_INCH} />
    </Svg>
  );
}
