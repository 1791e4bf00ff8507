import { actOnce, changeState } from './changeState';
import type { ReasonedService } from './changeState';
import { notify } from './notify';

/** A supervisor sends it back with a reason; the lead revises it. */
export const returnWorksheet: ReasonedService = (actor, { worksheetId, id, reason }) =>
  actOnce(actor, { worksheetId, act: 'return', id }, async (worksheet, transaction) => {
    const event = await changeState(transaction, {
      worksheet,
      to: 'returned',
      type: 'returned',
      actorId: actor.id,
      reason,
    });
    const recipientIds = [worksheet.leadId];
    await notify(transaction, { event, news: 'returned', worksheet, recipientIds, reason });
  });
