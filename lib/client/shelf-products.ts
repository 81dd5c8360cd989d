'use client';

import { type QueryClient, queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { SUBSTANCES } from '@/lib/chemistry/substances';
import type { HouseholdProduct } from '@/lib/schemas/household-product';
import type { substances } from '@/lib/schemas/shelf-product';
import { doneReply } from './done-reply';
import { fetchJson } from './fetch-json';
import { weekKeys } from './week';

const listReply = () =>
  import('@/lib/schemas/household-product').then(({ householdProductListSchema }) => householdProductListSchema);
const productReply = () =>
  import('@/lib/schemas/household-product').then(({ householdProductSchema }) => householdProductSchema);

const shelfKey = ['shelf-products'] as const;

/** What stands on the shelf, in the order in which it came there. */
export function shelfOptions() {
  return queryOptions({
    queryKey: shelfKey,
    queryFn: ({ signal }) => fetchJson('/api/shelf-products', listReply, { signal }),
  });
}

/** Puts a product on the shelf, or replaces the one with its id: sent twice it stands there once. */
export function useSaveProduct() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (product: HouseholdProduct) =>
      fetchJson('/api/shelf-products', productReply, { method: 'POST', body: product }),
    onSuccess: (saved) =>
      changeShelf(client, (shelf) =>
        shelf.some(({ id }) => id === saved.id)
          ? shelf.map((product) => (product.id === saved.id ? saved : product))
          : [...shelf, saved],
      ),
  });
}

export function useRemoveProduct() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async (id: string) => {
      await fetchJson(`/api/shelf-products/${encodeURIComponent(id)}`, doneReply, { method: 'DELETE' });
      return id;
    },
    onSuccess: (removed) => changeShelf(client, (shelf) => shelf.filter(({ id }) => id !== removed)),
  });
}

async function changeShelf(client: QueryClient, change: (shelf: HouseholdProduct[]) => HouseholdProduct[]) {
  client.setQueryData<HouseholdProduct[]>(shelfKey, (shelf) => shelf && change(shelf));
  // The plan is made from what stands here.
  await client.invalidateQueries({ queryKey: weekKeys.all });
}

/** Strength of the pure substance: no label of it can honestly print more. */
export function strongestOf(substance: (typeof substances)[number]): number {
  return SUBSTANCES[substance].pureStrength;
}
