import { queryOptions, useQuery } from '@tanstack/react-query';
import type { RevisionAnswer } from '../../../shared/api/drawings';
import { askJson } from '../../lib/api/client';
import { api } from '../../lib/paths';

export interface RevisionAddress {
  shop: string;
  drawing: string;
  revision: string;
}

export const fetchRevision = ({ shop, drawing, revision }: RevisionAddress) =>
  askJson<RevisionAnswer>('GET', api.revision(shop, drawing, revision));

export const revisionQuery = (address: RevisionAddress) =>
  queryOptions({
    queryKey: ['revision', address.shop, address.drawing, address.revision],
    queryFn: () => fetchRevision(address),
  });

export const useRevision = (address: RevisionAddress) => useQuery(revisionQuery(address));
