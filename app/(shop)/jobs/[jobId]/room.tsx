import { useJobScreens } from '@/components/shell/use-job-screens';

export default function Room() {
  const { RoomScreen } = useJobScreens();
  return <RoomScreen />;
}
