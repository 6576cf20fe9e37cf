import { cpus } from 'node:os';
import { benchEngine } from './engine';
import { benchPdf } from './pdf';

/** `npm run bench`: medians on this machine, no verdict and no test. */
console.log(`${cpus()[0]?.model ?? 'unknown processor'}, ${cpus().length} cores, Node ${process.version}`);
await benchEngine();
await benchPdf();
