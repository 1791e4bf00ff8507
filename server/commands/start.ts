import path from 'node:path';
import { isLoopbackHost, refuseDemoInTheOpen } from './startChecks';
import { DATA } from '../paths';
import { buildWeb } from './buildWeb';
import { otherClients, stopCluster } from './cluster';
import type { Cluster } from './cluster';
import {
  command,
  provideDatabase,
  provideSessionSecret,
  requireProductionSettings,
  StartFault,
} from './environment';
import { portIsTaken } from './postgresTools';

const PORTS_TRIED = 20;
const say = (line: string) => console.log(line);

let started: Cluster | null = null;
let stopping: Promise<void> | undefined;
let stopServer: (() => Promise<void>) | undefined;

/** Drains, then takes down the cluster that this start brought up, unless another program uses it. */
function stop(): Promise<void> {
  stopping ??= (async () => {
    await stopServer?.();
    if (started === null) return;
    if ((await otherClients(started)) > 0) {
      say('Another program uses the database; it keeps running. Stop it: npm run db:stop');
      return;
    }
    await stopCluster(started.folder);
  })();
  return stopping;
}

function stopOnSignals(): void {
  for (const signal of ['SIGTERM', 'SIGINT'] as const) {
    process.on(signal, () => {
      stop().then(
        () => process.exit(process.exitCode ?? 0),
        (error: unknown) => {
          console.error(error);
          process.exit(1);
        },
      );
    });
  }
}

/** The port asked for must be free; where none was asked for, the next free one will do. */
async function choosePort(host: string): Promise<void> {
  const asked = process.env['PORT'];
  const first = Number(asked ?? 3000);
  for (let port = first; port < first + PORTS_TRIED; port += 1) {
    if (first === 0 || !(await portIsTaken(port, host))) {
      process.env['PORT'] = String(port);
      return;
    }
    if (asked) {
      throw new StartFault(`Port ${port} is taken. Choose another: PORT=${port + 1} npm start`);
    }
  }
  throw new StartFault(`Ports ${first} to ${first + PORTS_TRIED - 1} are taken. Set PORT.`);
}

/** Stand-ins for what is not given, on this machine only. */
async function provideFakes(): Promise<void> {
  if (process.env['NODE_ENV'] === 'production') return;
  const { startS3Fake } = await import('../fakes/s3');
  const { startSmtpFake } = await import('../fakes/smtp');
  if (!process.env['S3_ENDPOINT']) {
    process.env['S3_ENDPOINT'] = (await startS3Fake(path.join(DATA, 'files'))).url;
  }
  if (!process.env['SMTP_URL']) {
    process.env['SMTP_URL'] = (await startSmtpFake(path.join(DATA, 'mail'))).url;
  }
}

async function prepareData(): Promise<void> {
  const { DATABASE_OWNER_URL: ownerUrl, DATABASE_URL: runtimeUrl } = process.env;
  const { migrateUp } = await import('../migrate');
  if (ownerUrl && runtimeUrl) await migrateUp({ ownerUrl, runtimeUrl });
  await refuseDemoInTheOpen();
  if (process.env['NODE_ENV'] === 'production' || !isLoopbackHost()) return;
  const { seedDemo } = await import('../demo/seed');
  await seedDemo();
}

async function printAddress(port: number): Promise<void> {
  const { publicUrl } = await import('../env');
  const { DEMO_ACCOUNTS, DEMO_PASSWORD, hasDemo } = await import('../demo/seed');
  say(
    `\nWideberth is at ${process.env['PUBLIC_URL'] ? publicUrl() : `http://${process.env['HOST'] ?? '127.0.0.1'}:${port}`}\n`,
  );
  if (!(await hasDemo())) return;
  say(`Demo accounts, password ${DEMO_PASSWORD}:`);
  for (const { email, pin, name } of DEMO_ACCOUNTS) {
    say(`  ${email.padEnd(32)} PIN ${pin}  ${name}`);
  }
  say('');
}

command(async () => {
  requireProductionSettings();
  const host = process.env['HOST'] ?? '127.0.0.1';
  await choosePort(host);
  provideSessionSecret();
  stopOnSignals();
  try {
    started = await provideDatabase();
    await provideFakes();
    await prepareData();
    if (await buildWeb()) say('The web app is built.');
    if (stopping !== undefined) return await stopping;
    const { startServer } = await import('../main');
    const server = await startServer();
    stopServer = () => server.stop();
    await printAddress(server.port);
  } catch (error) {
    console.error(error instanceof StartFault ? error.message : error);
    await stop();
    // The stand-ins for mail and files would keep the process alive.
    process.exit(1);
  }
});
