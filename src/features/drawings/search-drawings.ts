import { infiniteQueryOptions, keepPreviousData, useInfiniteQuery } from '@tanstack/react-query';
import type { SearchAnswer, SearchQuery } from '../../../shared/api/drawings';
import { askJson } from '../../lib/api/client';
import { api } from '../../lib/paths';

function searchDrawings(shop: string, query: SearchQuery): Promise<SearchAnswer> {
  const given = new URLSearchParams();
  for (const [name, value] of Object.entries(query)) {
    if (value !== undefined && value !== '') given.set(name, String(value));
  }
  const search = given.toString();
  return askJson<SearchAnswer>('GET', search ? `${api.drawings(shop)}?${search}` : api.drawings(shop));
}

export const drawingsQuery = (shop: string, query: SearchQuery) =>
  infiniteQueryOptions({
    queryKey: ['drawings', shop, query],
    queryFn: ({ pageParam }) => searchDrawings(shop, pageParam ? { ...query, cursor: pageParam } : query),
    initialPageParam: '',
    getNextPageParam: (page: SearchAnswer) => page.next ?? undefined,
    placeholderData: keepPreviousData,
  });

export const useDrawings = (shop: string, query: SearchQuery) => useInfiniteQuery(drawingsQuery(shop, query));
