import { Op } from 'sequelize';
import type { Transaction } from 'sequelize';
import { v7 } from 'uuid';
import type { z } from 'zod';
import type { createUserSchema, updateUserSchema } from '@/shared/user';
import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import { transact } from '../db';
import { Site } from '../models/Site';
import { SiteMember } from '../models/SiteMember';
import { User } from '../models/User';
import { conflict, invalidInput, notAllowed, notFound } from '../problem';
import { createOnce } from './createOnce';
import { raiseEpoch } from './ownSessions';
import { queueLinkMail } from './queueMail';
import { recordEvent } from './recordEvent';

type NewUser = z.infer<typeof createUserSchema>;
type UserChanges = z.infer<typeof updateUserSchema>;

/** Adds a person and mails them the invitation to choose a password and a PIN. */
export function createUser(
  actor: CurrentUser,
  { id = v7(), ...fields }: NewUser,
): Promise<{ record: User; created: boolean }> {
  return createOnce({
    actor,
    id,
    find: (known) => User.findByPk(known),
    create: (transaction) => insertUser(transaction, actor, { id, ...fields }),
  });
}

/** The person, the event and the invitation, as a part of a transaction. */
export async function insertUser(
  transaction: Transaction,
  actor: CurrentUser,
  { id, siteIds, qualifiedThrough = null, ...fields }: NewUser & { id: string },
): Promise<User> {
  const now = clock.now();
  const user = await User.create(
    { id, ...fields, qualifiedThrough, invitedAt: now, createdAt: now, updatedAt: now },
    { transaction },
  );
  await setSites(id, siteIds, transaction);
  const { name, email, role } = fields;
  await recordEvent(transaction, {
    subjectType: 'user',
    subjectId: id,
    type: 'created',
    actorId: actor.id,
    payload: { name, email, role, siteIds, qualifiedThrough },
  });
  await queueLinkMail(transaction, 'invitation', id);
  return user;
}

/** Changes a person. A new role and retirement end their sessions at once. */
export function updateUser(
  actor: CurrentUser,
  userId: string,
  { siteIds, retired, ...fields }: UserChanges,
): Promise<User> {
  return transact(async (transaction) => {
    await lockSafety(transaction);
    const user = await User.findByPk(userId, { transaction, lock: transaction.LOCK.UPDATE });
    if (user === null) throw notFound();
    const roleChanges = fields.role !== undefined && fields.role !== user.role;
    const retires = retired === true && user.retiredAt === null;
    if (user.id === actor.id && (roleChanges || retires)) {
      throw notAllowed('Nobody changes their own role or retires themselves.');
    }
    const now = clock.now();
    const retiredAt =
      retired === undefined ? user.retiredAt : retired ? (user.retiredAt ?? now) : null;
    await user.update({ ...fields, retiredAt, updatedAt: now }, { transaction });
    await keepOneSafety(transaction);
    if (siteIds !== undefined) await setSites(userId, siteIds, transaction);
    await recordEvent(transaction, {
      subjectType: 'user',
      subjectId: userId,
      type: retires ? 'retired' : 'changed',
      actorId: actor.id,
      payload: { ...fields, siteIds, retired },
    });
    if (roleChanges || retires) await raiseEpoch(userId, transaction);
    return user;
  });
}

/** Two changes at once must not each leave the other as the last one. */
async function lockSafety(transaction: Transaction): Promise<void> {
  await User.findAll({
    attributes: ['id'],
    where: { role: 'safety' },
    order: ['id'],
    transaction,
    lock: transaction.LOCK.UPDATE,
  });
}

async function keepOneSafety(transaction: Transaction): Promise<void> {
  const where = { role: 'safety' as const, retiredAt: { [Op.is]: null } };
  if ((await User.count({ where, transaction })) > 0) return;
  throw conflict('One active safety account always remains.');
}

async function setSites(
  userId: string,
  siteIds: string[],
  transaction: Transaction,
): Promise<void> {
  const unique = [...new Set(siteIds)];
  const known = await Site.findAll({ attributes: ['id'], where: { id: unique }, transaction });
  const ids = new Set(known.map(({ id }) => id));
  const errors = siteIds.flatMap((siteId, i) =>
    ids.has(siteId)
      ? []
      : [{ pointer: `#/siteIds/${i}`, code: 'not-in-register', message: 'No such site.' }],
  );
  if (errors.length > 0) throw invalidInput(errors);
  await SiteMember.destroy({ where: { userId, siteId: { [Op.notIn]: unique } }, transaction });
  await SiteMember.bulkCreate(
    unique.map((siteId) => ({ siteId, userId })),
    { transaction, ignoreDuplicates: true },
  );
}
