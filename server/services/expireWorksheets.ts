import { Op } from 'sequelize';
import { clock } from '../clock';
import { transact } from '../db';
import { Worksheet } from '../models/Worksheet';
import { notify, supervisorsOf } from './notify';
import { recordEvent } from './recordEvent';

const RUNNING = ['briefing', 'countersign', 'in-force'] as const;

function isOver({ state, endsAt }: Worksheet): boolean {
  return (RUNNING as readonly string[]).includes(state) && endsAt !== null && endsAt < clock.now();
}

async function expire(worksheetId: string): Promise<Worksheet> {
  return transact(async (transaction) => {
    const worksheet = await Worksheet.findByPk(worksheetId, {
      transaction,
      lock: transaction.LOCK.UPDATE,
      rejectOnEmpty: true,
    });
    if (!isOver(worksheet)) return worksheet;
    const from = worksheet.state;
    await worksheet.update({ state: 'expired', updatedAt: clock.now() }, { transaction });
    const event = await recordEvent(transaction, {
      subjectType: 'worksheet',
      subjectId: worksheet.id,
      revision: worksheet.revision,
      type: 'expired',
      actorId: null,
      payload: { from, state: 'expired', endsAt: worksheet.endsAt },
    });
    const supervisors = await supervisorsOf(worksheet, transaction);
    const recipientIds = [worksheet.leadId, ...supervisors];
    await notify(transaction, { event, news: 'expired', worksheet, recipientIds });
    return worksheet;
  });
}

/** The worksheet, expired first when its planned end has passed: nobody is shown one that is over as in force. */
export async function expireIfOver(worksheet: Worksheet): Promise<Worksheet> {
  return isOver(worksheet) ? expire(worksheet.id) : worksheet;
}

/** Expires every worksheet whose planned end has passed; answers how many. Run by the clock and before every list. */
export async function expireWorksheets(): Promise<number> {
  const over = await Worksheet.findAll({
    attributes: ['id'],
    where: { state: [...RUNNING], endsAt: { [Op.lt]: clock.now() } },
    order: [['endsAt', 'ASC']],
    limit: 500,
  });
  for (const { id } of over) await expire(id);
  return over.length;
}
