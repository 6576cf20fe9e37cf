import { parentPort } from 'node:worker_threads';
import { prepareFaces } from '../pdf/faces';
import type { Job, JobResult } from './job';
import { doJob } from './job';

export type Told = { ready: true } | { result: JobResult } | { failed: unknown };

const port = parentPort;
if (!port) throw new Error('This file runs as a thread of the server only.');
const tell = (told: Told): void => port.postMessage(told);

port.on('message', (job: Job) => {
  doJob(job).then(
    (result) => tell({ result }),
    (failed: unknown) => tell({ failed }),
  );
});
prepareFaces();
tell({ ready: true });
