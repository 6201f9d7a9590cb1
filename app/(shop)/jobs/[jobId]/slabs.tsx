import { useJobScreens } from '@/components/shell/use-job-screens';

export default function Slabs() {
  const { SlabsScreen } = useJobScreens();
  return <SlabsScreen />;
}
