import type { EngineRequest, EngineResult } from '../../shared/engine';
import type { Bench } from '../engine/job';
import { canonicalJson } from './content-hash';

/** The engine as a transaction sees it: what was worked out before it began. */
export type EngineBeside = (request: EngineRequest) => Promise<EngineResult>;

/** A transaction ends with this when it asks for what is not worked out yet. */
class NotWorkedOut extends Error {
  constructor(
    readonly key: string,
    readonly request: EngineRequest,
  ) {
    super('The engine is asked outside the transaction.');
    this.name = 'NotWorkedOut';
  }
}

/** After so many changes of the world while the engine ran, it runs while the transaction waits. */
const TRIES = 5;

/**
 * Runs a transaction so that the engine never works while it holds locks. Where it asks the engine it is given up, the
 * question is worked out with nothing held, and the transaction begins again: everything is read and judged anew under
 * its locks, and the answer counts only for exactly the same question. A drawing number, version, register or signature
 * that has changed meanwhile is another question, or a refusal.
 */
export async function engineBeside<T>(
  bench: Pick<Bench, 'engine'>,
  transaction: (engine: EngineBeside) => Promise<T>,
): Promise<T> {
  const answers = new Map<string, EngineResult>();
  for (let tried = 1; ; tried += 1) {
    try {
      return await transaction(async (request) => {
        const key = canonicalJson(request);
        const answer = answers.get(key);
        if (answer) return answer;
        if (tried > TRIES) return bench.engine(request);
        throw new NotWorkedOut(key, request);
      });
    } catch (error) {
      if (!(error instanceof NotWorkedOut)) throw error;
      answers.set(error.key, await bench.engine(error.request));
    }
  }
}
