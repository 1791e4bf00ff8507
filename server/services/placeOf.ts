import { QueryTypes } from 'sequelize';
import type { Transaction } from 'sequelize';
import { sequelize } from '../db';

export interface WorksheetPlace {
  siteName: string | null;
  timeZone: string;
}

/**
 * Where a worksheet's clock hangs: the zone of its site; while no site is
 * chosen, that of the lead's first; a lead without any reads UTC.
 */
export async function placeOf(
  { siteId, leadId }: { siteId: string | null; leadId: string },
  transaction?: Transaction,
): Promise<WorksheetPlace> {
  const [place] = await sequelize.query<WorksheetPlace>(
    `SELECT (SELECT name FROM sites WHERE id = $siteId) AS "siteName",
            coalesce((SELECT time_zone FROM sites WHERE id = $siteId),
                     (SELECT s.time_zone FROM site_members m JOIN sites s ON s.id = m.site_id
                       WHERE m.user_id = $leadId ORDER BY s.name, s.id LIMIT 1),
                     'UTC') AS "timeZone"`,
    { bind: { siteId, leadId }, type: QueryTypes.SELECT, transaction },
  );
  return place ?? { siteName: null, timeZone: 'UTC' };
}
