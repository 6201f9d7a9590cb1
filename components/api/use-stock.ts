import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';

import type { BodyOf } from '@/shared/contracts/contract';
import { createStock, deleteStock, importStock, listStock, removeStock, updateStock } from '@/shared/contracts/stock';
import { call } from './client';

export const stockKey = ['stock'] as const;

/** Slabs that can be bought, with the shop's currency. */
export function useStock(wanted = true) {
  return useQuery({ queryKey: stockKey, queryFn: ({ signal }) => call(listStock, { signal }), enabled: wanted });
}

function useStockChange<Input, Output>(change: (input: Input) => Promise<Output>) {
  const client = useQueryClient();
  return useMutation({ mutationFn: change, onSuccess: () => client.invalidateQueries({ queryKey: stockKey }) });
}

/** `key` stays the same over retries, so that a slab is added once. */
export const useCreateStock = () =>
  useStockChange(({ key, ...body }: BodyOf<typeof createStock> & { readonly key: string }) =>
    call(createStock, { body, idempotencyKey: key }),
  );

export const useUpdateStock = () =>
  useStockChange(({ slabId, ...body }: BodyOf<typeof updateStock> & { readonly slabId: string }) =>
    call(updateStock, { params: { slabId }, body }),
  );

export const useDeleteStock = () => useStockChange((slabId: string) => call(deleteStock, { params: { slabId } }));

export const useImportStock = () =>
  useStockChange(({ key, slabs }: BodyOf<typeof importStock> & { readonly key: string }) =>
    call(importStock, { body: { slabs }, idempotencyKey: key }),
  );

export const useRemoveStock = () =>
  useStockChange((ids: readonly string[]) => call(removeStock, { body: { ids: [...ids] } }));
