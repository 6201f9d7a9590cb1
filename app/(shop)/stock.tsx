import { useJobScreens } from '@/components/shell/use-job-screens';

export default function Stock() {
  const { StockScreen } = useJobScreens();
  return <StockScreen />;
}
