import { useRef, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { useStore } from 'zustand';

import type { RevisionSummary } from '@/shared/contracts/revisions';
import { ApiError } from '../api/api-problem';
import { useFreeze, useSignOff } from '../api/use-sheets';
import { useMay } from '../api/use-session';
import { useOpenJob } from '../editor/JobProvider';
import { Banner } from '../ui/Banner';
import { Button } from '../ui/Button';
import { Chips } from '../ui/Segmented';
import { useToast } from '../ui/ToastProvider';
import { space } from '../ui/tokens';

export interface RevisionBarProps {
  readonly revisions: readonly RevisionSummary[];
  readonly which: number | 'draft';
  readonly onWhich: (which: number | 'draft') => void;
}

/** Which revision is shown; freezing a new one; signing it off; and the warning where sheets are no longer true. */
export function RevisionBar({ revisions, which, onWhich }: RevisionBarProps) {
  const { job, plan, store } = useOpenJob();
  const toast = useToast();
  const mayFreeze = useMay('revision.freeze');
  const maySign = useMay('revision.sign');
  const freeze = useFreeze(job.id);
  const sign = useSignOff(job.id);
  const seq = useStore(store, (state) => state.base);
  const pending = useStore(store, (state) => state.pending.length);
  const key = useRef<string | null>(null);
  const [error, setError] = useState<string | null>(null);
  const newest = revisions[0];
  const shown = revisions.find((revision) => revision.number === which);
  const changed = newest !== undefined && newest.layoutSeq < seq;
  const stops = plan.findings.filter((finding) => finding.severity === 'stop');
  const failed = (problem: Error) =>
    setError(problem instanceof ApiError ? problem.message : 'It did not work. Try again.');

  const freezeNow = () => {
    setError(null);
    key.current ??= crypto.randomUUID();
    freeze.mutate(
      { seq, nest: plan.nest, note: '', key: key.current },
      {
        onSuccess: (revision) => {
          key.current = null;
          onWhich(revision.number);
          toast({ text: `Revision ${revision.number} is frozen.` });
        },
        onError: (problem) => {
          key.current = null;
          failed(problem);
        },
      },
    );
  };
  const options = [
    ...revisions.slice(0, 6).map((revision) => ({
      value: String(revision.number),
      label: `Revision ${revision.number}${revision.signedOff ? ', signed off' : ''}`,
    })),
    { value: 'draft', label: 'Draft' },
  ];
  return (
    <View style={styles.bar}>
      <Chips
        label="Which sheets"
        options={options}
        value={String(which)}
        onChange={(next) => onWhich(next === 'draft' ? 'draft' : Number(next))}
      />
      {changed && (
        <Banner
          look="attention"
          icon="look"
          fact={`Changed since revision ${newest.number}.`}
          act="Its sheets are no longer true. Freeze a new revision before anything is cut."
        />
      )}
      {error && <Banner look="attention" icon="warn" fact="Not done." act={error} />}
      <View style={styles.buttons}>
        {mayFreeze && which === 'draft' && (
          <Button
            label={`Freeze revision ${(newest?.number ?? 0) + 1}`}
            busy={freeze.isPending}
            disabled={pending > 0 || plan.nest === null}
            onPress={freezeNow}
          />
        )}
        {maySign && shown && !shown.signedOff && !shown.sentBack && shown.number === newest?.number && (
          <Button
            label={
              stops.length > 0 && !changed
                ? `Sign-off is held: ${stops.length} must be fixed`
                : `Sign off revision ${shown.number}`
            }
            icon="check"
            busy={sign.isPending}
            disabled={stops.length > 0 && !changed}
            onPress={() => {
              setError(null);
              sign.mutate(shown.number, {
                onSuccess: () => toast({ text: `Revision ${shown.number} is signed off.` }),
                onError: failed,
              });
            }}
          />
        )}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  bar: { gap: space.m },
  buttons: { flexDirection: 'row', flexWrap: 'wrap', gap: space.m },
});
