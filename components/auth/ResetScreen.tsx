import { useState } from 'react';

import { ApiError } from '../api/api-problem';
import { useResetPassword } from '../api/use-session';
import { Button } from '../ui/Button';
import { Field } from '../ui/Field';
import { Text } from '../ui/Text';
import { AuthFrame } from './AuthFrame';

const LEAST = 10;

/** A new password with the token from the mail. */
export function ResetScreen({ token, onDone }: { readonly token: string; readonly onDone: () => void }) {
  const [password, setPassword] = useState('');
  const [tried, setTried] = useState(false);
  const reset = useResetPassword();
  const short = password.length < LEAST;
  const wrong = reset.error instanceof ApiError ? reset.error.message : undefined;
  const submit = () => {
    setTried(true);
    if (!short) reset.mutate({ token, password }, { onSuccess: onDone });
  };
  return (
    <AuthFrame title="New password">
      <Text>Ten characters or more. Every other sign-in of yours ends.</Text>
      <Field
        label="New password"
        kind="password"
        autoComplete="new-password"
        value={password}
        onChange={setPassword}
        onSubmit={submit}
        error={tried && short ? `This has ${password.length} characters; ten or more are needed.` : wrong}
      />
      <Button label="Set the password" look="primary" wide height={56} busy={reset.isPending} onPress={submit} />
    </AuthFrame>
  );
}
