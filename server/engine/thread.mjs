/** Begins a thread of the pool: threads do not inherit the loader that reads TypeScript. */
import { register } from 'tsx/esm/api';

register();
await import('./worker.ts');
