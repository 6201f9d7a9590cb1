import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { useStore } from 'zustand';

import type { WorkStep } from '@/geometry/wood/arrange-work';
import { useMay } from '../api/use-session';
import { useOpenJob } from '../editor/JobProvider';
import { Banner } from '../ui/Banner';
import { Button } from '../ui/Button';
import { Progress } from '../ui/Progress';
import { EmptyState } from '../ui/StateCard';
import { Text } from '../ui/Text';
import { useToast } from '../ui/ToastProvider';
import { space } from '../ui/tokens';
import { stepMenu } from './step-menu';
import { doneCount, stepState } from './step-state';
import { StepCard } from './StepCard';
import { StepDialog, type StepQuestion } from './StepDialog';
import { ticksWords, type TicksStore } from './ticks-store';
import { useNow } from './use-now';
import { useWorkSteps } from './use-work-steps';
import { WorkDays } from './WorkDays';

const PARTS = { shop: 'In the shop', site: 'On site' } as const;
const MINUTE_MS = 60_000;

/** The order of work: every step with its pieces, tools, cautions and days, to tick. */
export function StepsPart({ ticks }: { readonly ticks: TicksStore }) {
  const { mayEdit } = useOpenJob();
  const { steps, dated, ends } = useWorkSteps();
  const marks = useStore(ticks, (state) => state.marks);
  const [question, setQuestion] = useState<StepQuestion | null>(null);
  if (steps.length === 0)
    return (
      <EmptyState
        icon="tops"
        title="Nothing to make yet"
        body="Lay the tops, and the order of work follows from them."
      />
    );
  const { done, of } = doneCount(steps, marks);
  return (
    <View style={styles.part}>
      <WorkDays ends={ends} />
      <TicksNotice ticks={ticks} />
      <Text kind="label" live="polite">{`${done} of ${of} steps done`}</Text>
      <Progress label="Steps done" done={of === 0 ? 0 : done / of} />
      <View role="list" aria-label="Order of work" style={styles.part}>
        {steps.map((step, i) => (
          <View key={step.key} style={styles.step}>
            {step.part !== steps[i - 1]?.part && (
              <Text kind="sheetTitle" level={2}>
                {PARTS[step.part]}
              </Text>
            )}
            <OneStep {...{ step, steps, ticks }} number={i + 1} dated={dated.get(step.key)} ask={setQuestion} />
          </View>
        ))}
      </View>
      {mayEdit && (
        <View style={styles.add}>
          <Button label="Add a step" icon="plus" onPress={() => setQuestion({ kind: 'add', before: null })} />
        </View>
      )}
      {question && <StepDialog question={question} onClose={() => setQuestion(null)} />}
    </View>
  );
}

interface OneStepProps {
  readonly step: WorkStep;
  readonly steps: readonly WorkStep[];
  readonly ticks: TicksStore;
  readonly number: number;
  readonly dated: Parameters<typeof StepCard>[0]['dated'];
  readonly ask: (question: StepQuestion) => void;
}

function OneStep({ step, steps, ticks, number, dated, ask }: OneStepProps) {
  const { run, mayEdit } = useOpenJob();
  const mayTick = useMay('work.tick');
  const toast = useToast();
  const now = useNow(MINUTE_MS);
  const marks = useStore(ticks, (state) => state.marks);
  const act = useStore(ticks, (state) => state.act);
  const mark = marks[step.key];
  const state = stepState(step, steps, marks, now);
  const undo = () => {
    act(step.key, 'undo', 0);
    toast({ text: `Took back ${step.step}` });
  };
  return (
    <>
      <StepCard
        {...{ step, number, mark, dated, state, mayTick }}
        menu={stepMenu({
          ...{ step, steps, state, mayTick, mayEdit, ask, run },
          started: mark?.startedAt != null,
          act: (deed) => act(step.key, deed, step.waitHours),
        })}
        onTick={() => act(step.key, 'done', step.waitHours)}
        onUndo={undo}
      />
      {step.clock && state.kind === 'next' && !mark?.startedAt && mayTick && (
        <Button
          label={`Start the glue clock, ${step.clock.openMinutes} min`}
          spoken={`Start the glue clock of ${step.step}`}
          icon="clock"
          height={56}
          onPress={() => act(step.key, 'start', 0)}
        />
      )}
    </>
  );
}

function TicksNotice({ ticks }: { readonly ticks: TicksStore }) {
  const pending = useStore(ticks, (state) => state.pending);
  const sync = useStore(ticks, (state) => state.sync);
  const words = ticksWords({ pending, sync });
  if (words === null || words === 'Saving') return null;
  return <Banner icon={sync === 'refused' ? 'warn' : 'cloudoff'} fact={`${words}.`} act={ACTS[sync]} />;
}

const ACTS = {
  idle: '',
  sending: '',
  offline: 'They go out by themselves when there is signal.',
  refused: 'The server did not take them. Load the page again; they stay on this device.',
} as const;

const styles = StyleSheet.create({
  part: { gap: space.m, width: '100%', maxWidth: 1040 },
  step: { gap: space.m },
  add: { alignItems: 'flex-start' },
});
