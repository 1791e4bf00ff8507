import { createHash } from 'node:crypto';
import pg from 'pg';
import { env } from '../env';
import { tooManyRequests } from '../problem';

/** A number for a person's exports, in the space of the database's advisory locks. */
function lockOf(userId: string): string {
  return createHash('sha256').update(`export ${userId}`).digest().readBigInt64BE().toString();
}

/**
 * Runs one export at a time a person, over all processes: the lock lives in
 * the database and goes with the connection. 429 while another one runs.
 */
export async function withExportLock<T>(userId: string, work: () => Promise<T>): Promise<T> {
  // A connection of its own: a long export must not take one from the sessions.
  const client = new pg.Client({ connectionString: env.DATABASE_URL });
  await client.connect();
  const key = lockOf(userId);
  try {
    const { rows } = await client.query<{ got: boolean }>(
      'SELECT pg_try_advisory_lock($1::bigint) AS got',
      [key],
    );
    if (rows[0]?.got !== true) throw tooManyRequests(30);
    return await work();
  } finally {
    await client.end();
  }
}
