import { actOn, changeState } from './changeState';
import type { ReasonedService } from './changeState';

/** Withdraws a worksheet that never came into force. Its record stays. */
export const voidWorksheet: ReasonedService = (actor, { worksheetId, reason }) =>
  actOn(worksheetId, 'void', async (worksheet, transaction) => {
    await changeState(transaction, {
      worksheet,
      to: 'void',
      type: 'voided',
      actorId: actor.id,
      reason,
    });
    return worksheet;
  });
