import type { Transaction } from 'sequelize';
import type { CurrentUser } from '../currentUser';
import { transact } from '../db';
import { Event } from '../models/Event';
import { idTaken, toProblem } from '../problem';

interface Creation<T> {
  actor: CurrentUser;
  id: string;
  create: (transaction: Transaction) => Promise<T>;
  find: (id: string) => Promise<T | null>;
}

/**
 * Creates what a client may have chosen the id of. The primary key decides, so
 * that of two requests at once one creates; the same person's repeat gets the
 * record as it stands, and another's id tells nothing.
 */
export async function createOnce<T>({
  actor,
  id,
  create,
  find,
}: Creation<T>): Promise<{ record: T; created: boolean }> {
  try {
    return { record: await transact(create), created: true };
  } catch (fault) {
    if (toProblem(fault)?.problem !== 'id-taken') throw fault;
    const [record, isOwn] = await Promise.all([
      find(id),
      Event.count({ where: { subjectId: id, type: 'created', actorId: actor.id } }),
    ]);
    if (record === null || isOwn === 0) throw idTaken();
    return { record, created: false };
  }
}
