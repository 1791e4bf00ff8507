import type {
  Attachment,
  ProofRecord,
  Question,
  Signature,
  WorksheetRecord,
} from '@/shared/record';
import type { CurrentUser } from '../currentUser';
import type { AttachmentRow } from '../models/AttachmentRow';
import type { ProofRow } from '../models/ProofRow';
import type { QuestionRow } from '../models/QuestionRow';
import type { SignatureRow } from '../models/SignatureRow';
import { worksheetActions } from '../policies/worksheetActions';
import type { People, WorksheetParts } from '../services/readRecord';

function person(people: People, id: string): Signature['signer'] {
  const found = people.get(id);
  return { id, name: found?.name ?? '', role: found?.role ?? 'helper' };
}

export function presentSignature(row: SignatureRow, people: People): Signature {
  return {
    id: row.id,
    meaning: row.meaning,
    signer: { id: row.signerId, name: row.signerName, role: row.signerRole },
    enteredById: row.enteredById,
    enteredByName: people.get(row.enteredById)?.name ?? '',
    revision: row.revision,
    contentHash: row.contentHash,
    signedAt: row.signedAt.toISOString(),
    receivedAt: row.receivedAt.toISOString(),
    method: row.method,
    strokes: row.strokes,
  };
}

export function presentProof(row: ProofRow): ProofRecord {
  return {
    id: row.id,
    at: row.at.toISOString(),
    proof: row.proof,
    assessment: row.assessment,
    byId: row.byId,
    byName: row.byName,
    revision: row.revision,
  };
}

export function presentQuestion(row: QuestionRow, people: People): Question {
  return {
    id: row.id,
    text: row.text,
    askedBy: person(people, row.askedById),
    askedAt: row.askedAt.toISOString(),
    revision: row.revision,
    answer: row.answer,
    answeredBy: row.answeredById === null ? null : person(people, row.answeredById),
    answeredAt: row.answeredAt?.toISOString() ?? null,
  };
}

export function presentAttachment(row: AttachmentRow): Attachment {
  return { id: row.id, section: row.section, caption: row.caption, sha256: row.sha256 };
}

/** Stops of this revision that are not in the assessment that it stands under. */
function clearedStops({ revision, assessment }: WorksheetParts): WorksheetRecord['clearedStops'] {
  const standing = new Set(
    assessment.findings
      .filter(({ severity }) => severity === 'stop')
      .map(({ code, path }) => `${code} ${path}`),
  );
  return revision.stopsSeen.filter(({ code, path }) => !standing.has(`${code} ${path}`));
}

function reasonOf({ worksheet, people }: WorksheetParts): WorksheetRecord['reason'] {
  const { reason, reasonById, reasonAt } = worksheet;
  if (reason === null || reasonAt === null) return null;
  const byName = reasonById === null ? '' : person(people, reasonById).name;
  return { text: reason, byName, at: reasonAt.toISOString() };
}

/** The whole record of a worksheet, the same whoever asks. */
export function presentRecord(parts: WorksheetParts): Omit<WorksheetRecord, 'actions'> {
  const { worksheet, revision, signatures, questions, closeOut, people } = parts;
  return {
    id: worksheet.id,
    number: worksheet.number,
    state: worksheet.state,
    proved: worksheet.proved,
    revision: worksheet.revision,
    version: worksheet.version,
    content: revision.content,
    contentHash: revision.contentHash,
    assessment: parts.assessment,
    workAssessment: parts.workAssessment,
    signatures: signatures.map((row) => presentSignature(row, people)),
    proofs: parts.proofs.map(presentProof),
    closeOut: closeOut && {
      closeOut: closeOut.closeOut,
      at: closeOut.at.toISOString(),
      byName: closeOut.byName,
    },
    questions: questions.map((row) => presentQuestion(row, people)),
    attachments: parts.attachments.map(presentAttachment),
    leadId: worksheet.leadId,
    leadName: person(people, worksheet.leadId).name,
    siteName: parts.siteName,
    timeZone: parts.timeZone,
    reason: reasonOf(parts),
    clearedStops: clearedStops(parts),
    createdAt: worksheet.createdAt.toISOString(),
    updatedAt: worksheet.updatedAt.toISOString(),
  };
}

/** The record with what the asking person may do now. */
export function presentWorksheet(asking: CurrentUser, parts: WorksheetParts): WorksheetRecord {
  const { worksheet, signatures, questions } = parts;
  const hasOpenQuestion = questions.some(({ answer }) => answer === null);
  return {
    ...presentRecord(parts),
    actions: worksheetActions(asking, { worksheet, signatures, hasOpenQuestion }),
  };
}
