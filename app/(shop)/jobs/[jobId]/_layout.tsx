import { Slot, useLocalSearchParams } from 'expo-router';

import { JobLoader } from '@/components/shell/JobLoader';

export default function JobLayout() {
  const { jobId } = useLocalSearchParams<{ jobId: string }>();
  return (
    <JobLoader jobId={jobId}>
      <Slot />
    </JobLoader>
  );
}
