import type { Problem } from '../../shared/problem';

/** What the person gave cannot be drawn: exit code 2, a line each. */
export class InputProblem extends Error {
  constructor(readonly problems: readonly Problem[]) {
    super(problems.map(({ path, message }) => `${path}: ${message}`).join('\n'));
    this.name = 'InputProblem';
  }
}
