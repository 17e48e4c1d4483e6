import type { TestProject } from 'vitest/node';
import { sayOnStdout } from '#server/services/say.ts';
import { startTestCluster, type TestCluster } from './test-cluster.ts';

declare module 'vitest' {
  interface ProvidedContext {
    /** The address of the run's own PostgreSQL server, with a role that may make databases. */
    postgresUrl: string;
  }
}

interface Shared {
  cluster: Promise<TestCluster>;
  users: number;
}

/** Each project loads this file anew; the process they share holds the one cluster. */
const holder = globalThis as typeof globalThis & { ladlemarkTestCluster?: Shared };

/** Starts one throw-away PostgreSQL for the whole run, whichever projects ask for it. */
export const setup = async (project: TestProject): Promise<() => Promise<void>> => {
  const shared = (holder.ladlemarkTestCluster ??= { cluster: startTestCluster(sayOnStdout), users: 0 });
  shared.users += 1;
  project.provide('postgresUrl', (await shared.cluster).url);
  return async () => {
    shared.users -= 1;
    if (shared.users > 0) return;
    delete holder.ladlemarkTestCluster;
    await (await shared.cluster).stop();
  };
};
