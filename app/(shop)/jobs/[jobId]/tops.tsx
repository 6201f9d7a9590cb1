import { useJobScreens } from '@/components/shell/use-job-screens';

export default function Tops() {
  const { TopsScreen } = useJobScreens();
  return <TopsScreen />;
}
