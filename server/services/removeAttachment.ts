import type { CurrentUser } from '../currentUser';
import { transact } from '../db';
import { AttachmentRow } from '../models/AttachmentRow';
import { deleteObject } from '../storage';
import { checkUnsigned, photoKey, rehash, thumbnailKey } from './addAttachment';
import { lockWorksheet } from './findWorksheet';
import { recordEvent } from './recordEvent';

/** Takes back a photo that nobody has signed. */
export async function removeAttachment(actor: CurrentUser, photo: AttachmentRow): Promise<void> {
  const { id, worksheetId, section } = photo;
  await transact(async (transaction) => {
    const worksheet = await lockWorksheet(worksheetId, transaction);
    checkUnsigned(worksheet, photo);
    await AttachmentRow.destroy({ where: { id }, transaction });
    if (section !== 'closeOut') await rehash(worksheet, transaction);
    await recordEvent(transaction, {
      subjectType: 'worksheet',
      subjectId: worksheetId,
      revision: worksheet.revision,
      type: 'photo-removed',
      actorId: actor.id,
      payload: { attachmentId: id, state: worksheet.state },
    });
  });
  await Promise.all([deleteObject(photoKey(id)), deleteObject(thumbnailKey(id))]);
}
