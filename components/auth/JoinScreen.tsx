import { useMutation, useQuery } from '@tanstack/react-query';
import { useState } from 'react';

import { findInvitation, join } from '@/shared/contracts/auth';
import { ROLE_NAMES } from '@/shared/roles/roles';
import { ApiError } from '../api/api-problem';
import { call } from '../api/client';
import { takeSession } from '../api/session';
import { Button } from '../ui/Button';
import { Field } from '../ui/Field';
import { Text } from '../ui/Text';
import { AuthFrame } from './AuthFrame';

/** Accept an invitation to a crew. */
export function JoinScreen({ token, onDone }: { readonly token: string; readonly onDone: () => void }) {
  const [name, setName] = useState('');
  const [password, setPassword] = useState('');
  const invitation = useQuery({
    queryKey: ['invitation', token],
    queryFn: () => call(findInvitation, { body: { token } }),
    retry: false,
  });
  const joining = useMutation({
    mutationFn: () => call(join, { body: { token, name: name.trim() || 'Crew', password } }),
    onSuccess: (answer) => {
      takeSession(answer.accessToken, answer.me);
      onDone();
    },
  });
  const found = invitation.data;
  const wrong = joining.error instanceof ApiError ? joining.error.message : undefined;
  return (
    <AuthFrame title="Join a crew">
      <Text live="polite">
        {invitation.isError
          ? invitation.error.message
          : found
            ? `${found.shopName} invites ${found.email} as ${ROLE_NAMES[found.role].toLowerCase()}.`
            : 'Looking the invitation up.'}
      </Text>
      {found && !found.known && <Field label="Your name" autoComplete="name" value={name} onChange={setName} />}
      {found && (
        <Field
          label={found.known ? 'Your password' : 'Choose a password'}
          kind="password"
          autoComplete={found.known ? 'current-password' : 'new-password'}
          value={password}
          onChange={setPassword}
          hint={found.known ? undefined : 'Ten characters or more.'}
          error={wrong}
        />
      )}
      {found && (
        <Button
          label="Join"
          look="primary"
          wide
          height={56}
          busy={joining.isPending}
          onPress={() => joining.mutate()}
        />
      )}
    </AuthFrame>
  );
}
