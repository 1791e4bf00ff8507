import { existsSync } from 'node:fs';
import path from 'node:path';

const DIST = path.resolve(import.meta.dirname, '../../dist/index.html');

export interface WebServer {
  base: string;
  stop: () => Promise<void>;
}

/**
 * The whole product on a free port: the built web app and the real server on
 * this test file's own database. `E2E_BASE` points the tests at a server that
 * already runs, with the demo in it.
 */
export async function startWebServer(): Promise<WebServer> {
  const running = process.env['E2E_BASE'];
  if (running !== undefined) return { base: running, stop: () => Promise.resolve() };
  if (!existsSync(DIST)) throw new Error('The web app is not built: npm run build.');
  const { seedDemo } = await import('@/server/demo/seed');
  const { startServer } = await import('@/server/main');
  await seedDemo({ worksheets: 'few' });
  const server = await startServer();
  return { base: `http://127.0.0.1:${server.port}`, stop: () => server.stop() };
}
