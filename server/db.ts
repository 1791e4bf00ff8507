import pg from 'pg';
import { Sequelize, Transaction } from 'sequelize';
import { env } from './env';
import { logger } from './log';

/** Models and services speak to PostgreSQL through this, as the runtime role. */
export const sequelize = new Sequelize(env.DATABASE_URL, {
  dialect: 'postgres',
  logging: false,
  timezone: '+00:00',
  pool: { max: env.DATABASE_POOL, min: 0, acquire: 10_000, idle: 10_000 },
  dialectOptions: { application_name: 'wideberth', connectionTimeoutMillis: 5000 },
});

/** For libraries that want a plain pool: sessions and throttling. */
export const pool = new pg.Pool({
  connectionString: env.DATABASE_URL,
  max: 5,
  connectionTimeoutMillis: 5000,
  application_name: 'wideberth',
});
// An idle connection that PostgreSQL closes (a restart) is an event here, not a crash of the process.
pool.on('error', (error) => logger.warn({ code: codeOf(error) }, 'an idle connection was lost'));

function codeOf(error: Error): string | undefined {
  return 'code' in error && typeof error.code === 'string' ? error.code : undefined;
}

/** Runs `work` in one transaction; whatever it throws rolls everything back. */
export function transact<T>(work: (transaction: Transaction) => Promise<T>): Promise<T> {
  return sequelize.transaction(
    { isolationLevel: Transaction.ISOLATION_LEVELS.READ_COMMITTED },
    work,
  );
}

let closing: Promise<unknown> | undefined;

/** Ends every connection of this process; repeating it does nothing. */
export async function closeDatabase(): Promise<void> {
  closing ??= Promise.all([sequelize.close(), pool.end()]);
  await closing;
}
