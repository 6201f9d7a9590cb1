import { useState } from 'react';

import type { WorkStep } from '@/geometry/wood/arrange-work';
import { useOpenJob } from '../editor/JobProvider';
import { Button } from '../ui/Button';
import { Dialog } from '../ui/Dialog';
import { Field } from '../ui/Field';
import { Segmented } from '../ui/Segmented';
import { Text } from '../ui/Text';

/** What is asked about a step. */
export type StepQuestion =
  | { readonly kind: 'words'; readonly step: WorkStep }
  | { readonly kind: 'skip'; readonly step: WorkStep }
  /** `before` null: at the end. */
  | { readonly kind: 'add'; readonly before: WorkStep | null };

interface StepDialogProps {
  readonly question: StepQuestion;
  readonly onClose: () => void;
}

/** Words of a step, why it is left out, or a step of the crew's own. */
export function StepDialog({ question, onClose }: StepDialogProps) {
  if (question.kind === 'skip') return <SkipDialog step={question.step} onClose={onClose} />;
  return <WordsDialog question={question} onClose={onClose} />;
}

const hoursOf = (text: string): number | null => {
  const hours = Number(text.trim().replace(',', '.'));
  return text.trim() !== '' && Number.isFinite(hours) && hours >= 0 && hours <= 500 ? hours : null;
};

function WordsDialog({
  question,
  onClose,
}: {
  readonly question: Exclude<StepQuestion, { kind: 'skip' }>;
  readonly onClose: () => void;
}) {
  const { run } = useOpenJob();
  const old = question.kind === 'words' ? question.step : null;
  const [text, setText] = useState(old?.step ?? '');
  const [caution, setCaution] = useState(old?.caution ?? '');
  const [hours, setHours] = useState(String(Number((old?.hours ?? 0.5).toFixed(2))));
  const [part, setPart] = useState<'shop' | 'site'>(
    question.kind === 'add' ? (question.before?.part ?? 'site') : 'site',
  );
  const [tried, setTried] = useState(false);
  const [words, took] = [text.trim(), hoursOf(hours)];
  const save = () => {
    setTried(true);
    if (words === '' || took === null) return;
    const mind = caution.trim();
    const kept = old
      ? run(
          {
            kind: 'changeStep',
            step: old.key,
            change: {
              ...(words !== old.step && { text: words }),
              ...(mind !== (old.caution ?? '') && { caution: mind }),
              ...(took !== Number(old.hours.toFixed(2)) && { hours: took }),
            },
          },
          `words of ${old.step}`,
        )
      : run(
          {
            kind: 'addStep',
            item: {
              id: crypto.randomUUID(),
              text: words,
              part,
              hours: took,
              ...(mind !== '' && { caution: mind }),
              ...(question.kind === 'add' && question.before && { before: question.before.key }),
            },
          },
          `step ${words}`,
        );
    if (kept) onClose();
  };
  return (
    <Dialog
      open
      title={old ? 'Edit this step' : 'Add a step'}
      onClose={onClose}
      actions={
        <>
          <Button label="Leave it" onPress={onClose} />
          <Button label={old ? 'Keep the words' : 'Add the step'} look="primary" onPress={save} />
        </>
      }
    >
      <Field
        label="What is done"
        value={text}
        onChange={setText}
        maxLength={200}
        autoComplete="off"
        error={tried && words === '' ? 'Say what is done.' : undefined}
      />
      {!old && (
        <Segmented
          label="Where"
          options={[
            { value: 'shop', label: 'In the shop' },
            { value: 'site', label: 'On site' },
          ]}
          value={part}
          onChange={setPart}
        />
      )}
      <Field
        label="Hours of work"
        kind="decimal"
        value={hours}
        onChange={setHours}
        autoComplete="off"
        error={tried && took === null ? 'Type hours from 0 to 500, such as 0.5.' : undefined}
      />
      <Field
        label="What to mind"
        value={caution}
        onChange={setCaution}
        rowCount={3}
        maxLength={1000}
        autoComplete="off"
      />
    </Dialog>
  );
}

function SkipDialog({ step, onClose }: { readonly step: WorkStep; readonly onClose: () => void }) {
  const { run } = useOpenJob();
  const [reason, setReason] = useState('');
  const [tried, setTried] = useState(false);
  const words = reason.trim();
  const skip = () => {
    setTried(true);
    if (words === '') return;
    const edit = { kind: 'changeStep', step: step.key, change: { skipped: words } } as const;
    if (run(edit, `${step.step} left out`)) onClose();
  };
  return (
    <Dialog
      open
      title="Leave this step out"
      onClose={onClose}
      actions={
        <>
          <Button label="Keep it in" onPress={onClose} />
          <Button label="Leave it out" look="primary" onPress={skip} />
        </>
      }
    >
      <Text kind="strong">{step.step}</Text>
      <Text kind="second">It stays listed with your reason, and holds nothing up.</Text>
      <Field
        label="Reason"
        value={reason}
        onChange={setReason}
        rowCount={2}
        maxLength={500}
        autoComplete="off"
        error={tried && words === '' ? 'Say why, so that whoever comes next can follow.' : undefined}
      />
    </Dialog>
  );
}
