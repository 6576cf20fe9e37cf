import type { RevisionAnswer } from '../../shared/api/drawings';
import type { CheckFinding, Sheet } from '../../shared/drawing/sheet';
import type { EngineGood } from '../../shared/engine';
import type { Part } from '../../shared/part/part';
import type { Capacity, Fault, Route } from '../../shared/route/route';
import type { Scheme } from '../../shared/scheme/scheme';

/** The stored output with the engine's own types: it was written by the engine, under schema version 1. */
export function storedGood({ revision }: RevisionAnswer): EngineGood | null {
  const { result } = revision;
  if (!result) return null;
  return {
    part: result.part as Part,
    scheme: result.scheme as Scheme,
    sheet: result.sheet as Sheet,
    findings: result.findings as CheckFinding[],
    svg: result.svg,
    route: result.route as Route | null,
    capacity: result.capacity as Capacity,
    faults: result.faults as Fault[],
  };
}
