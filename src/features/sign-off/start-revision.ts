import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { RevisionAnswer } from '../../../shared/api/drawings';
import { askJson } from '../../lib/api/client';
import { api } from '../../lib/paths';

/** Starts the next revision of a drawing as a draft with the sizes of the released one. */
export function useStartRevision(shop: string, drawing: string) {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: () => askJson<RevisionAnswer>('POST', api.revisions(shop, drawing), {}),
    onSuccess: () => {
      void queries.invalidateQueries({ queryKey: ['drawing', shop, drawing] });
      void queries.invalidateQueries({ queryKey: ['drawings', shop] });
    },
  });
}
