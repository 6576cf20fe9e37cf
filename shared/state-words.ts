import type { RevisionState } from './api/drawings';

interface Standing {
  state: RevisionState;
  trial: boolean;
  returned: boolean;
}

/** The word in the stamp's box and in the title block. */
export function stateWord({ state, trial, returned }: Standing): string {
  if (state !== 'draft') return state.toUpperCase();
  if (trial) return 'TRIAL';
  return returned ? 'RETURNED' : 'DRAFT';
}

/** The grey words across a sheet that must not be worked from; nothing across a released one. */
export function stampAcross(standing: Standing): string | undefined {
  if (standing.state === 'released') return undefined;
  if (standing.state === 'draft' && standing.trial) return 'TRIAL PIECE ONLY';
  return `${stateWord(standing)}: not for manufacture`;
}
