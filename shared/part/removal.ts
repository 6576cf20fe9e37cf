import type { Cut, Generator, Treatment } from './body';

/**
 * The six ways metal leaves a body, as data: enough to replay an operation anywhere.
 * `outer` lowers r to min(r, envelope) over the envelope's span; `bore` raises b to max(b, envelope).
 */
export type Removal =
  | { kind: 'outer'; envelope: Generator }
  | { kind: 'bore'; envelope: Generator }
  | { kind: 'cut'; cut: Cut }
  | { kind: 'treatment'; treatment: Treatment }
  /** Facing and trimming: what lies outside [from, to] is turned to chips. */
  | { kind: 'trim'; from: number; to: number }
  /**
   * Parting and sawing: the body keeps [from, to]; `kerf` beside the cut becomes chips, the rest is left in
   * the hand. Exactly one side is cut at a time; `kerfFrom`..`kerfTo` is the blade's own width.
   */
  | { kind: 'sever'; from: number; to: number; kerfFrom: number; kerfTo: number };
