import { Router } from 'express';
import type { Request, Response } from 'express';
import { z } from 'zod';
import {
  answerSchema,
  askSchema,
  attachmentInputSchema,
  closeSchema,
  copySchema,
  createWorksheetSchema,
  proveSchema,
  reasonSchema,
  reviseSchema,
  saveWorksheetSchema,
  signSchema,
} from '@/shared/record';
import { currentUser } from '../currentUser';
import type { CurrentUser } from '../currentUser';
import { requireUser } from '../middleware/requireUser';
import { upload } from '../middleware/upload';
import type { Worksheet } from '../models/Worksheet';
import { parse, parseId } from '../parse';
import { renderWorksheetPdf } from '../pdf/renderWorksheetPdf';
import {
  isCrew,
  isLead,
  mayCopy,
  mayCreate,
  mayReturn,
  maySign,
  mayStop,
  mayVoid,
} from '../policies/worksheet';
import {
  presentAttachment,
  presentProof,
  presentQuestion,
  presentSignature,
  presentWorksheet,
} from '../presenters/worksheet';
import { presentEvent, presentRevision, presentRevisionDetail } from '../presenters/history';
import { presentWorksheetRow } from '../presenters/worksheetRow';
import { invalidField, notAllowed, notFound, preconditionRequired } from '../problem';
import { addAttachment } from '../services/addAttachment';
import { answerQuestion, findQuestion } from '../services/answerQuestion';
import { askQuestion } from '../services/askQuestion';
import type { ReasonedService } from '../services/changeState';
import { closeWorksheet } from '../services/closeWorksheet';
import { copyWorksheet } from '../services/copyWorksheet';
import { createWorksheet } from '../services/createWorksheet';
import { findWorksheet } from '../services/findWorksheet';
import { listWorksheets, worksheetListSchema } from '../services/listWorksheets';
import { pdfInput } from '../services/pdfInput';
import { proveWorksheet } from '../services/proveWorksheet';
import { listEvents, listRevisions, readRevision } from '../services/readHistory';
import { loadParts, loadPeople } from '../services/readRecord';
import { loadRowParts } from '../services/readRows';
import { returnWorksheet } from '../services/returnWorksheet';
import { reviseWorksheet } from '../services/reviseWorksheet';
import { saveWorksheet } from '../services/saveWorksheet';
import { signWorksheet } from '../services/signWorksheet';
import { stopWorksheet } from '../services/stopWorksheet';
import { voidWorksheet } from '../services/voidWorksheet';

export const worksheetsRouter = Router();
worksheetsRouter.use(requireUser);

const pdfQuerySchema = z.strictObject({
  revision: z.coerce.number().int().min(1).max(1_000_000).optional(),
  language: z.enum(['en', 'es']).default('en'),
});

type Policy = (person: CurrentUser, worksheet: Worksheet) => boolean;

/** The worksheet of the path, for an act: 404 where it is not visible, 403 where the relation does not fit. */
async function worksheetFor(req: Request, may: Policy = () => true) {
  const actor = currentUser(req);
  const worksheet = await findWorksheet(actor, parseId(req.params['worksheetId']));
  if (!may(actor, worksheet)) throw notAllowed();
  return { actor, worksheet };
}

async function sendWorksheet(
  res: Response,
  actor: CurrentUser,
  worksheet: Worksheet,
  status = 200,
) {
  const record = presentWorksheet(actor, await loadParts(worksheet));
  res.status(status).setHeader('ETag', `"${record.version}"`);
  if (status === 201) res.location(`/api/worksheets/${record.id}`);
  res.json(record);
}

/** The version in `If-Match: "3"`; what names no version of ours matches none. */
function versionOf(req: Request): number {
  const header = req.get('If-Match');
  if (header === undefined) throw preconditionRequired();
  const version = /^\s*(?:W\/)?"(\d{1,9})"\s*$/.exec(header)?.[1];
  return version === undefined ? -1 : Number(version);
}

worksheetsRouter.get('/', async (req, res) => {
  const query = parse(worksheetListSchema, req.query);
  const { rows, nextCursor } = await listWorksheets(currentUser(req), query);
  res.json({ items: (await loadRowParts(rows)).map(presentWorksheetRow), nextCursor });
});

worksheetsRouter.post('/', async (req, res) => {
  const actor = currentUser(req);
  if (!mayCreate(actor)) throw notAllowed();
  const body = parse(createWorksheetSchema, req.body);
  const { worksheet, created } = await createWorksheet(actor, body);
  await sendWorksheet(res, actor, worksheet, created ? 201 : 200);
});

worksheetsRouter.get('/:worksheetId', async (req, res) => {
  const { actor, worksheet } = await worksheetFor(req);
  await sendWorksheet(res, actor, worksheet);
});

worksheetsRouter.put('/:worksheetId', async (req, res) => {
  const { actor, worksheet } = await worksheetFor(req, isLead);
  const version = versionOf(req);
  const { content } = parse(saveWorksheetSchema, req.body);
  const saved = await saveWorksheet(actor, { worksheetId: worksheet.id, version, content });
  await sendWorksheet(res, actor, saved);
});

worksheetsRouter.post('/:worksheetId/signatures', async (req, res) => {
  const { actor, worksheet } = await worksheetFor(req, maySign);
  const body = parse(signSchema, req.body);
  const { signature, created } = await signWorksheet(actor, worksheet, body);
  const people = await loadPeople([signature.enteredById]);
  res.status(created ? 201 : 200).json(presentSignature(signature, people));
});

worksheetsRouter.post('/:worksheetId/proofs', async (req, res) => {
  const { actor, worksheet } = await worksheetFor(req, isLead);
  const body = parse(proveSchema, req.body);
  const { row, created } = await proveWorksheet(actor, worksheet, body);
  res.status(created ? 201 : 200).json(presentProof(row));
});

worksheetsRouter.post('/:worksheetId/questions', async (req, res) => {
  const { actor, worksheet } = await worksheetFor(req, isCrew);
  const body = parse(askSchema, req.body);
  const { row, created } = await askQuestion(actor, worksheet, body);
  const people = await loadPeople([row.askedById, row.answeredById]);
  res.status(created ? 201 : 200).json(presentQuestion(row, people));
});

worksheetsRouter.post('/:worksheetId/questions/:questionId/answer', async (req, res) => {
  const { actor, worksheet } = await worksheetFor(req);
  const { id: questionId } = await findQuestion(worksheet.id, parseId(req.params.questionId));
  if (!isLead(actor, worksheet)) throw notAllowed();
  const body = parse(answerSchema, req.body);
  const { row, created } = await answerQuestion(actor, worksheet, { questionId, ...body });
  const people = await loadPeople([row.askedById, row.answeredById]);
  res.status(created ? 201 : 200).json(presentQuestion(row, people));
});

const reasonedActs: [string, Policy, ReasonedService][] = [
  ['return', mayReturn, returnWorksheet],
  ['stop', mayStop, stopWorksheet],
  ['void', mayVoid, voidWorksheet],
];
for (const [act, may, service] of reasonedActs) {
  worksheetsRouter.post(`/:worksheetId/${act}`, async (req, res) => {
    const { actor, worksheet } = await worksheetFor(req, may);
    const body = parse(reasonSchema, req.body);
    await sendWorksheet(res, actor, await service(actor, { worksheetId: worksheet.id, ...body }));
  });
}

worksheetsRouter.post('/:worksheetId/revise', async (req, res) => {
  const { actor, worksheet } = await worksheetFor(req, isLead);
  const { id } = parse(reviseSchema, req.body);
  await sendWorksheet(res, actor, await reviseWorksheet(actor, worksheet.id, id));
});

worksheetsRouter.post('/:worksheetId/close', async (req, res) => {
  const { actor, worksheet } = await worksheetFor(req, isLead);
  const body = parse(closeSchema, req.body);
  await sendWorksheet(res, actor, await closeWorksheet(actor, worksheet, body));
});

worksheetsRouter.post('/:worksheetId/copy', async (req, res) => {
  const { actor, worksheet } = await worksheetFor(req, mayCopy);
  const { id } = parse(copySchema, req.body ?? {});
  const { worksheet: copy, created } = await copyWorksheet(actor, { worksheet, id });
  await sendWorksheet(res, actor, copy, created ? 201 : 200);
});

worksheetsRouter.get('/:worksheetId/revisions', async (req, res) => {
  const { worksheet } = await worksheetFor(req);
  res.json({ items: (await listRevisions(worksheet)).map(presentRevision) });
});

worksheetsRouter.get('/:worksheetId/revisions/:revision', async (req, res) => {
  const { worksheet } = await worksheetFor(req);
  if (!/^[1-9]\d{0,8}$/.test(req.params.revision)) throw notFound();
  const parts = await readRevision(worksheet, Number(req.params.revision));
  res.json(presentRevisionDetail(parts));
});

worksheetsRouter.get('/:worksheetId/events', async (req, res) => {
  const { worksheet } = await worksheetFor(req);
  const { events, people } = await listEvents(worksheet);
  res.json({ items: events.map((event) => presentEvent(event, people)) });
});

worksheetsRouter.post('/:worksheetId/attachments', async (req, res) => {
  const { actor, worksheet } = await worksheetFor(req, isLead);
  const file = await upload(req, res);
  const body = parse(attachmentInputSchema, req.body ?? {});
  if (file === undefined) throw invalidField('#/file', 'required', 'Send the photo as `file`.');
  const photo = { ...body, file: file.buffer };
  const { row, created } = await addAttachment(actor, worksheet, photo);
  res.status(created ? 201 : 200).json(presentAttachment(row));
});

worksheetsRouter.get('/:worksheetId/pdf', async (req, res) => {
  const { worksheet } = await worksheetFor(req);
  const { revision = worksheet.revision, language } = parse(pdfQuerySchema, req.query);
  const bytes = await renderWorksheetPdf(await pdfInput(worksheet, revision), language);
  res
    .setHeader('Content-Type', 'application/pdf')
    .setHeader(
      'Content-Disposition',
      `inline; filename="worksheet-${worksheet.number}-r${revision}-${language}.pdf"`,
    )
    .end(bytes);
});
