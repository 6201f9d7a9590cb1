import { SettingsScreen } from '@/components/settings/SettingsScreen';

export default function Settings() {
  return <SettingsScreen />;
}
