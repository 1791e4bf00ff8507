import type { CurrentUser } from '../currentUser';
import type { Worksheet } from '../models/Worksheet';
import { actOnce, changeState } from './changeState';
import { currentRevision } from './readRecord';
import { writeDraft } from './writeDraft';

/**
 * Starts the next revision with the content of the last. Signatures and proofs
 * stay with the revision that they were given for and no longer count.
 */
export function reviseWorksheet(
  actor: CurrentUser,
  worksheetId: string,
  id?: string,
): Promise<Worksheet> {
  return actOnce(actor, { worksheetId, act: 'revise', id }, async (worksheet, transaction) => {
    const { content } = await currentRevision(worksheet, transaction);
    worksheet.set({
      revision: worksheet.revision + 1,
      version: worksheet.version + 1,
      proved: false,
    });
    await changeState(transaction, {
      worksheet,
      to: 'draft',
      type: 'revised',
      actorId: actor.id,
    });
    await writeDraft({ worksheet, content, actorId: actor.id }, transaction);
  });
}
