import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { useCrew } from '../api/use-crew';
import { useMailSheets } from '../api/use-sheet-acts';
import { Button } from '../ui/Button';
import { Dialog } from '../ui/Dialog';
import { Field } from '../ui/Field';
import { Select } from '../ui/Select';
import { Text } from '../ui/Text';
import { useToast } from '../ui/ToastProvider';
import { space } from '../ui/tokens';

export interface MailDialogProps {
  readonly jobId: string;
  readonly revision: number;
  readonly onClose: () => void;
}

/** Mails somebody of the crew the way to the sheets of a revision. */
export function MailDialog({ jobId, revision, onClose }: MailDialogProps) {
  const crew = useCrew();
  const mail = useMailSheets(jobId);
  const toast = useToast();
  const [to, setTo] = useState<string | null>(null);
  const [note, setNote] = useState('');
  const [asked, setAsked] = useState(false);
  const [key] = useState(() => crypto.randomUUID());
  const send = () => {
    setAsked(true);
    if (to === null) return;
    mail.mutate(
      { key, personId: to, revision, note },
      {
        onSuccess: ({ sentTo }) => {
          toast({ text: `A mail is on its way to ${sentTo}` });
          onClose();
        },
      },
    );
  };
  const people = crew.data?.members.map(({ personId, name }) => ({ value: personId, label: name })) ?? [];
  return (
    <Dialog
      open
      title={`Mail revision ${revision}`}
      onClose={onClose}
      actions={<Button label="Send" icon="mail" look="primary" busy={mail.isPending} onPress={send} />}
    >
      <View style={styles.fields}>
        <Select
          label="To"
          options={people}
          value={to}
          placeholder="Somebody of the crew"
          error={asked && to === null ? 'Choose who gets it.' : undefined}
          onChange={setTo}
        />
        <Field label="Note" value={note} rowCount={3} maxLength={1000} onChange={setNote} />
        <Text kind="second">The mail holds a link to these sheets; whoever opens it signs in first.</Text>
        {mail.error && (
          <Text kind="strong" tone="red">
            {mail.error.message}
          </Text>
        )}
      </View>
    </Dialog>
  );
}

const styles = StyleSheet.create({ fields: { gap: space.m } });
