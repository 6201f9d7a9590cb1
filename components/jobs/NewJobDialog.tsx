import { useRef, useState } from 'react';

import type { Job } from '@/shared/contracts/jobs';
import { ApiError } from '../api/api-problem';
import { useCreateJob } from '../api/use-jobs';
import { Button } from '../ui/Button';
import { Dialog } from '../ui/Dialog';
import { Field } from '../ui/Field';

export interface NewJobDialogProps {
  readonly open: boolean;
  readonly onClose: () => void;
  readonly onMade: (job: Job) => void;
  /** Opens a job file instead. */
  readonly onFile: () => void;
}

/** A new job in three fields; only the name has to be typed. */
export function NewJobDialog({ open, onClose, onMade, onFile }: NewJobDialogProps) {
  const [name, setName] = useState('');
  const [customerName, setCustomer] = useState('');
  const [siteAddress, setAddress] = useState('');
  const [tried, setTried] = useState(false);
  // One key for this job: pressing twice, or sending again after a lost answer, makes it once.
  const key = useRef<string | null>(null);
  const create = useCreateJob();
  const submit = () => {
    setTried(true);
    if (!name.trim() || create.isPending) return;
    key.current ??= crypto.randomUUID();
    create.mutate(
      { name, customerName, siteAddress, key: key.current },
      {
        onSuccess: (job) => {
          key.current = null;
          setName('');
          setCustomer('');
          setAddress('');
          setTried(false);
          onClose();
          onMade(job);
        },
      },
    );
  };
  const failed = create.error instanceof ApiError ? create.error.message : undefined;
  return (
    <Dialog
      open={open}
      title="New job"
      onClose={onClose}
      actions={
        <>
          <Button label="From a job file" onPress={onFile} />
          <Button label="Cancel" onPress={onClose} />
          <Button label="Start measuring" look="primary" busy={create.isPending} onPress={submit} />
        </>
      }
    >
      <Field
        label="Name of the job"
        placeholder="Scullery at Alder Lane"
        value={name}
        onChange={setName}
        onSubmit={submit}
        maxLength={120}
        autoFocus
        error={tried && !name.trim() ? 'Give the job a name, so that the crew finds it.' : failed}
      />
      <Field
        label="Customer"
        autoComplete="off"
        value={customerName}
        onChange={setCustomer}
        onSubmit={submit}
        maxLength={120}
      />
      <Field
        label="Site address"
        autoComplete="off"
        value={siteAddress}
        onChange={setAddress}
        onSubmit={submit}
        maxLength={300}
      />
    </Dialog>
  );
}
