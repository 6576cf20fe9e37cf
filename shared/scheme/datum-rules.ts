/** A named figure of practice that re-dimensioning from a datum face is held to. */
export interface DatumRule {
  id: string;
  value: number;
  unit: 'mm';
  reason: string;
  source: string;
}

/** Turning to a stop or a bed dial repeats to about this; a length asked to be truer needs another method. */
export const LEAST_TO_A_STOP: DatumRule = {
  id: 'least-tolerance-to-a-stop',
  value: 0.02,
  unit: 'mm',
  reason: 'A carriage stop on a small lathe repeats to about ± this much.',
  source: 'common practice',
};
