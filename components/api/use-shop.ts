import { useQuery } from '@tanstack/react-query';

import { DEFAULT_SETTINGS, type ShopSettings } from '@/geometry/core/settings';
import { getShop } from '@/shared/contracts/shop';
import { call } from './client';

export const shopKey = ['shop'] as const;

/** The shop of the person signed in: name, units, settings, letterhead. */
export function useShop() {
  return useQuery({ queryKey: shopKey, queryFn: ({ signal }) => call(getShop, { signal }) });
}

/** The shop's settings; the usual ones until its own have come for the first time on this device. */
export function useShopSettings(): ShopSettings {
  return useShop().data?.settings ?? DEFAULT_SETTINGS;
}
