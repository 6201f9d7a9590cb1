import { Redirect, useLocalSearchParams } from 'expo-router';

import { useSession } from '@/components/api/use-session';
import { SignInScreen } from '@/components/auth/SignInScreen';

export default function SignIn() {
  const { to } = useLocalSearchParams<{ to?: string }>();
  const { status } = useSession();
  // Only an address of this app: a link may not send somebody elsewhere after signing in.
  const inside = to?.startsWith('/') && !to.startsWith('//') ? to : '/jobs';
  return status === 'in' ? <Redirect href={inside as never} /> : <SignInScreen />;
}
