import { useShopPages } from '@/components/shell/use-shop-pages';

export default function Settings() {
  const { SettingsScreen } = useShopPages();
  return <SettingsScreen />;
}
