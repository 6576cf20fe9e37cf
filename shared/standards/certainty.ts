/** How sure a figure or a table is. Every table of a standard says its own. */
export type Certainty = 'standard' | 'handbook' | 'formula' | 'common practice' | 'from memory';

/** Where a figure comes from, kept beside it as data so that a sheet, a route or a test can name it. */
export interface Source {
  source: string;
  certainty: Certainty;
}
