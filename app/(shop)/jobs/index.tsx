import { JobsScreen } from '@/components/jobs/JobsScreen';

export default function Jobs() {
  return <JobsScreen />;
}
