import { actOnce, changeState } from './changeState';
import type { ReasonedService } from './changeState';

/** Withdraws a worksheet that never came into force. Its record stays. */
export const voidWorksheet: ReasonedService = (actor, { worksheetId, id, reason }) =>
  actOnce(actor, { worksheetId, act: 'void', id }, async (worksheet, transaction) => {
    await changeState(transaction, {
      worksheet,
      to: 'void',
      type: 'voided',
      actorId: actor.id,
      reason,
    });
  });
