import { useLocalSearchParams, useRouter } from 'expo-router';

import { JoinScreen } from '@/components/auth/JoinScreen';

export default function Join() {
  const { token = '' } = useLocalSearchParams<{ token?: string }>();
  const router = useRouter();
  return <JoinScreen token={token} onDone={() => router.replace('/jobs' as never)} />;
}
