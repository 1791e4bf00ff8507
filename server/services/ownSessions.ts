import { QueryTypes } from 'sequelize';
import type { Transaction } from 'sequelize';
import { sequelize } from '../db';
import { User } from '../models/User';
import { notFound } from '../problem';
import { IDLE_MILLISECONDS } from '../session';

interface OwnSession {
  id: string;
  current: boolean;
  createdAt: string;
  lastSeenAt: string;
  userAgent: string;
}

/** A person's sessions, the latest first. The session's real id stays here: whoever has it is that person. */
export async function listSessions(userId: string, currentId: string): Promise<OwnSession[]> {
  const rows = await sequelize.query<Omit<OwnSession, 'lastSeenAt'> & { expire: Date }>(
    `SELECT sess ->> 'publicId' AS id, sess ->> 'signedInAt' AS "createdAt",
            sess ->> 'userAgent' AS "userAgent", sess ->> 'publicId' = $currentId AS current, expire
       FROM session
      WHERE sess -> 'passport' ->> 'user' = $userId AND expire > now()
        AND (sess ->> 'epoch')::integer = (SELECT session_epoch FROM users WHERE id = $userId::uuid)
      ORDER BY sess ->> 'signedInAt' DESC`,
    { bind: { userId, currentId }, type: QueryTypes.SELECT },
  );
  return rows.map(({ expire, ...row }) => ({
    ...row,
    lastSeenAt: new Date(expire.getTime() - IDLE_MILLISECONDS).toISOString(),
  }));
}

/** Ends one session of the person's own. */
export async function endSession(userId: string, publicId: string): Promise<void> {
  const rows = await sequelize.query(
    `DELETE FROM session
      WHERE sess -> 'passport' ->> 'user' = $userId AND sess ->> 'publicId' = $publicId
      RETURNING sid`,
    { bind: { userId, publicId }, type: QueryTypes.SELECT },
  );
  if (rows.length === 0) throw notFound();
}

/** Ends every session of a person, or all but one. */
export async function endSessions(
  userId: string,
  { except, transaction }: { except?: string | undefined; transaction?: Transaction } = {},
): Promise<void> {
  await sequelize.query(
    `DELETE FROM session
      WHERE sess -> 'passport' ->> 'user' = $userId
        AND ($except::text IS NULL OR sess ->> 'publicId' <> $except)`,
    { bind: { userId, except: except ?? null }, transaction },
  );
}

/**
 * Raises the person's epoch, so that no session of an earlier sign-in counts
 * any more, whatever another request is writing just now.
 */
export async function raiseEpoch(userId: string, transaction: Transaction): Promise<number> {
  await User.increment('sessionEpoch', { where: { id: userId }, transaction });
  await endSessions(userId, { transaction });
  const { sessionEpoch } = await User.findByPk(userId, {
    attributes: ['sessionEpoch'],
    rejectOnEmpty: true,
    transaction,
  });
  return sessionEpoch;
}
