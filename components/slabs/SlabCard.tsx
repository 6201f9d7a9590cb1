import { memo, useMemo } from 'react';
import { StyleSheet, View } from 'react-native';
import Svg, { G } from 'react-native-svg';

import type { Layout } from '@/geometry/core/layout';
import type { Plan } from '@/geometry/plan/types';
import { placeSlab } from '@/geometry/scene/slab/placed-slab';
import { slabScene } from '@/geometry/scene/slab/slab-scene';
import { PaintSvg } from '../canvas/paint-svg';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { slabSize } from './slab-words';

export interface SlabCardProps {
  readonly plan: Plan;
  readonly layout: Layout;
  readonly index: number;
  /** The same for all slabs, so that lengths compare. */
  readonly pxPerInch: number;
  readonly showPrice: boolean;
}

/** px round the drawing for shared cuts that reach past the slab and their words. */
const AROUND = 30;

/** One slab to scale with what is cut from it. */
export const SlabCard = memo(function SlabCard({ plan, layout, index, pxPerInch, showPrice }: SlabCardProps) {
  const slab = useMemo(() => placeSlab(plan, layout, index), [plan, layout, index]);
  const scene = useMemo(() => slabScene(plan, layout, index), [plan, layout, index]);
  const width = slab.length * pxPerInch + 2 * AROUND;
  const height = slab.depth * pxPerInch + 2 * AROUND;
  const name = slab.name[0]!.toUpperCase() + slab.name.slice(1);
  const letters = slab.pieces.map((p) => `${p.letter}${p.faceDown ? ' face down' : ''}`).join(', ');
  return (
    <View style={styles.card} role="listitem" aria-label={`${name}: ${letters}, ${slab.cuts.length} saw cuts`}>
      <View style={[styles.head, { width: Math.max(width - 2 * AROUND, 200) }]}>
        <Text kind="rowTitle" level={3}>
          {name}
        </Text>
        <Text kind="second">{slabSize(slab, layout, showPrice)}</Text>
      </View>
      <View style={{ marginLeft: -AROUND, marginTop: -AROUND / 2 }} aria-hidden>
        <Svg width={width} height={height}>
          <G transform={`translate(${AROUND} ${AROUND + slab.depth * pxPerInch})`}>
            <PaintSvg scene={scene} pxPerInch={pxPerInch} />
          </G>
        </Svg>
      </View>
    </View>
  );
});

const styles = StyleSheet.create({
  card: { alignSelf: 'flex-start' },
  head: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    justifyContent: 'space-between',
    alignItems: 'baseline',
    columnGap: space.m,
  },
});
