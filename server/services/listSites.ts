import { Op, QueryTypes } from 'sequelize';
import type { WhereOptions } from 'sequelize';
import type { CurrentUser } from '../currentUser';
import { sequelize } from '../db';
import { beyond, cutPage, newestFirst } from '../keyset';
import type { Page } from '../keyset';
import { Site } from '../models/Site';
import { notFound } from '../problem';

/** Safety reads every site, others their own active ones. */
function visibleTo({ role, siteIds }: CurrentUser): WhereOptions<Site> {
  return role === 'safety' ? {} : { id: siteIds, retiredAt: { [Op.is]: null } };
}

/** A site that this person may see; 404 otherwise. */
export async function findSite(actor: CurrentUser, id: string): Promise<Site> {
  const where = { [Op.and]: [{ id }, visibleTo(actor)] } as WhereOptions<Site>;
  const site = await Site.findOne({ where });
  if (site === null) throw notFound();
  return site;
}

export async function listSites(
  actor: CurrentUser,
  { cursor, limit }: Page,
): Promise<{ rows: Site[]; nextCursor: string | null }> {
  const where = { [Op.and]: [visibleTo(actor), beyond(cursor)] } as WhereOptions<Site>;
  return cutPage(await Site.findAll({ where, order: newestFirst, limit: limit + 1 }), limit);
}

/** The people of each of these sites. */
export async function membersOf(siteIds: string[]): Promise<Map<string, string[]>> {
  const rows = await sequelize.query<{ siteId: string; userIds: string[] }>(
    `SELECT site_id AS "siteId", array_agg(user_id ORDER BY user_id) AS "userIds"
       FROM site_members WHERE site_id = ANY($siteIds::uuid[]) GROUP BY site_id`,
    { bind: { siteIds }, type: QueryTypes.SELECT },
  );
  return new Map(rows.map(({ siteId, userIds }) => [siteId, userIds]));
}
