import type { Transaction } from 'sequelize';
import { v7 } from 'uuid';
import type { Attachment } from '@/shared/record';
import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import { transact } from '../db';
import { AttachmentRow } from '../models/AttachmentRow';
import type { Worksheet } from '../models/Worksheet';
import { allows } from '../policies/worksheet';
import { conflict, idTaken, wrongState } from '../problem';
import { deleteObject, putObject } from '../storage';
import { contentHash, hashOfRow, sha256 } from './contentHash';
import { lockWorksheet } from './findWorksheet';
import { encodePhoto, PHOTO_TYPE } from './photoImage';
import { currentRevision } from './readRecord';
import { recordEvent } from './recordEvent';
import { attachmentsOf } from './writeDraft';

export const MAX_ATTACHMENTS = 20;

export const photoKey = (id: string) => `photos/${id}`;
export const thumbnailKey = (id: string) => `thumbnails/${id}`;

interface NewAttachment {
  id?: string | undefined;
  section: Attachment['section'];
  caption: string;
  file: Buffer;
}

/** Photos of the plan are frozen with its first signature, those of the close-out when it is closed. */
export function checkPhotoState({ state }: Worksheet, section: Attachment['section']): void {
  const act = section === 'closeOut' ? 'attachToCloseOut' : 'attach';
  if (!allows(state, act)) throw wrongState(state);
}

/** What a signed revision holds never changes, also while a later one is written. */
export function checkUnsigned(worksheet: Worksheet, { section, revision }: AttachmentRow): void {
  checkPhotoState(worksheet, section);
  if (revision === worksheet.revision) return;
  throw wrongState(worksheet.state, 'An earlier revision that was signed holds this photo.');
}

/** Brings the content hash of a draft up to the photos that it now holds. */
export async function rehash(worksheet: Worksheet, transaction: Transaction): Promise<void> {
  const { id: worksheetId, revision } = worksheet;
  const row = await currentRevision(worksheet, transaction);
  const attachments = await attachmentsOf(worksheetId, revision, transaction);
  const { content } = row;
  await row.update(
    { contentHash: contentHash({ worksheetId, revision, content, attachments }) },
    { transaction },
  );
}

async function repeatOf(actor: CurrentUser, worksheetId: string, id: string, received: string) {
  const existing = await AttachmentRow.findByPk(id);
  if (existing === null) return null;
  const isSame =
    existing.worksheetId === worksheetId &&
    existing.createdById === actor.id &&
    existing.receivedSha256 === received;
  if (!isSame) throw idTaken();
  return existing;
}

interface Insertion extends Omit<NewAttachment, 'file' | 'id'> {
  id: string;
  photo: Buffer;
  received: string;
}

function insert(actor: CurrentUser, worksheetId: string, insertion: Insertion) {
  const { id, section, caption, photo, received } = insertion;
  return transact(async (transaction) => {
    const worksheet = await lockWorksheet(worksheetId, transaction);
    checkPhotoState(worksheet, section);
    const count = await AttachmentRow.count({ where: { worksheetId }, transaction });
    if (count >= MAX_ATTACHMENTS) throw conflict('A worksheet holds at most 20 photos.');
    const now = clock.now();
    const row = await AttachmentRow.create(
      {
        ...{ id, worksheetId, section, caption },
        revision: worksheet.revision,
        type: PHOTO_TYPE,
        byteCount: photo.length,
        sha256: sha256(photo),
        receivedSha256: received,
        createdById: actor.id,
        createdAt: now,
      },
      { transaction },
    );
    if (section !== 'closeOut') await rehash(worksheet, transaction);
    await worksheet.update({ updatedAt: now }, { transaction });
    await recordEvent(transaction, {
      subjectType: 'worksheet',
      subjectId: worksheetId,
      revision: worksheet.revision,
      type: 'photo-added',
      actorId: actor.id,
      payload: {
        ...{ attachmentId: id, sha256: row.sha256, section, state: worksheet.state },
        photoHash: hashOfRow(row),
      },
    });
    return row;
  });
}

/** Takes a photo to a worksheet. The bytes are stored before the row that names them. */
export async function addAttachment(
  actor: CurrentUser,
  worksheet: Worksheet,
  { id = v7(), section, caption, file }: NewAttachment,
): Promise<{ row: AttachmentRow; created: boolean }> {
  const received = sha256(file);
  const earlier = await repeatOf(actor, worksheet.id, id, received);
  if (earlier !== null) return { row: earlier, created: false };
  checkPhotoState(worksheet, section);
  const { photo, thumbnail } = await encodePhoto(file);
  try {
    await putObject(photoKey(id), photo, PHOTO_TYPE);
    await putObject(thumbnailKey(id), thumbnail, PHOTO_TYPE);
    const row = await insert(actor, worksheet.id, { id, section, caption, photo, received });
    return { row, created: true };
  } catch (fault) {
    const repeat = await repeatOf(actor, worksheet.id, id, received);
    if (repeat !== null) return { row: repeat, created: false };
    await Promise.all([deleteObject(photoKey(id)), deleteObject(thumbnailKey(id))]);
    throw fault;
  }
}
