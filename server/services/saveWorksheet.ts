import type { WorksheetContent } from '@/shared/worksheet';
import type { CurrentUser } from '../currentUser';
import { transact } from '../db';
import type { Worksheet } from '../models/Worksheet';
import { allows } from '../policies/worksheet';
import { presentWorksheet } from '../presenters/worksheet';
import { invalidInput, staleVersion, wrongState } from '../problem';
import { applyRegister } from './applyRegister';
import { lockWorksheet } from './findWorksheet';
import { currentRevision, loadParts } from './readRecord';
import { isSameContent, writeDraft } from './writeDraft';

interface Save {
  worksheetId: string;
  /** The version that the client saw, from If-Match. */
  version: number;
  content: WorksheetContent;
}

/**
 * Replaces the content of a draft. The same content again is accepted whatever
 * version it names and whatever the state: it is a save whose answer was lost.
 */
export async function saveWorksheet(
  actor: CurrentUser,
  { worksheetId, version, content }: Save,
): Promise<Worksheet> {
  return transact(async (transaction) => {
    const worksheet = await lockWorksheet(worksheetId, transaction);
    const stored = (await currentRevision(worksheet, transaction)).content;
    const isDraft = allows(worksheet.state, 'save');
    if (!isDraft && isSameContent(stored, content)) return worksheet;
    const answer = await applyRegister({ content, leadId: worksheet.leadId }, transaction);
    if (answer.errors.length > 0) throw invalidInput(answer.errors);
    if (isSameContent(stored, answer.content)) return worksheet;
    // Only the register moved since: that is written down, whoever saw which version.
    const isRepeat = isSameContent(stored, content);
    if (!isRepeat && worksheet.version !== version) {
      throw staleVersion(presentWorksheet(actor, await loadParts(worksheet, transaction)));
    }
    if (!isDraft) throw wrongState(worksheet.state);
    worksheet.version += 1;
    await writeDraft({ worksheet, content: answer.content, actorId: actor.id }, transaction);
    return worksheet;
  });
}
