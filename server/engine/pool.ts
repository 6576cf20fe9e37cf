import { availableParallelism } from 'node:os';
import { Worker } from 'node:worker_threads';
import type { EngineResult } from '../../shared/engine';
import type { Bench, Job, JobResult } from './job';
import type { Told } from './worker';

/** No part takes this long; a thread that does is stuck and is ended (ms). */
const LONGEST = 60_000;

export interface Pool extends Bench {
  /** Ends the threads; what is still being worked out fails. */
  close: () => Promise<void>;
}

interface Waiting {
  job: Job;
  resolve: (result: JobResult) => void;
  reject: (error: unknown) => void;
}

interface Thread {
  worker: Worker;
  ready: boolean;
  /** What it works on now. */
  at: Waiting | null;
  timer: NodeJS.Timeout | null;
}

/**
 * Threads beside the server's own, each doing one job at a time, first come first served: a part of many features
 * keeps nobody waiting who only reads. A thread that dies fails its own job and is replaced at the next.
 * They begin at once; jobs wait until one is ready. `longest`: after how many milliseconds one counts as stuck.
 */
export function openPool(size: number = usualSize(), longest: number = LONGEST): Pool {
  const queue: Waiting[] = [];
  const threads = new Set<Thread>();
  let closing = false;

  const next = (): void => {
    for (const thread of threads) {
      const waiting = thread.ready && !thread.at ? queue.shift() : undefined;
      if (!waiting) continue;
      thread.at = waiting;
      thread.timer = setTimeout(
        () => lose(thread, new Error(`A job took longer than ${longest} ms.`)),
        longest,
      );
      try {
        thread.worker.postMessage(waiting.job);
      } catch (error) {
        // It holds something no other thread can be given.
        free(thread)?.reject(error);
      }
    }
    if (!closing && queue.length > 0 && threads.size < size) start();
  };
  const free = (thread: Thread): Waiting | null => {
    const done = thread.at;
    if (thread.timer) clearTimeout(thread.timer);
    [thread.at, thread.timer] = [null, null];
    return done;
  };
  const lose = (thread: Thread, error: Error): void => {
    if (!threads.delete(thread)) return;
    void thread.worker.terminate();
    free(thread)?.reject(error);
    // A thread that cannot even begin would be replaced for ever: whoever waits is told instead.
    if (!thread.ready) for (const waiting of queue.splice(0)) waiting.reject(error);
    next();
  };
  const start = (): void => {
    const thread: Thread = { worker: openThread(), ready: false, at: null, timer: null };
    threads.add(thread);
    thread.worker.on('message', (told: Told) => {
      if ('ready' in told) thread.ready = true;
      else if ('result' in told) free(thread)?.resolve(told.result);
      else free(thread)?.reject(told.failed);
      next();
    });
    thread.worker.on('error', (error) =>
      lose(thread, error instanceof Error ? error : new Error(String(error))),
    );
    thread.worker.on('exit', (code) =>
      lose(thread, new Error(`A thread of the engine ended with code ${code}.`)),
    );
  };
  const ask = (job: Job): Promise<JobResult> =>
    new Promise((resolve, reject) => {
      if (closing) return reject(new Error('The server is ending.'));
      queue.push({ job, resolve, reject });
      next();
    });

  for (let begun = 0; begun < size; begun += 1) start();
  return {
    engine: async (request) => (await ask({ kind: 'engine', request })) as EngineResult,
    pdf: async (svgs, facts) => (await ask({ kind: 'pdf', svgs, facts })) as Uint8Array,
    close: async () => {
      closing = true;
      for (const waiting of queue.splice(0)) waiting.reject(new Error('The server is ending.'));
      await Promise.all([...threads].map(({ worker }) => worker.terminate()));
    },
  };
}

/** One core stays free for those who only read; more than four parts at once no shop saves. */
function usualSize(): number {
  return Math.min(4, Math.max(1, availableParallelism() - 1));
}

function openThread(): Worker {
  return new Worker(new URL('./thread.mjs', import.meta.url), { execArgv: [] });
}
