import type { ServerConfig } from '../config';
import type { Database } from '../database';
import type { Bench } from '../engine/job';
import type { BlobStore } from '../storage/blob-store';

/** What the acts of this server work with; tests give their own clock. */
export interface Services extends Bench {
  config: ServerConfig;
  database: Database;
  store: BlobStore;
  now: () => Date;
}
