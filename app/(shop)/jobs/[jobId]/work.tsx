import { useJobScreens } from '@/components/shell/use-job-screens';

export default function Work() {
  const { WorkScreen } = useJobScreens();
  return <WorkScreen />;
}
