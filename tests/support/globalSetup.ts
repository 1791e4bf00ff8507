import type { TestProject } from 'vitest/node';
import { urlOf } from '@/server/commands/cluster';
import type { Cluster } from '@/server/commands/cluster';
import { migrateUp } from '@/server/migrate';
import { startTestCluster } from './database';

declare module 'vitest' {
  interface ProvidedContext {
    cluster: Cluster;
  }
}

/** One cluster a run, with one migrated database that every test file copies. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const { cluster, stop } = await startTestCluster();
  try {
    await migrateUp({ ownerUrl: urlOf(cluster, 'owner'), runtimeUrl: urlOf(cluster, 'runtime') });
  } catch (error) {
    await stop();
    throw error;
  }
  project.provide('cluster', cluster);
  return stop;
}
