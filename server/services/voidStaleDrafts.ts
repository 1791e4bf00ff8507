import { Op } from 'sequelize';
import { clock } from '../clock';
import { transact } from '../db';
import { Worksheet } from '../models/Worksheet';
import { changeState } from './changeState';
import { lockWorksheet } from './findWorksheet';

const DAY = 24 * 3_600_000;
export const STALE_AFTER_DAYS = 90;

/** Voids drafts that nobody touched for 90 days; answers how many. Run every night. */
export async function voidStaleDrafts(): Promise<number> {
  const limit = new Date(clock.now().getTime() - STALE_AFTER_DAYS * DAY);
  const where = { state: 'draft' as const, updatedAt: { [Op.lt]: limit } };
  const stale = await Worksheet.findAll({ attributes: ['id'], where, limit: 1000 });
  let voided = 0;
  for (const { id } of stale) {
    await transact(async (transaction) => {
      const worksheet = await lockWorksheet(id, transaction);
      if (worksheet.state !== 'draft' || worksheet.updatedAt >= limit) return;
      await changeState(transaction, {
        worksheet,
        to: 'void',
        type: 'voided',
        actorId: null,
        reason: `untouched for ${STALE_AFTER_DAYS} days`,
      });
      voided += 1;
    });
  }
  return voided;
}
