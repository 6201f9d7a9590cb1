import { useJobScreens } from '@/components/shell/use-job-screens';

export default function Settings() {
  const { SettingsScreen } = useJobScreens();
  return <SettingsScreen />;
}
