import type { WorkerAnswer, WorkerRequest } from './messages';

let worker: Worker | null = null;
let lastTicket = 0;
const waiting = new Map<number, (answer: WorkerAnswer) => void>();

type Job =
  | { kind: 'draw'; request: Extract<WorkerRequest, { kind: 'draw' }>['request'] }
  | { kind: 'picture'; template: string };

function started(): Worker {
  if (worker) return worker;
  worker = new Worker(new URL('./engine.worker.ts', import.meta.url), { type: 'module' });
  worker.onmessage = (event: MessageEvent<WorkerAnswer>) => {
    waiting.get(event.data.ticket)?.(event.data);
    waiting.delete(event.data.ticket);
  };
  worker.onerror = () => {
    for (const [ticket, answer] of waiting) answer({ kind: 'fault', ticket, message: 'The engine stopped.' });
    waiting.clear();
    worker?.terminate();
    worker = null;
  };
  return worker;
}

/** Gives a job to the one worker all pages share; it answers in the order it was asked. */
export function askEngine(job: Job): Promise<WorkerAnswer> {
  const ticket = ++lastTicket;
  return new Promise((resolve) => {
    waiting.set(ticket, resolve);
    started().postMessage({ ...job, ticket } satisfies WorkerRequest);
  });
}
