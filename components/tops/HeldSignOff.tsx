import { StyleSheet, View } from 'react-native';

import type { Finding } from '@/geometry/findings/types';
import { useOpenJob } from '../editor/JobProvider';
import { Button } from '../ui/Button';
import { Icon } from '../ui/Icon';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';

/** Says that the sign-off is held, and shows why; nothing while it is not. */
export function HeldSignOff({ onShow }: { readonly onShow: (finding: Finding) => void }) {
  const { plan } = useOpenJob();
  const stops = plan.findings.filter((finding) => finding.severity === 'stop');
  const [first] = stops;
  if (!first) return null;
  const count = stops.length === 1 ? '1 finding must be fixed.' : `${stops.length} findings must be fixed.`;
  return (
    <View role="status" style={styles.bar}>
      <Icon name="warn" tone="red" />
      <View style={styles.words}>
        <Text>
          <Text kind="strong">Sign-off is held.</Text> {count}
        </Text>
      </View>
      <Button label="Show" spoken="Show what holds the sign-off" onPress={() => onShow(first)} />
    </View>
  );
}

const styles = StyleSheet.create({
  bar: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.m,
    marginHorizontal: -20,
    marginBottom: -20,
    marginTop: -space.s,
    padding: space.l,
    borderTopWidth: 2,
    borderTopColor: color.red,
    backgroundColor: color.redT,
  },
  words: { flex: 1, minWidth: 0 },
});
