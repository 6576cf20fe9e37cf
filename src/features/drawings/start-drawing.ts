import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { RevisionAnswer, StartDrawingRequest } from '../../../shared/api/drawings';
import { askJson } from '../../lib/api/client';
import { api } from '../../lib/paths';

/** Starts a drawing with its first draft. The id is made here, so that asking twice starts one. */
export function useStartDrawing(shop: string) {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: (request: StartDrawingRequest) =>
      askJson<RevisionAnswer>('POST', api.drawings(shop), request),
    onSuccess: () => void queries.invalidateQueries({ queryKey: ['drawings', shop] }),
  });
}
