import { queryOptions, useQuery } from '@tanstack/react-query';
import { askJson } from '../../lib/api/client';
import { api } from '../../lib/paths';

interface Health {
  demo?: boolean;
  people?: readonly { mail: string; password: string; role: string }[];
}

export const healthQuery = queryOptions({
  queryKey: ['health'],
  queryFn: () => askJson<Health | null>('GET', api.health),
  staleTime: Infinity,
  retry: false,
});

/** The sign-ins of a demonstration shop, as the server tells them; none of any other. */
export function useDemoPeople(): NonNullable<Health['people']> {
  const { data } = useQuery(healthQuery);
  return data?.demo ? (data.people ?? []) : [];
}
