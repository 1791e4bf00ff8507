import { clock } from '@/server/clock';
import { startServer } from '@/server/main';

/* The server as a process of its own, for tests that kill it: started by `serverProcess.ts`. */

const now = process.env['TEST_NOW'];
if (now !== undefined) clock.set(now);
const server = await startServer();
process.send?.({ port: server.port });
// Whoever started it is gone: nothing is left to serve.
process.once('disconnect', () => process.exit(0));
process.once('SIGTERM', () => {
  void server.stop().then(() => process.exit(0));
});
