import { isLoopback } from '../loopback';
import { StartFault } from './environment';

export function isLoopbackHost(): boolean {
  return isLoopback(process.env['HOST'] ?? '127.0.0.1');
}

/** Everybody knows the demo's passwords: with them in the database nothing but this machine may reach it. */
export async function refuseDemoInTheOpen(): Promise<void> {
  const { hasDemo } = await import('../demo/seed');
  if (!(await hasDemo())) return;
  if (process.env['NODE_ENV'] === 'production') {
    throw new StartFault('The database holds demo accounts: NODE_ENV=production is refused.');
  }
  if (!isLoopbackHost()) {
    throw new StartFault('The database holds demo accounts: HOST must be loopback, as 127.0.0.1.');
  }
}
