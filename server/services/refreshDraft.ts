import type { CurrentUser } from '../currentUser';
import { transact } from '../db';
import { allows } from '../policies/worksheet';
import { applyRegister } from './applyRegister';
import { lockWorksheet } from './findWorksheet';
import { currentRevision } from './readRecord';
import { recordEvent } from './recordEvent';
import { isSameContent, writeDraft } from './writeDraft';

/**
 * Brings a draft up to what the register says now, in a transaction of its
 * own: when the signature is then refused for its hash, the lead reads the
 * changed content and signs that.
 */
export function refreshDraft(actor: CurrentUser, worksheetId: string): Promise<void> {
  return transact(async (transaction) => {
    const worksheet = await lockWorksheet(worksheetId, transaction);
    if (!allows(worksheet.state, 'save')) return;
    const { content } = await currentRevision(worksheet, transaction);
    const { leadId } = worksheet;
    const answer = await applyRegister({ content, leadId }, transaction);
    if (answer.errors.length > 0 || isSameContent(content, answer.content)) return;
    worksheet.version += 1;
    await writeDraft({ worksheet, content: answer.content, actorId: actor.id }, transaction);
    await recordEvent(transaction, {
      subjectType: 'worksheet',
      subjectId: worksheetId,
      revision: worksheet.revision,
      type: 'register-applied',
      actorId: null,
      payload: { version: worksheet.version, state: worksheet.state },
    });
  });
}
