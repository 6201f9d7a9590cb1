import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { ApiError } from '../api/api-problem';
import { useRequestReset, useSignIn } from '../api/use-session';
import { Button } from '../ui/Button';
import { Field } from '../ui/Field';
import { Icon } from '../ui/Icon';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { AuthFrame } from './AuthFrame';

/** Sign in with e-mail and password. What was typed stays when it is refused. */
export function SignInScreen() {
  const [email, setEmail] = useState('');
  const [password, setPassword] = useState('');
  const [tried, setTried] = useState(false);
  const signIn = useSignIn();
  const forgot = useRequestReset();
  const submit = () => {
    setTried(true);
    if (email.trim() && password) signIn.mutate({ email, password });
  };
  const wrong = signIn.error instanceof ApiError ? signIn.error.message : undefined;
  return (
    <AuthFrame title="Sign in">
      <Field
        label="Work e-mail"
        kind="email"
        autoComplete="email"
        value={email}
        onChange={setEmail}
        onSubmit={submit}
        error={tried && !email.trim() ? 'Type the e-mail address your shop invited.' : undefined}
      />
      <Field
        label="Password"
        kind="password"
        autoComplete="current-password"
        value={password}
        onChange={setPassword}
        onSubmit={submit}
        error={tried && !password ? 'Type your password.' : wrong}
      />
      <Button label="Sign in" look="primary" wide height={56} busy={signIn.isPending} onPress={submit} />
      <Button
        label="Send me a link for a new password"
        icon="mail"
        wide
        busy={forgot.isPending}
        disabled={!email.trim()}
        onPress={() => forgot.mutate(email)}
      />
      <View aria-live="polite">
        {forgot.isSuccess && <Text kind="second">If {email} is in a crew, a mail with a link is on its way.</Text>}
        {forgot.isError && <Text kind="second">{forgot.error.message}</Text>}
      </View>
      <View style={styles.note}>
        <Icon name="cloudoff" tone="ink2" size={22} />
        <View style={styles.grow}>
          <Text kind="second">
            Once signed in, measuring works with no signal. What you typed is sent when you are back in reach.
          </Text>
        </View>
      </View>
    </AuthFrame>
  );
}

const styles = StyleSheet.create({
  note: { flexDirection: 'row', gap: space.m, alignItems: 'flex-start', marginTop: space.s },
  grow: { flex: 1 },
});
