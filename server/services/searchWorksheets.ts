import { QueryTypes } from 'sequelize';
import { sequelize, transact } from '../db';

/** Above this a search is broad: a page of it is found soonest by reading the list in its order. */
const MOST_IDS = 1000;

/**
 * The ids of all worksheets whose words begin with those of `q`, or undefined
 * when they are more than 1000. PostgreSQL takes every prefix for a common one
 * and would walk the whole list for a single hit; the index is told outright.
 */
export async function searchWorksheets(q: string): Promise<string[] | undefined> {
  const rows = await transact(async (transaction) => {
    await sequelize.query('SET LOCAL enable_seqscan = off; SET LOCAL enable_indexscan = off', {
      transaction,
    });
    return sequelize.query<{ id: string }>(
      'SELECT id FROM worksheets WHERE search @@ search_query(:q) LIMIT :most',
      { replacements: { q, most: MOST_IDS + 1 }, type: QueryTypes.SELECT, transaction },
    );
  });
  return rows.length > MOST_IDS ? undefined : rows.map(({ id }) => id);
}
