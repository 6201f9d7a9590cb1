import { memo } from 'react';
import { View } from 'react-native';
import Svg from 'react-native-svg';

import type { Scene } from '@/geometry/scene/display-list';
import { PAPER_SIZE, type Paper } from '@/geometry/scene/paper/sheet-head';
import { PaintSvg } from '../canvas/paint-svg';

export interface SheetPageProps {
  readonly scene: Scene;
  readonly paper: Paper;
  /** px of the page on screen. */
  readonly width: number;
}

/** px an inch on paper: type and lines have their true size there. */
const PAPER_PX = 96;

/** One page as it will be printed: the same drawing, made smaller as a whole. */
export const SheetPage = memo(function SheetPage({ scene, paper, width }: SheetPageProps) {
  const page = scene.paper ?? PAPER_SIZE[paper];
  const height = (width * page.height) / page.width;
  return (
    <View
      role="img"
      aria-label={scene.alt ?? 'A page of the cut sheets'}
      style={{ width, height, backgroundColor: '#fff', borderWidth: 1.5, borderColor: '#14202E' }}
    >
      <Svg width={width} height={height} viewBox={`0 0 ${page.width * PAPER_PX} ${page.height * PAPER_PX}`}>
        <PaintSvg scene={scene} pxPerInch={PAPER_PX} />
      </Svg>
    </View>
  );
});
