import { useShopPages } from '@/components/shell/use-shop-pages';

export default function Crew() {
  const { CrewScreen } = useShopPages();
  return <CrewScreen />;
}
