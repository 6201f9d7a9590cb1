import { CrewScreen } from '@/components/crew/CrewScreen';

export default function Crew() {
  return <CrewScreen />;
}
