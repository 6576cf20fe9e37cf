/** One throwaway cluster for a whole run, with one database migrated once; each test file clones it. */
import type { TestProject } from 'vitest/node';
import { startThrowawayCluster } from '../db/cluster.mjs';
import { migrate } from '../db/migrate';

export interface TestCluster {
  readonly adminUrl: string;
  readonly ownerUrl: string;
  readonly appUrl: string;
  /** The migrated database no test connects to. */
  readonly template: string;
}

declare module 'vitest' {
  export interface ProvidedContext {
    cluster: TestCluster;
  }
}

interface Shared {
  users: number;
  started: Promise<TestCluster & { stop: () => Promise<void> }>;
}

/** The api and the browser tests are two projects of one process; the cluster is between them. */
const shared = globalThis as { benchleafCluster?: Shared };

export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const held = (shared.benchleafCluster ??= { users: 0, started: start() });
  held.users += 1;
  const { stop, ...cluster } = await held.started;
  project.provide('cluster', cluster);
  return async () => {
    held.users -= 1;
    if (held.users > 0) return;
    delete shared.benchleafCluster;
    await stop();
  };
}

async function start(): Promise<TestCluster & { stop: () => Promise<void> }> {
  const cluster = await startThrowawayCluster();
  // Migrations grant rights to whoever DATABASE_URL names: never one of the person who runs the tests.
  process.env.DATABASE_URL = cluster.appUrl;
  delete process.env.DATABASE_OWNER_URL;
  try {
    await migrate(cluster.ownerUrl);
  } catch (error) {
    await cluster.stop();
    throw error;
  }
  return { ...cluster, template: new URL(cluster.ownerUrl).pathname.slice(1) };
}
