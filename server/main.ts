import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { buildApp } from './app';
import { closeDatabase } from './db';
import { env } from './env';
import { stopBoss } from './jobs';
import { logger } from './log';
import { startWorker } from './worker';

/** A client that never finishes its request does not hold up the end for longer than this. */
const DRAIN_MILLISECONDS = 10_000;

export interface RunningServer {
  port: number;
  /** Requests in flight finish, then every connection closes. */
  stop(): Promise<void>;
}

/** Listens on HOST and PORT; with PORT 0 on a free one. */
export async function startServer(): Promise<RunningServer> {
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
