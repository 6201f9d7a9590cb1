import { useLocalSearchParams, useRouter } from 'expo-router';

import { ResetScreen } from '@/components/auth/ResetScreen';

export default function Reset() {
  const { token = '' } = useLocalSearchParams<{ token?: string }>();
  const router = useRouter();
  return <ResetScreen token={token} onDone={() => router.replace('/sign-in' as never)} />;
}
