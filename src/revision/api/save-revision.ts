import type { RevisionAnswer, SaveRevisionRequest } from '../../../shared/api/drawings';
import { askJson } from '../../lib/api/client';
import { ApiFault } from '../../lib/api/fault';
import { api } from '../../lib/paths';
import type { RevisionAddress } from './revision';

export const saveRevision = ({ shop, drawing, revision }: RevisionAddress, request: SaveRevisionRequest) =>
  askJson<RevisionAnswer>('PUT', api.revision(shop, drawing, revision), request);

/** What stands now, when a save was refused because somebody else changed it meanwhile; else null. */
export function staleAnswer(fault: unknown): RevisionAnswer | null {
  if (!(fault instanceof ApiFault) || fault.status !== 409) return null;
  const { body } = fault;
  if (typeof body !== 'object' || body === null || !('current' in body)) return null;
  return body.current as RevisionAnswer;
}
