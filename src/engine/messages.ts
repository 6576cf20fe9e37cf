import type { EngineRequest, EngineResult } from '../../shared/engine';

/** What the pages ask of the worker. `ticket` comes back with the answer. */
export type WorkerRequest =
  | { kind: 'draw'; ticket: number; request: EngineRequest }
  | { kind: 'picture'; ticket: number; template: string };

export type WorkerAnswer =
  | {
      kind: 'drawn';
      ticket: number;
      result: EngineResult;
      /** Paths of the fields that these values show (`gripLength`, `steps[0].diameter`). */
      shown: readonly string[];
    }
  | { kind: 'picture'; ticket: number; svg: string }
  /** A fault of the engine: never the person's. */
  | { kind: 'fault'; ticket: number; message: string };
