import { useJobScreens } from '@/components/shell/use-job-screens';

export default function Sheets() {
  const { SheetsScreen } = useJobScreens();
  return <SheetsScreen />;
}
