import { useJobScreens } from '@/components/shell/use-job-screens';

export default function Crew() {
  const { CrewScreen } = useJobScreens();
  return <CrewScreen />;
}
