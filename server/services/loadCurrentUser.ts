import { QueryTypes } from 'sequelize';
import type { CurrentUser } from '../currentUser';
import { sequelize } from '../db';

interface Row extends Omit<CurrentUser, 'siteIds'> {
  siteIds: string[];
  sessionEpoch: number;
}

/** The active person behind a session, with their active sites; `null` when retired or unknown. */
export async function loadCurrentUser(
  userId: string,
): Promise<{ user: CurrentUser; sessionEpoch: number } | null> {
  const [row] = await sequelize.query<Row>(
    `SELECT u.id, u.name, u.email, u.role, u.qualified_through AS "qualifiedThrough",
            u.locale, u.units, u.theme, u.pin_hash IS NOT NULL AS "hasPin",
            u.session_epoch AS "sessionEpoch",
            ARRAY(SELECT m.site_id FROM site_members m JOIN sites s ON s.id = m.site_id
                  WHERE m.user_id = u.id AND s.retired_at IS NULL
                  ORDER BY s.name, s.id) AS "siteIds"
       FROM users u
      WHERE u.id = $userId AND u.retired_at IS NULL`,
    { bind: { userId }, type: QueryTypes.SELECT },
  );
  if (row === undefined) return null;
  const { sessionEpoch, ...user } = row;
  return { user, sessionEpoch };
}
