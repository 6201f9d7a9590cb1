import { StyleSheet, View } from 'react-native';

import type { Finding } from '@/geometry/findings/types';
import { useOpenJob } from '../editor/JobProvider';
import { FindingRow } from '../ui/FindingRow';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';

export interface FindingsListProps {
  readonly onZoom: (finding: Finding) => void;
}

/** What has to be fixed, looked at or known, worst first. */
export function FindingsList({ onZoom }: FindingsListProps) {
  const { plan, layout } = useOpenJob();
  if (plan.findings.length === 0) return <Text kind="second">Nothing to look at.</Text>;
  return (
    <View role="list" aria-label="Findings" style={styles.list}>
      {plan.findings.map((finding) => {
        const accepted = layout.accepted[finding.key];
        return (
          <View key={finding.key} role="listitem">
            <FindingRow
              severity={finding.severity}
              fact={finding.text}
              act={finding.action}
              pieces={finding.at.pieces}
              accepted={accepted && { by: accepted.by, reason: accepted.reason }}
              onPress={() => onZoom(finding)}
            />
          </View>
        );
      })}
    </View>
  );
}

/** The drawing's name for the place of a finding, or null when it has none there. */
export function placeOf(finding: Finding): string | null {
  const { at } = finding;
  if (at.cutout) return `cutout ${at.cutout}`;
  if (at.joint) return `joint ${at.joint.join('-')}`;
  const [piece] = at.pieces ?? [];
  return piece ? `piece ${piece}` : null;
}

const styles = StyleSheet.create({ list: { gap: space.xs } });
