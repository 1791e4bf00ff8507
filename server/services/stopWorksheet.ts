import { actOnce, changeState } from './changeState';
import type { ReasonedService } from './changeState';
import { notify, supervisorsOf } from './notify';

/** Anyone named on it, or a supervisor of the site, stops the work. Everybody else on it is told. */
export const stopWorksheet: ReasonedService = (actor, { worksheetId, id, reason }) =>
  actOnce(actor, { worksheetId, act: 'stop', id }, async (worksheet, transaction) => {
    const event = await changeState(transaction, {
      worksheet,
      to: 'stopped',
      type: 'stopped',
      actorId: actor.id,
      reason,
    });
    const named = [worksheet.leadId, ...worksheet.crewIds];
    const supervisors = await supervisorsOf(worksheet, transaction);
    const recipientIds = [...named, ...supervisors].filter((id) => id !== actor.id);
    await notify(transaction, { event, news: 'stopped', worksheet, recipientIds, reason });
  });
