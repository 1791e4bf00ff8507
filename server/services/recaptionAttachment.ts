import type { CurrentUser } from '../currentUser';
import { transact } from '../db';
import { AttachmentRow } from '../models/AttachmentRow';
import { notFound } from '../problem';
import { checkUnsigned } from './addAttachment';
import { hashOfRow } from './contentHash';
import { lockWorksheet } from './findWorksheet';
import { recordEvent } from './recordEvent';

/** Puts the words under a photo right while nobody has signed it. The caption is no part of the content hash. */
export async function recaptionAttachment(
  actor: CurrentUser,
  { id, worksheetId }: Pick<AttachmentRow, 'id' | 'worksheetId'>,
  caption: string,
): Promise<AttachmentRow> {
  return transact(async (transaction) => {
    const worksheet = await lockWorksheet(worksheetId, transaction);
    // Read under the lock: it may have been taken out meanwhile.
    const photo = await AttachmentRow.findByPk(id, { transaction });
    if (photo === null) throw notFound();
    checkUnsigned(worksheet, photo);
    if (photo.caption === caption) return photo;
    await photo.update({ caption }, { transaction });
    await recordEvent(transaction, {
      subjectType: 'worksheet',
      subjectId: worksheetId,
      revision: worksheet.revision,
      type: 'photo-captioned',
      actorId: actor.id,
      payload: { attachmentId: id, state: worksheet.state, photoHash: hashOfRow(photo) },
    });
    return photo;
  });
}
