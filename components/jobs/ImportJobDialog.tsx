import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useRef, useState, type ChangeEvent } from 'react';
import { View } from 'react-native';

import { importJob } from '@/shared/contracts/job-files';
import type { Job } from '@/shared/contracts/jobs';
import { call } from '../api/client';
import { jobKeys } from '../api/use-jobs';
import { fetchJobScreens } from '../shell/use-job-screens';
import { Button } from '../ui/Button';
import { Dialog } from '../ui/Dialog';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import type { FileReading, JobFilePreview } from './job-file-preview';

export interface ImportJobDialogProps {
  readonly onClose: () => void;
  readonly onMade: (job: Job) => void;
}

interface Shown {
  readonly name: string;
  readonly reading: FileReading;
  readonly Preview: typeof JobFilePreview;
}

/** A job from a job file: drawn and counted before it is opened, or every place named where the file is wrong. */
export function ImportJobDialog({ onClose, onMade }: ImportJobDialogProps) {
  const input = useRef<HTMLInputElement>(null);
  const [shown, setShown] = useState<Shown | null>(null);
  const [key, setKey] = useState(() => crypto.randomUUID());
  const client = useQueryClient();
  const open = useMutation({
    mutationFn: (file: unknown) => call(importJob, { body: { file }, idempotencyKey: key }),
    onSuccess: (job) => {
      void client.invalidateQueries({ queryKey: jobKeys.all });
      onMade(job);
    },
  });
  const read = async (event: ChangeEvent<HTMLInputElement>) => {
    const file = event.target.files?.[0];
    event.target.value = '';
    if (!file) return;
    // What reads and draws a job is fetched when somebody brings a file.
    const { readJobFile, JobFilePreview: Preview } = await fetchJobScreens();
    setKey(crypto.randomUUID());
    open.reset();
    setShown({ name: file.name, reading: readJobFile(await file.text()), Preview });
  };
  const reading = shown?.reading;
  return (
    <Dialog
      open
      title="Open a job file"
      onClose={onClose}
      actions={
        <>
          <Button label={shown ? 'Another file' : 'Choose a file'} onPress={() => input.current?.click()} />
          {reading?.ok && (
            <Button
              label="Open as a new job"
              look="primary"
              busy={open.isPending}
              onPress={() => open.mutate(reading.json)}
            />
          )}
        </>
      }
    >
      <input
        ref={input}
        type="file"
        accept=".json,application/json"
        aria-label="Job file"
        style={{ display: 'none' }}
        onChange={(event) => void read(event)}
      />
      <View style={{ gap: space.m }}>
        {!shown && (
          <Text>
            A job that was saved as a file, here or by another shop. Nothing is stored before you have seen it.
          </Text>
        )}
        {shown && reading?.ok && <shown.Preview reading={reading} />}
        {shown && reading && !reading.ok && (
          <>
            <Text kind="strong" tone="red">{`${shown.name} cannot be opened. Nothing was stored.`}</Text>
            {reading.problems.map((problem) => (
              <Text key={problem}>{problem}</Text>
            ))}
          </>
        )}
        {open.error && (
          <Text kind="strong" tone="red">
            {open.error.message}
          </Text>
        )}
      </View>
    </Dialog>
  );
}
