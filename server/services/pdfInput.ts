import { QueryTypes } from 'sequelize';
import type { WorksheetRecord } from '@/shared/record';
import { publicUrl } from '../env';
import { sequelize } from '../db';
import { CloseOutRow } from '../models/CloseOutRow';
import { ProofRow } from '../models/ProofRow';
import { QuestionRow } from '../models/QuestionRow';
import { Site } from '../models/Site';
import type { Worksheet } from '../models/Worksheet';
import type { PdfInput } from '../pdf/input';
import { presentRecord } from '../presenters/worksheet';
import { getObject } from '../storage';
import { photoKey } from './addAttachment';
import { canonicalJson, signedForm } from './contentHash';
import { listEvents, listRevisions, readRevision } from './readHistory';
import { loadPeople } from './readRecord';
import type { WorksheetParts } from './readRecord';
import { placeOf } from './placeOf';

type Printed = Omit<WorksheetRecord, 'actions'>;

/** The state, reason and close-out belong to the revision in force; an earlier one is printed as it was left. */
async function partsOf(
  worksheet: Worksheet,
  revision: number,
): Promise<WorksheetParts & { state: Printed['state'] }> {
  const { id: worksheetId } = worksheet;
  const where = { worksheetId, revision };
  const detail = await readRevision(worksheet, revision);
  const [proofs, questions, closeOut, place] = await Promise.all([
    ProofRow.findAll({
      where,
      order: [
        ['at', 'ASC'],
        ['id', 'ASC'],
      ],
    }),
    QuestionRow.findAll({
      where,
      order: [
        ['askedAt', 'ASC'],
        ['id', 'ASC'],
      ],
    }),
    CloseOutRow.findOne({ where }),
    placeOf(worksheet),
  ]);
  const people = await loadPeople([
    worksheet.leadId,
    worksheet.reasonById,
    ...detail.signatures.map(({ enteredById }) => enteredById),
    ...questions.flatMap(({ askedById, answeredById }) => [askedById, answeredById]),
  ]);
  return {
    worksheet,
    ...place,
    proofs,
    questions,
    closeOut,
    people,
    revision: detail.revision,
    signatures: detail.signatures,
    attachments: detail.attachments,
    assessment: detail.assessment,
    workAssessment: proofs.at(-1)?.assessment ?? null,
    state: detail.state as Printed['state'],
  };
}

/** Of a revision that was replaced: how it ended, from its own events. */
function ofRevision(
  record: Printed,
  { state, revision, proofs }: WorksheetParts & { state: Printed['state'] },
): Printed {
  if (record.revision === revision.revision) return record;
  return {
    ...record,
    state,
    revision: revision.revision,
    proved: proofs.at(-1)?.assessment.verdict === 'ready',
    reason: null,
  };
}

async function siteOf(siteId: string | null): Promise<PdfInput['site']> {
  const site = siteId === null ? null : await Site.findByPk(siteId);
  return site === null ? null : { name: site.name, address: site.address };
}

/** When something was last recorded on the revision: what makes the bytes of its PDF repeat. */
async function enteredBy(worksheetId: string): Promise<Map<string, string>> {
  const found = await sequelize.query<{ seq: string; name: string }>(
    `SELECT e.seq, u.name FROM events e JOIN users u ON u.id = e.entered_by_id
      WHERE e.subject_id = $worksheetId AND e.entered_by_id IS DISTINCT FROM e.actor_id`,
    { bind: { worksheetId }, type: QueryTypes.SELECT },
  );
  return new Map(found.map(({ seq, name }) => [seq, name]));
}

/** Everything that the printed record of one revision is made of; 404 for a revision that is not there. */
export async function pdfInput(worksheet: Worksheet, number: number): Promise<PdfInput> {
  const parts = await partsOf(worksheet, number);
  const { revision, attachments } = parts;
  const { content } = revision;
  const { id: worksheetId } = worksheet;
  const [site, revisions, { events, people }, entered] = await Promise.all([
    siteOf(worksheet.siteId),
    listRevisions(worksheet),
    listEvents(worksheet),
    enteredBy(worksheetId),
  ]);
  const held = attachments.map(({ id, sha256, section }) => ({ id, sha256, section }));
  return {
    worksheet: ofRevision(presentRecord(parts), parts),
    latestRevision: worksheet.revision,
    site,
    revisions: revisions.map((row) => ({
      revision: row.revision.revision,
      contentHash: row.revision.contentHash,
      createdAt: row.revision.createdAt.toISOString(),
      createdByName: row.people.get(row.revision.createdById)?.name ?? '',
      state: row.revision.revision === worksheet.revision ? '' : row.state,
    })),
    events: events.map((event) => ({
      type: event.type,
      at: event.at.toISOString(),
      actorName: event.actorId === null ? null : (people.get(event.actorId)?.name ?? null),
      enteredByName: entered.get(event.seq) ?? null,
    })),
    attachments: await Promise.all(
      attachments.map(async ({ id, section, caption, sha256 }) => ({
        ...{ id, section, caption, sha256 },
        jpeg: await getObject(photoKey(id)),
      })),
    ),
    verifyUrl: `${publicUrl()}/verify/${worksheet.number}/${revision.contentHash}`,
    canonicalJson: canonicalJson(
      signedForm({ worksheetId, revision: number, content, attachments: held }),
    ),
    edition: revision.edition,
  };
}
