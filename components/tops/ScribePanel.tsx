import { StyleSheet, View } from 'react-native';

import { roundLength } from '@/geometry/tape/format-length';
import { inches as say } from '@/geometry/top/sentence';
import { useOpenJob } from '../editor/JobProvider';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';

/** What the bow of the wall means for one run: the gap at every station and what is taken off there. */
export function ScribePanel({ run }: { readonly run: string }) {
  const { layout, plan } = useOpenJob();
  const scribe = plan.wallFit.scribes.find((one) => one.run === run);
  if (!scribe) return null;
  const { step, fixing } = layout;
  const size = (inches: number) => say(inches, step);
  return (
    <View style={styles.panel}>
      <Text kind="label" level={3}>
        Against the bowed wall
      </Text>
      <Text kind="small">
        {roundLength(scribe.takeOff, step) > 0
          ? `Take up to ${size(scribe.takeOff)} off the back edge; the top moves back ${size(scribe.shift)} and keeps ${size(scribe.depthLeft)} of depth.`
          : `Nothing to scribe: the widest gap is ${size(scribe.largestGap)}, the backsplash covers ${size(fixing.backsplash)}.`}
      </Text>
      <View role="table" aria-label="Gap and scribe at every station">
        <Row header cells={['Along', 'Gap', 'Take off']} />
        {scribe.stations.map(({ at, gap, takeOff }) => (
          <Row key={at} cells={[size(at), size(gap), roundLength(takeOff, step) > 0 ? size(takeOff) : 'nothing']} />
        ))}
      </View>
    </View>
  );
}

function Row({ cells, header = false }: { readonly cells: readonly string[]; readonly header?: boolean }) {
  return (
    <View role="row" style={styles.row}>
      {cells.map((cell, i) => (
        <View key={i} role={header ? 'columnheader' : 'cell'} style={styles.cell}>
          <Text kind={header ? 'small' : 'body'}>{cell}</Text>
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  panel: { gap: space.s },
  row: { flexDirection: 'row', gap: space.m, minHeight: 36, alignItems: 'center', borderBottomWidth: 1, borderBottomColor: color.line }, // prettier-ignore
  cell: { flex: 1, minWidth: 0 },
});
