import type { EngineRequest, EngineResult } from '../../shared/engine';
import { runEngine } from '../../shared/engine-run';

/**
 * The engine, asked once for the same values: for tests of rules and records, which draw the same part many times over.
 * The sheet's own words (number, signatures, stamp) are those of the first time.
 */
export function rememberingEngine(): (request: EngineRequest) => EngineResult {
  const known = new Map<string, EngineResult>();
  return (request) => {
    const { template, typed, entryUnit, unit, style, sheet, scale, balloons } = request;
    const key = JSON.stringify({ template, typed, entryUnit, unit, style, sheet, scale, balloons });
    const result = known.get(key) ?? runEngine(request);
    known.set(key, result);
    return result;
  };
}
