import { Slot, useLocalSearchParams } from 'expo-router';
import { Suspense } from 'react';

import { OpeningJob } from '@/components/shell/OpeningJob';
import { useJobScreens } from '@/components/shell/use-job-screens';
import { ErrorBoundary } from '@/components/ui/ErrorBoundary';

export default function JobLayout() {
  return (
    <ErrorBoundary>
      <Suspense fallback={<OpeningJob />}>
        <OpenJob />
      </Suspense>
    </ErrorBoundary>
  );
}

function OpenJob() {
  const { jobId } = useLocalSearchParams<{ jobId: string }>();
  const { JobLoader } = useJobScreens();
  return (
    <JobLoader jobId={jobId}>
      <Slot />
    </JobLoader>
  );
}
