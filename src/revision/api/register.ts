import { queryOptions, useQuery } from '@tanstack/react-query';
import type { Register } from '../../../shared/route/register';
import { askJson } from '../../lib/api/client';
import { api } from '../../lib/paths';

export const registerQuery = (shop: string) =>
  queryOptions({
    queryKey: ['register', shop],
    queryFn: async () => (await askJson<{ register: Register }>('GET', api.register(shop))).register,
    staleTime: 60_000,
  });

/** What the shop owns: plans are judged against it. */
export const useRegister = (shop: string) => useQuery(registerQuery(shop));
