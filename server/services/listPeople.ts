import { literal, Op, QueryTypes } from 'sequelize';
import type { WhereOptions } from 'sequelize';
import type { CurrentUser } from '../currentUser';
import { sequelize } from '../db';
import { beyond, cutPage, newestFirst } from '../keyset';
import type { Page } from '../keyset';
import { User } from '../models/User';
import type { PersonPlaces } from '../presenters/user';
import { notFound } from '../problem';

/** Whose records this person may read: safety everybody's, others those of active people of their own sites. */
function visibleTo({ id, role, siteIds }: CurrentUser): WhereOptions<User> {
  if (role === 'safety') return {};
  const list = siteIds.map((siteId) => sequelize.escape(siteId)).join(', ') || 'NULL';
  return {
    retiredAt: { [Op.is]: null },
    [Op.or]: [
      { id },
      literal(`EXISTS (SELECT 1 FROM site_members m
                        WHERE m.user_id = "User"."id" AND m.site_id IN (${list}))`),
    ],
  };
}

export async function listPeople(
  actor: CurrentUser,
  { cursor, limit }: Page,
): Promise<{ rows: User[]; nextCursor: string | null }> {
  const where = { [Op.and]: [visibleTo(actor), beyond(cursor)] } as WhereOptions<User>;
  return cutPage(await User.findAll({ where, order: newestFirst, limit: limit + 1 }), limit);
}

/** A person that this one may see; 404 otherwise, whether they exist or not. */
export async function findPerson(actor: CurrentUser, id: string): Promise<User> {
  const where = { [Op.and]: [{ id }, visibleTo(actor)] } as WhereOptions<User>;
  const user = await User.findOne({ where });
  if (user === null) throw notFound();
  return user;
}

/** Where each of these people belongs, and the zone of their first site by name. */
export async function placesOf(userIds: string[]): Promise<Map<string, PersonPlaces>> {
  const rows = await sequelize.query<{ userId: string; siteId: string; timeZone: string }>(
    `SELECT m.user_id AS "userId", s.id AS "siteId", s.time_zone AS "timeZone"
       FROM site_members m JOIN sites s ON s.id = m.site_id
      WHERE m.user_id = ANY($userIds::uuid[]) AND s.retired_at IS NULL
      ORDER BY s.name, s.id`,
    { bind: { userIds }, type: QueryTypes.SELECT },
  );
  const places = new Map<string, PersonPlaces>(
    userIds.map((id) => [id, { siteIds: [], timeZone: 'UTC' }]),
  );
  for (const { userId, siteId, timeZone } of rows) {
    const place = places.get(userId);
    if (place === undefined) continue;
    if (place.siteIds.length === 0) place.timeZone = timeZone;
    place.siteIds.push(siteId);
  }
  return places;
}
