import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import type { Role } from '@/shared/roles/roles';
import { useInvite } from '../api/use-crew';
import { Button } from '../ui/Button';
import { Dialog } from '../ui/Dialog';
import { Field } from '../ui/Field';
import { Select } from '../ui/Select';
import { Text } from '../ui/Text';
import { useToast } from '../ui/ToastProvider';
import { space } from '../ui/tokens';
import { ROLE_CHOICES } from './role-choices';

/** Asks for an address and a role and mails a link to join. */
export function InviteDialog({ open, onClose }: { readonly open: boolean; readonly onClose: () => void }) {
  const [email, setEmail] = useState('');
  const [role, setRole] = useState<Role>('installer');
  const [key, setKey] = useState(() => crypto.randomUUID());
  const invite = useInvite();
  const toast = useToast();
  const send = () =>
    invite.mutate(
      { key, email: email.trim(), role },
      {
        onSuccess: () => {
          toast({ text: `An invitation is on its way to ${email.trim()}` });
          setEmail('');
          setKey(crypto.randomUUID());
          onClose();
        },
      },
    );
  return (
    <Dialog
      open={open}
      title="Invite somebody"
      onClose={onClose}
      actions={
        <Button
          label="Send the invitation"
          icon="mail"
          look="primary"
          wide
          busy={invite.isPending}
          disabled={email.trim() === ''}
          onPress={send}
        />
      }
    >
      <View style={styles.fields}>
        <Field
          label="E-mail"
          kind="email"
          value={email}
          error={invite.error?.message}
          onChange={(next) => {
            setEmail(next);
            invite.reset();
          }}
          onSubmit={send}
        />
        <Select label="Role" options={ROLE_CHOICES} value={role} onChange={setRole} />
        <Text kind="second">They get a link by mail and choose their own password.</Text>
      </View>
    </Dialog>
  );
}

const styles = StyleSheet.create({ fields: { gap: space.m } });
