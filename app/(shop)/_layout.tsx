import { Slot } from 'expo-router';

import { ShopShell } from '@/components/shell/ShopShell';

export default function ShopLayout() {
  return (
    <ShopShell>
      <Slot />
    </ShopShell>
  );
}
