import { useRouter } from 'expo-router';
import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { inches } from '@/geometry/top/sentence';
import { useMay } from '../api/use-session';
import { useOpenJob } from '../editor/JobProvider';
import { JobFrame } from '../shell/JobFrame';
import { useReachStage } from '../shell/use-reach-stage';
import { Button } from '../ui/Button';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';
import { useWide } from '../ui/use-wide';
import { PlanSummary } from './PlanSummary';
import { SlabCard } from './SlabCard';
import { SlabLegend } from './SlabLegend';
import { SlabsState } from './SlabsState';

/** Job > Slabs: what is cut from what, and how good the plan is. */
export function SlabsScreen() {
  const router = useRouter();
  const wide = useWide();
  const { job, layout, plan } = useOpenJob();
  const seesPrices = useMay('price.see');
  const [width, setWidth] = useState(0);
  const slabs = plan.nest?.slabs ?? [];
  const longest = Math.max(
    1,
    ...slabs.map((slab) => plan.instance.stock.find((s) => s.id === slab.stock)?.length ?? 1),
  );
  const pxPerInch = Math.min(8, Math.max(1.5, (width - 8) / longest));
  const reach = useReachStage();
  const toSheets = () => {
    reach('drawn');
    router.navigate(`/jobs/${job.id}/sheets` as never);
  };
  const count = `${plan.instance.parts.length} pieces on ${slabs.length} ${slabs.length === 1 ? 'slab' : 'slabs'}`;
  const next = (
    <Button
      label="Make the sheets"
      look={slabs.length > 0 ? 'primary' : 'secondary'}
      iconAfter="next"
      wide={!wide}
      height={wide ? 48 : 56}
      disabled={slabs.length === 0}
      onPress={toSheets}
    />
  );
  return (
    <JobFrame
      subtitle={slabs.length > 0 ? count : 'Slabs'}
      primary={next}
      footer={wide ? undefined : <View style={styles.foot}>{next}</View>}
    >
      <SlabsState />
      {slabs.length > 0 && (
        <View style={[styles.body, wide && styles.row]}>
          <View style={styles.slabs} onLayout={(event) => setWidth(event.nativeEvent.layout.width)}>
            {width > 0 && (
              <View role="list" aria-label="Slabs" style={styles.list}>
                {slabs.map((_, index) => (
                  <SlabCard
                    key={index}
                    plan={plan}
                    layout={layout}
                    index={index}
                    pxPerInch={pxPerInch}
                    showPrice={seesPrices}
                  />
                ))}
              </View>
            )}
            <Text kind="second">{`Kerf ${inches(layout.stock.kerf, layout.step)}, already in every mark.`}</Text>
          </View>
          <View style={wide ? styles.side : styles.below}>
            <PlanSummary />
            <SlabLegend />
          </View>
        </View>
      )}
    </JobFrame>
  );
}

const styles = StyleSheet.create({
  body: { gap: space.l },
  row: { flexDirection: 'row', alignItems: 'flex-start', gap: space.xxl },
  slabs: { flexGrow: 1, flexShrink: 1, minWidth: 0, gap: space.m },
  list: { gap: space.s },
  side: { width: 372, gap: space.l },
  below: { gap: space.l },
  foot: { padding: space.m, backgroundColor: color.paper },
});
