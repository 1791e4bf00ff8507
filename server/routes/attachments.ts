import { Router } from 'express';
import type { Request, Response } from 'express';
import { attachmentUpdateSchema } from '@/shared/record';
import { currentUser } from '../currentUser';
import type { CurrentUser } from '../currentUser';
import { requireUser } from '../middleware/requireUser';
import { AttachmentRow } from '../models/AttachmentRow';
import { parse, parseId } from '../parse';
import { isLead } from '../policies/worksheet';
import { presentAttachment } from '../presenters/worksheet';
import { notAllowed, notFound } from '../problem';
import { photoKey, thumbnailKey } from '../services/addAttachment';
import { findWorksheet } from '../services/findWorksheet';
import { recaptionAttachment } from '../services/recaptionAttachment';
import { removeAttachment } from '../services/removeAttachment';
import { getObject } from '../storage';

export const attachmentsRouter = Router();
attachmentsRouter.use(requireUser);

/** A photo of a worksheet that this person may see; 404 otherwise. */
async function photoFor(actor: CurrentUser, req: Request) {
  const photo = await AttachmentRow.findByPk(parseId(req.params['attachmentId']));
  if (photo === null) throw notFound();
  return { photo, worksheet: await findWorksheet(actor, photo.worksheetId) };
}

/** Whatever the bytes are, a browser shows them as a picture or not at all. */
async function sendBytes(res: Response, photo: AttachmentRow, key: string): Promise<void> {
  const bytes = await getObject(key);
  if (bytes === null) throw notFound();
  res
    .setHeader('Content-Type', photo.type)
    .setHeader('Content-Disposition', `inline; filename="${photo.id}.jpg"`)
    .setHeader('X-Content-Type-Options', 'nosniff')
    .setHeader('Content-Security-Policy', 'sandbox')
    .end(bytes);
}

attachmentsRouter.get('/:attachmentId', async (req, res) => {
  const { photo } = await photoFor(currentUser(req), req);
  await sendBytes(res, photo, photoKey(photo.id));
});

attachmentsRouter.get('/:attachmentId/thumbnail', async (req, res) => {
  const { photo } = await photoFor(currentUser(req), req);
  // The bytes behind an id never change.
  res.setHeader('Cache-Control', 'private, max-age=86400');
  await sendBytes(res, photo, thumbnailKey(photo.id));
});

attachmentsRouter.patch('/:attachmentId', async (req, res) => {
  const actor = currentUser(req);
  const { photo, worksheet } = await photoFor(actor, req);
  if (!isLead(actor, worksheet)) throw notAllowed();
  const { caption } = parse(attachmentUpdateSchema, req.body);
  res.json(presentAttachment(await recaptionAttachment(actor, photo, caption)));
});

attachmentsRouter.delete('/:attachmentId', async (req, res) => {
  const actor = currentUser(req);
  const { photo, worksheet } = await photoFor(actor, req);
  if (!isLead(actor, worksheet)) throw notAllowed();
  await removeAttachment(actor, photo);
  res.status(204).end();
});
