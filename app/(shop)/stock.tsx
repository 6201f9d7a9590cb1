import { useShopPages } from '@/components/shell/use-shop-pages';

export default function Stock() {
  const { StockScreen } = useShopPages();
  return <StockScreen />;
}
