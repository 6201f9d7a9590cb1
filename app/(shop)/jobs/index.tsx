import { useEffect } from 'react';

import { JobsScreen } from '@/components/jobs/JobsScreen';
import { fetchJobScreens } from '@/components/shell/use-job-screens';

export default function Jobs() {
  // The next thing done here is to open a job; without a signal now, opening one asks again.
  useEffect(() => {
    fetchJobScreens().catch(() => undefined);
  }, []);
  return <JobsScreen />;
}
