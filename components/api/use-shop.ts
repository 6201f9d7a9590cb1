import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';

import { DEFAULT_SETTINGS, type ShopSettings } from '@/geometry/core/settings';
import type { BodyOf } from '@/shared/contracts/contract';
import { getShop, updateShop } from '@/shared/contracts/shop';
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

/** Changes what is given of the shop; for owners. */
export function useUpdateShop() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: BodyOf<typeof updateShop>) => call(updateShop, { body }),
    onSuccess: (shop) => client.setQueryData(shopKey, shop),
  });
}
