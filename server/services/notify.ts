import { Op, QueryTypes } from 'sequelize';
import type { Transaction } from 'sequelize';
import { messages } from '@/shared/messages';
import type { Messages } from '@/shared/messages';
import type { Locale } from '@/shared/user';
import { sequelize } from '../db';
import type { Event } from '../models/Event';
import { User } from '../models/User';
import type { Worksheet } from '../models/Worksheet';
import { queueMail } from './queueMail';

/** What a mail about a worksheet tells. */
export type WorksheetNews = keyof Messages['mail']['worksheet'];

interface News {
  event: Pick<Event, 'seq'>;
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

/** A ready reason in the reader's language; own words as they were written. */
function reasonIn(locale: Locale, reason: string): string {
  const ready: Readonly<Record<string, string>> = messages(locale).enumerations.stopReason;
  return Object.hasOwn(ready, reason) ? (ready[reason] ?? reason) : reason;
}

/** Queues one mail a person as part of the transaction of what it tells about. */
export async function notify(
  transaction: Transaction,
  { event, news, worksheet, recipientIds, reason }: News,
): Promise<void> {
  const people = await User.findAll({
    where: { id: [...new Set(recipientIds)], retiredAt: { [Op.is]: null } },
    order: [['id', 'ASC']],
    transaction,
  });
  for (const recipient of people) {
    await queueMail(transaction, {
      recipient,
      about: `event ${event.seq} ${news}`,
      words: (mail) => ({
        subject: mail.worksheet[news].subject(worksheet.number),
        body:
          reason === undefined
            ? mail.worksheet[news].body
            : `${mail.worksheet[news].body}\n\n${mail.reason(reasonIn(recipient.locale, reason))}`,
      }),
      path: `/worksheets/${worksheet.id}`,
    });
  }
}
