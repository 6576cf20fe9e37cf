import { revisionStates, type RevisionState } from '../../../shared/api/drawings';

/** The search as the address keeps it: `?find=windlass+M10&state=draft,released`. */
export interface AddressSearch {
  line: string;
  /** Every state when none is named. */
  states: readonly RevisionState[];
}

export function readAddress(search: URLSearchParams): AddressSearch {
  const named = (search.get('state') ?? '').split(',');
  const states = revisionStates.filter((state) => named.includes(state));
  return { line: search.get('find') ?? '', states: states.length > 0 ? states : revisionStates };
}

export function writeAddress({ line, states }: AddressSearch): URLSearchParams {
  const search = new URLSearchParams();
  if (line.trim()) search.set('find', line.trim());
  if (states.length < revisionStates.length) search.set('state', states.join(','));
  return search;
}
