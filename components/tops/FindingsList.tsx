import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { acceptanceOf, isOpen } from '@/geometry/findings/acceptance';
import type { Finding } from '@/geometry/findings/types';
import { useMay, useSession } from '../api/use-session';
import { useOpenJob } from '../editor/JobProvider';
import { LengthWords } from '../measure/LengthWords';
import { Button } from '../ui/Button';
import { Dialog } from '../ui/Dialog';
import { Field } from '../ui/Field';
import { FindingRow, severityLooks } from '../ui/FindingRow';
import { Icon } from '../ui/Icon';
import { Text } from '../ui/Text';
import { space, typeRoles } from '../ui/tokens';

export interface FindingsListProps {
  /** Those to show; all of the plan when left out. */
  readonly findings?: readonly Finding[];
  readonly onZoom: (finding: Finding) => void;
}

/** What has to be fixed, looked at or known, worst first. A designer or owner may accept what is only to be looked at. */
export function FindingsList({ findings: some, onZoom }: FindingsListProps) {
  const { plan, layout, run, mayEdit } = useOpenJob();
  const signs = useMay('revision.sign');
  const [asked, setAsked] = useState<Finding | null>(null);
  const findings = some ?? plan.findings;
  if (findings.length === 0) return <Text kind="second">Nothing to look at.</Text>;
  const actions = (finding: Finding) => {
    if (!mayEdit || !signs || finding.severity !== 'warn') return undefined;
    return acceptanceOf(layout, finding).state === 'accepted' ? (
      <Button
        label="Take it back"
        height={44}
        onPress={() => run({ kind: 'acceptFinding', finding: finding.key, accepted: null }, 'finding open again')}
      />
    ) : (
      <Button label="Accept" spoken={`Accept: ${finding.text}`} height={44} onPress={() => setAsked(finding)} />
    );
  };
  return (
    <View role="list" aria-label="Findings">
      {findings.map((finding) => {
        const acceptance = acceptanceOf(layout, finding);
        const accepted = acceptance.state === 'accepted' ? acceptance.accepted : undefined;
        return (
          <View key={finding.key} role="listitem">
            <FindingRow
              severity={finding.severity}
              fact={<LengthWords text={finding.text} size={typeRoles.strong.size} bold />}
              act={<LengthWords text={finding.action} size={typeRoles.second.size} tone="ink2" />}
              pieces={finding.at.pieces}
              accepted={accepted && { by: accepted.by, reason: accepted.reason }}
              source={finding.source}
              before={acceptance.state === 'changed since' ? acceptance.accepted : undefined}
              onPress={() => onZoom(finding)}
              actions={actions(finding)}
            />
          </View>
        );
      })}
      {asked && <AcceptDialog finding={asked} onClose={() => setAsked(null)} />}
    </View>
  );
}

/** Asks why a finding is accepted; without a reason it is not. */
function AcceptDialog({ finding, onClose }: { readonly finding: Finding; readonly onClose: () => void }) {
  const { run } = useOpenJob();
  const { me } = useSession();
  const [reason, setReason] = useState('');
  const [error, setError] = useState<string | undefined>();
  const accept = () => {
    const words = reason.trim();
    if (words === '') return setError('Say why, so that whoever cuts it can follow.');
    const accepted = { reason: words, by: me?.name ?? '', at: new Date().toISOString(), text: finding.text };
    if (run({ kind: 'acceptFinding', finding: finding.key, accepted }, 'finding accepted')) onClose();
  };
  return (
    <Dialog
      open
      title="Accept this finding"
      onClose={onClose}
      actions={
        <>
          <Button label="Leave it open" onPress={onClose} />
          <Button label="Accept" look="primary" onPress={accept} />
        </>
      }
    >
      <Text kind="strong">{finding.text}</Text>
      <Text kind="second">It stays listed, with your name and your reason.</Text>
      <Field
        label="Reason"
        value={reason}
        onChange={setReason}
        error={error}
        rowCount={3}
        maxLength={2000}
        autoComplete="off"
      />
    </Dialog>
  );
}

/** How many of each kind there are, as signs with numbers; accepted ones are not counted. */
export function FindingCounts() {
  const { plan, layout } = useOpenJob();
  const open = plan.findings.filter((finding) => isOpen(layout, finding));
  return (
    <View style={styles.counts} role="img" aria-label={countWords(open)}>
      {(['stop', 'warn', 'note'] as const).map((severity) => {
        const count = open.filter((finding) => finding.severity === severity).length;
        if (count === 0) return null;
        const look = severityLooks[severity];
        return (
          <View key={severity} style={styles.count}>
            <Icon name={look.icon} tone={look.tone} size={22} />
            <Text kind="label" tone={look.tone} hidden>
              {String(count)}
            </Text>
          </View>
        );
      })}
    </View>
  );
}

const countWords = (findings: readonly Finding[]): string =>
  (['stop', 'warn', 'note'] as const)
    .map((severity) => `${severityLooks[severity].word} ${findings.filter((f) => f.severity === severity).length}`)
    .join(', ');

const styles = StyleSheet.create({
  counts: { flexDirection: 'row', gap: space.m },
  count: { flexDirection: 'row', alignItems: 'center', gap: space.xs },
});
