import { Op, QueryTypes } from 'sequelize';
import { sequelize } from '../db';
import type { WorksheetContent } from '@/shared/worksheet';
import { AttachmentRow } from '../models/AttachmentRow';
import { CloseOutRow } from '../models/CloseOutRow';
import { Event } from '../models/Event';
import { ProofRow } from '../models/ProofRow';
import { QuestionRow } from '../models/QuestionRow';
import { SignatureRow } from '../models/SignatureRow';
import { Worksheet } from '../models/Worksheet';
import { WorksheetRevision } from '../models/WorksheetRevision';
import { getObject } from '../storage';
import { photoKey } from './addAttachment';
import { closeOutHash } from './closeWorksheet';
import { contentHash, hashOf, hashOfRow, sha256 } from './contentHash';
import { proofHash } from './proveWorksheet';
import { signatureHash } from './putSignature';
import type { Fault } from './verifyRecord';
import { columnsOf } from './writeDraft';

const BATCH = 200;

interface Rows {
  revisions: WorksheetRevision[];
  signatures: SignatureRow[];
  proofs: ProofRow[];
  closeOuts: CloseOutRow[];
  questions: QuestionRow[];
  attachments: AttachmentRow[];
  events: Event[];
}
type Report = (table: string, id: string, what: string) => void;
type Vouched = Map<string, Event>;

/** The events of one worksheet by the id that each vouches for. */
function vouchedFor(events: Event[], key: string): Vouched {
  const found = new Map<string, Event>();
  for (const event of events) {
    if (event.type === 'signature-refused' || event.type === 'stopped') continue;
    const id = event.payload[key];
    if (typeof id === 'string' && !found.has(id)) found.set(id, event);
  }
  return found;
}

interface Vouching<T> {
  table: string;
  rows: readonly T[];
  vouched: Vouched;
  /** The member of the payload that holds the hash. */
  member: string;
  hash: (row: T) => string;
}

/** Each row has the event that vouches for it, and each such event its row. */
function judgeRows<T extends { id: string }>(
  { table, rows, vouched, member, hash }: Vouching<T>,
  report: Report,
): void {
  const ids = new Set(rows.map(({ id }) => id));
  for (const row of rows) {
    const event = vouched.get(row.id);
    if (event === undefined) report(table, row.id, 'no event vouches for it');
    else if (event.payload[member] !== hash(row)) report(table, row.id, 'the row was changed');
  }
  for (const id of vouched.keys()) if (!ids.has(id)) report(table, id, 'the row is missing');
}

function judgeRevisions({ revisions, signatures, attachments }: Rows, report: Report): void {
  for (const row of revisions) {
    const { worksheetId, revision, content } = row;
    const id = `${worksheetId}/${revision}`;
    const held = attachments.filter((photo) => photo.revision <= revision);
    const recomputed = contentHash({ worksheetId, revision, content, attachments: held });
    if (recomputed !== row.contentHash) {
      report('worksheet_revisions', id, 'content or photos do not fit the content hash');
    }
    const own = signatures.filter((signature) => signature.revision === revision);
    for (const signature of own) {
      if (signature.contentHash !== row.contentHash) {
        report('worksheet_revisions', id, 'the content hash is not the one that was signed');
      }
      if (signature.meaning === 'prepared' && signature.assessmentHash !== hashOf(row.assessment)) {
        report('worksheet_revisions', id, 'the assessment is not the one that was signed');
      }
    }
  }
  for (const { id, revision } of signatures) {
    if (!revisions.some((row) => row.revision === revision)) {
      report('signatures', id, 'its revision is missing');
    }
  }
}

function judgeQuestions({ questions, events }: Rows, report: Report): void {
  const of = (type: string) =>
    new Map(
      events
        .filter((event) => event.type === type)
        .map((event) => [event.payload['questionId'], event]),
    );
  const asked = of('asked');
  const answered = of('answered');
  for (const row of questions) {
    const question = asked.get(row.id);
    const isAsAsked =
      question?.payload['textHash'] === sha256(row.text) && question.actorId === row.askedById;
    if (!isAsAsked) report('questions', row.id, 'the question was changed');
    const answer = answered.get(row.id);
    const isAsAnswered =
      (answer?.payload['textHash'] ?? null) === (row.answer === null ? null : sha256(row.answer)) &&
      (answer?.actorId ?? null) === row.answeredById;
    if (!isAsAnswered) report('questions', row.id, 'the answer was changed');
    asked.delete(row.id);
  }
  for (const id of asked.keys()) report('questions', String(id), 'the row is missing');
}

type Deciding = Pick<Worksheet, 'siteId' | 'startsAt' | 'endsAt' | 'mode' | 'crewIds'>;

/** The columns that decide who sees it and when it is over must be those of the content. */
function standsAsItsContent(worksheet: Worksheet, content: WorksheetContent): boolean {
  const deciding = ({ siteId, startsAt, endsAt, mode, crewIds }: Deciding) =>
    JSON.stringify([siteId, startsAt, endsAt, mode, crewIds]);
  return deciding(worksheet) === deciding(columnsOf(content));
}

function judgeHead(worksheet: Worksheet, { revisions, events, proofs }: Rows, report: Report) {
  const { id, number, state, revision, leadId, proved } = worksheet;
  const [first] = events;
  const wrong = (what: string) => report('worksheets', id, what);
  if (first?.type !== 'created') return wrong('no event tells of its creation');
  if (first.payload['number'] !== number || first.payload['leadId'] !== leadId) {
    wrong('number or lead is not as at its creation');
  }
  const states = events.map(({ payload }) => payload['state']).filter((to) => to !== undefined);
  if (states.at(-1) !== state) wrong('its state is not the one that the trail ends with');
  if (Math.max(...revisions.map((row) => row.revision)) !== revision) {
    wrong('its revision is not the latest');
  }
  const head = revisions.find((row) => row.revision === revision);
  if (head !== undefined && !standsAsItsContent(worksheet, head.content)) {
    wrong('its place, hours, path or crew are not those of its content');
  }
  const latest = proofs.filter((row) => row.revision === revision).at(-1);
  if (proved !== (latest?.assessment.verdict === 'ready')) {
    wrong('proved dead or not is not what the latest proof says');
  }
}

async function judgePhotos({ attachments, events }: Rows, report: Report): Promise<void> {
  const taken = new Set(
    events
      .filter(({ type }) => type === 'photo-removed')
      .map((event) => event.payload['attachmentId']),
  );
  const vouched = vouchedFor(
    events.filter(({ type }) => type === 'photo-added'),
    'attachmentId',
  );
  // The latest words under a photo are vouched for by the event that changed them.
  for (const event of events) {
    const id = String(event.payload['attachmentId']);
    if (event.type === 'photo-captioned' && vouched.has(id)) vouched.set(id, event);
  }
  for (const id of taken) vouched.delete(String(id));
  judgeRows(
    {
      table: 'attachments',
      rows: attachments,
      vouched,
      member: 'photoHash',
      hash: hashOfRow,
    },
    report,
  );
  for (const row of attachments) {
    const bytes = await getObject(photoKey(row.id));
    if (bytes === null) report('attachments', row.id, 'its file is missing');
    else if (sha256(bytes) !== row.sha256) report('attachments', row.id, 'its file was changed');
  }
}

async function judge(worksheet: Worksheet, rows: Rows, report: Report): Promise<void> {
  const { signatures, proofs, closeOuts, attachments, events } = rows;
  judgeHead(worksheet, rows, report);
  judgeRevisions(rows, report);
  judgeRows(
    {
      table: 'signatures',
      rows: signatures,
      vouched: vouchedFor(events, 'signatureId'),
      member: 'signatureHash',
      hash: signatureHash,
    },
    report,
  );
  judgeRows(
    {
      table: 'proofs',
      rows: proofs,
      vouched: vouchedFor(events, 'proofId'),
      member: 'proofHash',
      hash: proofHash,
    },
    report,
  );
  const closing = attachments.filter(({ section }) => section === 'closeOut');
  judgeRows(
    {
      table: 'close_outs',
      rows: closeOuts,
      vouched: vouchedFor(events, 'closeOutId'),
      member: 'closeOutHash',
      hash: (row) => closeOutHash(row, closing),
    },
    report,
  );
  judgeQuestions(rows, report);
  await judgePhotos(rows, report);
}

async function loadRows(ids: string[]): Promise<Rows> {
  const where = { worksheetId: ids };
  const [revisions, signatures, proofs, closeOuts, questions, attachments, events] =
    await Promise.all([
      WorksheetRevision.findAll({ where }),
      SignatureRow.findAll({ where }),
      ProofRow.findAll({
        where,
        order: [
          ['at', 'ASC'],
          ['id', 'ASC'],
        ],
      }),
      CloseOutRow.findAll({ where }),
      QuestionRow.findAll({ where }),
      AttachmentRow.findAll({ where }),
      Event.findAll({ where: { subjectId: ids }, order: [['seq', 'ASC']] }),
    ]);
  return { revisions, signatures, proofs, closeOuts, questions, attachments, events };
}

function ofWorksheet(rows: Rows, worksheetId: string): Rows {
  const own = <T extends { worksheetId: string }>(list: T[]) =>
    list.filter((row) => row.worksheetId === worksheetId);
  return {
    revisions: own(rows.revisions),
    signatures: own(rows.signatures),
    proofs: own(rows.proofs),
    closeOuts: own(rows.closeOuts),
    questions: own(rows.questions),
    attachments: own(rows.attachments),
    events: rows.events.filter(({ subjectId }) => subjectId === worksheetId),
  };
}

/** Worksheets that the trail knows of and that are not there. */
async function missingWorksheets(): Promise<string[]> {
  const rows = await sequelize.query<{ id: string }>(
    `SELECT DISTINCT e.subject_id AS id FROM events e
      WHERE e.subject_type = 'worksheet'
        AND NOT EXISTS (SELECT 1 FROM worksheets w WHERE w.id = e.subject_id)`,
    { type: QueryTypes.SELECT },
  );
  return rows.map(({ id }) => id);
}

/** Holds every worksheet's rows against its trail; answers how many of each there are. */
export async function verifyWorksheets(faults: Fault[]): Promise<Record<string, number>> {
  const report: Report = (table, id, what) => faults.push({ table, id, what });
  const counts = { worksheets: 0, revisions: 0, signatures: 0, proofs: 0, closeOuts: 0, photos: 0 };
  let after = '00000000-0000-0000-0000-000000000000';
  for (;;) {
    const worksheets = await Worksheet.findAll({
      where: { id: { [Op.gt]: after } },
      order: [['id', 'ASC']],
      limit: BATCH,
    });
    const last = worksheets.at(-1);
    if (last === undefined) break;
    after = last.id;
    const rows = await loadRows(worksheets.map(({ id }) => id));
    for (const worksheet of worksheets) {
      await judge(worksheet, ofWorksheet(rows, worksheet.id), report);
    }
    counts.worksheets += worksheets.length;
    counts.revisions += rows.revisions.length;
    counts.signatures += rows.signatures.length;
    counts.proofs += rows.proofs.length;
    counts.closeOuts += rows.closeOuts.length;
    counts.photos += rows.attachments.length;
  }
  for (const id of await missingWorksheets()) report('worksheets', id, 'the row is missing');
  return counts;
}
