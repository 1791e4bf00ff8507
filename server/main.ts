import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { buildApp } from './app';
import { closeDatabase } from './db';
import { env } from './env';
import { stopBoss } from './jobs';
import { logger } from './log';
import { toProblem } from './problem';
import { startWorker } from './worker';

/** A client that never finishes its request does not hold up the end for longer than this. */
const DRAIN_MILLISECONDS = 10_000;

export interface RunningServer {
  port: number;
  /** Requests in flight finish, then every connection closes. */
  stop(): Promise<void>;
}

/**
 * The job queue writes some answers without waiting for them: when the database
 * is away at that moment, the promise of one fails with nobody to hear it, and
 * would end the process. The queue gives the job out again. Anything else ends it.
 */
function outliveLostConnections(): void {
  if (process.listenerCount('unhandledRejection', onUnheard) > 0) return;
  process.on('unhandledRejection', onUnheard);
}

function onUnheard(reason: unknown): void {
  if (toProblem(reason)?.problem !== 'unavailable') throw reason;
  logger.warn({ reason: String(reason) }, 'the database was away');
}

/** Listens on HOST and PORT; with PORT 0 on a free one. */
export async function startServer(): Promise<RunningServer> {
  outliveLostConnections();
  const server = createServer(buildApp());
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(env.PORT, env.HOST, () => {
      server.off('error', reject);
      resolve();
    });
  });
  await startWorker();
  const { port } = server.address() as AddressInfo;
  // Port 0 asked for a free one; links in mail need the one that it became.
  env.PORT = port;
  return {
    port,
    async stop() {
      const closed = new Promise<void>((resolve) => server.close(() => resolve()));
      server.closeIdleConnections();
      // Keep-alive connections would hold the server open long after their last answer.
      const sweep = setInterval(() => server.closeIdleConnections(), 100);
      const deadline = setTimeout(() => server.closeAllConnections(), DRAIN_MILLISECONDS);
      await closed;
      clearInterval(sweep);
      clearTimeout(deadline);
      await stopBoss();
      await closeDatabase();
      logger.info('stopped');
    },
  };
}
