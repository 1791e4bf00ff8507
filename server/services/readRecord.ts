import type { Transaction } from 'sequelize';
import type { Assessment } from '@/hazard/types';
import { clock } from '../clock';
import { AttachmentRow } from '../models/AttachmentRow';
import { CloseOutRow } from '../models/CloseOutRow';
import { ProofRow } from '../models/ProofRow';
import { QuestionRow } from '../models/QuestionRow';
import { SignatureRow } from '../models/SignatureRow';
import { User } from '../models/User';
import type { Worksheet } from '../models/Worksheet';
import { WorksheetRevision } from '../models/WorksheetRevision';
import { assessAt } from './assessAt';
import { placeOf } from './placeOf';
import type { WorksheetPlace } from './placeOf';

/** People by id, for names. Retired ones too: the record keeps who it was. */
export type People = ReadonlyMap<string, Pick<User, 'id' | 'name' | 'role'>>;

/** Everything that one worksheet's record is made of, at its current revision. */
export interface WorksheetParts extends WorksheetPlace {
  worksheet: Worksheet;
  revision: WorksheetRevision;
  signatures: SignatureRow[];
  proofs: ProofRow[];
  closeOut: CloseOutRow | null;
  questions: QuestionRow[];
  attachments: AttachmentRow[];
  assessment: Assessment;
  workAssessment: Assessment | null;
  people: People;
}

export async function loadPeople(
  ids: readonly (string | null | undefined)[],
  transaction?: Transaction,
): Promise<People> {
  const known = [...new Set(ids.filter((id) => typeof id === 'string'))];
  const rows =
    known.length === 0
      ? []
      : await User.findAll({
          attributes: ['id', 'name', 'role'],
          where: { id: known },
          transaction,
        });
  return new Map(rows.map((row) => [row.id, row]));
}

/** The revision as it stands; that it exists is a promise of the database. */
export async function currentRevision(
  worksheet: Pick<Worksheet, 'id' | 'revision'>,
  transaction?: Transaction,
): Promise<WorksheetRevision> {
  const where = { worksheetId: worksheet.id, revision: worksheet.revision };
  return WorksheetRevision.findOne({ where, transaction, rejectOnEmpty: true });
}

interface Readings {
  worksheet: Worksheet;
  revision: WorksheetRevision;
  proofs: ProofRow[];
  timeZone: string;
}

/** In force off path: as it stands with the latest proof, also before the first. Later: as the last proof left it. */
function workAssessmentOf({ worksheet, revision, proofs, timeZone }: Readings): Assessment | null {
  const latest = proofs.at(-1);
  if (worksheet.mode !== 'off') return null;
  if (worksheet.state !== 'in-force') return latest?.assessment ?? null;
  const { content } = revision;
  return assessAt({ content, at: clock.now(), timeZone, stage: 'work', proof: latest?.proof });
}

/** Reads all parts of a worksheet's record. */
export async function loadParts(
  worksheet: Worksheet,
  transaction?: Transaction,
): Promise<WorksheetParts> {
  const { id: worksheetId } = worksheet;
  const ofRevision = { worksheetId, revision: worksheet.revision };
  const [revision, place, signatures, proofs, closeOut, questions, attachments] = [
    await currentRevision(worksheet, transaction),
    await placeOf(worksheet, transaction),
    await SignatureRow.findAll({
      where: ofRevision,
      order: [
        ['receivedAt', 'ASC'],
        ['signedAt', 'ASC'],
      ],
      transaction,
    }),
    await ProofRow.findAll({
      where: ofRevision,
      order: [
        ['at', 'ASC'],
        ['id', 'ASC'],
      ],
      transaction,
    }),
    await CloseOutRow.findOne({ where: { worksheetId }, transaction }),
    await QuestionRow.findAll({
      where: { worksheetId },
      order: [
        ['askedAt', 'ASC'],
        ['id', 'ASC'],
      ],
      transaction,
    }),
    await AttachmentRow.findAll({
      where: { worksheetId },
      order: [
        ['createdAt', 'ASC'],
        ['id', 'ASC'],
      ],
      transaction,
    }),
  ];
  const people = await loadPeople(
    [
      worksheet.leadId,
      worksheet.reasonById,
      ...signatures.map(({ enteredById }) => enteredById),
      ...questions.flatMap(({ askedById, answeredById }) => [askedById, answeredById]),
    ],
    transaction,
  );
  const { timeZone } = place;
  // A signed revision keeps the assessment that it was signed under.
  const assessment =
    revision.assessment ?? assessAt({ content: revision.content, at: clock.now(), timeZone });
  const workAssessment = workAssessmentOf({ worksheet, revision, proofs, timeZone });
  return {
    worksheet,
    revision,
    ...place,
    signatures,
    proofs,
    closeOut,
    questions,
    attachments,
    assessment,
    workAssessment,
    people,
  };
}
