import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { SessionAnswer, SignInRequest } from '../../shared/api/session';
import { askJson, keepCsrf } from './api/client';
import { ApiFault } from './api/fault';
import { api } from './paths';

async function fetchSession(): Promise<SessionAnswer | null> {
  try {
    return keepCsrf(await askJson<SessionAnswer>('GET', api.session));
  } catch (fault) {
    if (fault instanceof ApiFault && fault.status === 401) return null;
    throw fault;
  }
}

/** Who is signed in, or null. */
export const sessionQuery = queryOptions({
  queryKey: ['session'],
  queryFn: fetchSession,
  staleTime: Infinity,
});
export const useSession = () => useQuery(sessionQuery);

export function useSignIn() {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: async (request: SignInRequest) =>
      keepCsrf(await askJson<SessionAnswer>('POST', api.session, request)),
    onSuccess: (session) => queries.setQueryData(sessionQuery.queryKey, session),
  });
}

/** Ends this browser's session, or with `everywhere` all of this person's. */
export function useSignOut() {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: ({ everywhere }: { everywhere: boolean }) =>
      askJson<null>('DELETE', everywhere ? api.everywhere : api.session),
    onSuccess: () => {
      queries.clear();
      queries.setQueryData(sessionQuery.queryKey, null);
    },
  });
}

export type Shop = SessionAnswer['shops'][number];

/** The shop of this address, as the signed-in person belongs to it; undefined when they do not. */
export function useShop(slug: string | undefined): Shop | undefined {
  const { data } = useSession();
  return data?.shops.find((shop) => shop.slug === slug || shop.id === slug);
}
