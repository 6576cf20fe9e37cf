import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { RevisionAnswer } from '../../../shared/api/drawings';
import { askJson } from '../../lib/api/client';
import { api } from '../../lib/paths';
import { revisionQuery, type RevisionAddress } from './revision';

export type Act =
  | { act: 'submit' | 'take-back'; body: { version: number } }
  | { act: 'return' | 'withdraw'; body: { version: number; reason: string } }
  | { act: 'approve'; body: { version: number; contentHash: string } }
  | { act: 'trial'; body: { version: number; trial: boolean } };

/** Does an act of sign-off on a revision; the answer replaces what is shown and the lists are asked again. */
export function useAct(address: RevisionAddress) {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: ({ act, body }: Act) =>
      askJson<RevisionAnswer>('POST', api.act(address.shop, address.drawing, address.revision, act), body),
    onSuccess: (answer) => {
      queries.setQueryData(revisionQuery(address).queryKey, answer);
      void queries.invalidateQueries({ queryKey: ['drawing', address.shop, address.drawing] });
      void queries.invalidateQueries({ queryKey: ['drawings', address.shop] });
    },
    onError: () => void queries.invalidateQueries({ queryKey: revisionQuery(address).queryKey }),
  });
}
