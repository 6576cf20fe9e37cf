import type { EngineRequest, EngineResult } from '../../shared/engine';
import type { ServerConfig } from '../config';
import type { Database } from '../database';
import type { BlobStore } from '../storage/blob-store';

/** What the acts of this server work with; tests give their own clock. */
export interface Services {
  config: ServerConfig;
  database: Database;
  store: BlobStore;
  engine: (request: EngineRequest) => EngineResult;
  now: () => Date;
}
