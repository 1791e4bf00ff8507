import PgBoss from 'pg-boss';
import type { Transaction } from 'sequelize';
import { env } from './env';
import { logger } from './log';

/** The queues, made by a migration: a queue is a table, which the runtime role cannot make. */
export type Queue = 'mail' | 'expire-worksheets' | 'nightly';

/** The job queue of this process. It sends without being started; `main.ts` starts it to do the work. */
export const boss = new PgBoss({
  connectionString: env.DATABASE_URL,
  application_name: 'wideberth',
  migrate: false,
  // Housekeeping and the timetable are for servers, not for tests.
  supervise: env.NODE_ENV !== 'test',
  schedule: env.NODE_ENV !== 'test',
  max: 3,
});
boss.on('error', (error) => logger.warn({ message: error.message }, 'job queue'));

interface RawConnection {
  query(text: string, values: unknown[]): Promise<{ rows: unknown[] }>;
}

/** Puts a job in a queue as part of a transaction: rolled back with it, never sent without it. */
export async function queueJob(
  transaction: Transaction,
  queue: Queue,
  data: object,
  options: PgBoss.SendOptions = {},
): Promise<void> {
  // Through Sequelize's own query() the numbered parameters of pg-boss would be taken for names.
  const { connection } = transaction as unknown as { connection: RawConnection };
  const db: PgBoss.Db = {
    executeSql: (text: string, values: unknown[]) => connection.query(text, values),
  };
  await boss.send(queue, data, { ...options, db });
}

let started: Promise<unknown> | undefined;

/** Opens the queue for taking jobs; repeating it does nothing. */
export async function startBoss(): Promise<void> {
  started ??= boss.start();
  await started;
}

/** Lets jobs in hand finish and closes the queue's connections. */
export async function stopBoss(): Promise<void> {
  if (started === undefined) return;
  started = undefined;
  await boss.stop({ graceful: true, wait: true, timeout: 10_000 });
}
