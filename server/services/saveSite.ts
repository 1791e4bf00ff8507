import { Op } from 'sequelize';
import type { Transaction } from 'sequelize';
import { v7 } from 'uuid';
import type { z } from 'zod';
import type { siteInputSchema, siteUpdateSchema } from '@/shared/register';
import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import { transact } from '../db';
import { Site } from '../models/Site';
import { SiteMember } from '../models/SiteMember';
import { User } from '../models/User';
import { invalidInput, notFound } from '../problem';
import { createOnce } from './createOnce';
import { recordEvent } from './recordEvent';

type NewSite = z.infer<typeof siteInputSchema>;
type SiteChanges = z.infer<typeof siteUpdateSchema>;

export function createSite(
  actor: CurrentUser,
  { id = v7(), memberIds = [], ...fields }: NewSite,
): Promise<{ record: Site; created: boolean }> {
  return createOnce({
    actor,
    id,
    find: (known) => Site.findByPk(known),
    create: async (transaction) => {
      const now = clock.now();
      const site = await Site.create(
        { id, ...fields, createdAt: now, updatedAt: now },
        { transaction },
      );
      await setMembers(id, memberIds, transaction);
      await recordEvent(transaction, {
        subjectType: 'site',
        subjectId: id,
        type: 'created',
        actorId: actor.id,
        payload: { ...fields, memberIds },
      });
      return site;
    },
  });
}

/** Changes a site. A retired one takes no new worksheet; what was written there stays. */
export function updateSite(
  actor: CurrentUser,
  siteId: string,
  { memberIds, retired, ...fields }: SiteChanges,
): Promise<Site> {
  return transact(async (transaction) => {
    const site = await Site.findByPk(siteId, { transaction, lock: transaction.LOCK.UPDATE });
    if (site === null) throw notFound();
    const now = clock.now();
    const retires = retired === true && site.retiredAt === null;
    const retiredAt =
      retired === undefined ? site.retiredAt : retired ? (site.retiredAt ?? now) : null;
    await site.update({ ...fields, retiredAt, updatedAt: now }, { transaction });
    if (memberIds !== undefined) await setMembers(siteId, memberIds, transaction);
    await recordEvent(transaction, {
      subjectType: 'site',
      subjectId: siteId,
      type: retires ? 'retired' : 'changed',
      actorId: actor.id,
      payload: { ...fields, memberIds, retired },
    });
    return site;
  });
}

async function setMembers(
  siteId: string,
  memberIds: string[],
  transaction: Transaction,
): Promise<void> {
  const unique = [...new Set(memberIds)];
  const known = await User.findAll({ attributes: ['id'], where: { id: unique }, transaction });
  const ids = new Set(known.map(({ id }) => id));
  const errors = memberIds.flatMap((userId, i) =>
    ids.has(userId)
      ? []
      : [{ pointer: `#/memberIds/${i}`, code: 'not-in-register', message: 'No such person.' }],
  );
  if (errors.length > 0) throw invalidInput(errors);
  await SiteMember.destroy({ where: { siteId, userId: { [Op.notIn]: unique } }, transaction });
  await SiteMember.bulkCreate(
    unique.map((userId) => ({ siteId, userId })),
    { transaction, ignoreDuplicates: true },
  );
}
