import { useEffect, useRef, useState } from 'react';
import type { EngineGood, EngineRequest, EngineResult } from '../../shared/engine';
import { askEngine } from './engine-worker';
import { Latest } from './latest';

export interface EngineState {
  /** The newest judgement of what is typed. */
  result: EngineResult | null;
  /** The last good sheet; it stays while a value is wrong and while the next one is drawn. */
  good: EngineGood | null;
  /** Paths of the fields that the values of `result` show; null until the first answer. */
  shown: readonly string[] | null;
  drawing: boolean;
  /** A fault of the engine itself, in words. */
  fault: string | null;
}

interface Answered extends Omit<EngineState, 'drawing'> {
  request: EngineRequest | null;
}

/** Draws a request in the worker; a newer request takes the place of one that still waits. Null asks nothing. */
export function useEngine(request: EngineRequest | null): EngineState {
  const [answered, setAnswered] = useState<Answered>({
    request: null,
    result: null,
    good: null,
    shown: null,
    fault: null,
  });
  const latest = useRef<Latest<EngineRequest> | null>(null);

  useEffect(() => {
    let gone = false;
    const queue = new Latest<EngineRequest>((job) => {
      void askEngine({ kind: 'draw', request: job }).then((answer) => {
        if (gone) return;
        queue.finished();
        if (answer.kind === 'drawn') {
          const { result, shown } = answer;
          setAnswered((before) => ({
            request: job,
            result,
            good: result.good ?? before.good,
            shown,
            fault: null,
          }));
        } else if (answer.kind === 'fault') {
          setAnswered((before) => ({ ...before, request: job, fault: answer.message }));
        }
      });
    });
    latest.current = queue;
    return () => {
      gone = true;
      latest.current = null;
    };
  }, []);

  useEffect(() => {
    if (request) latest.current?.submit(request);
  }, [request]);

  const { request: of, ...state } = answered;
  return { ...state, drawing: request !== null && of !== request };
}
