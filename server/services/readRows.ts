import { Op, QueryTypes } from 'sequelize';
import type { WorksheetRow } from '@/shared/record';
import { sequelize } from '../db';
import { QuestionRow } from '../models/QuestionRow';
import { SignatureRow } from '../models/SignatureRow';
import type { Worksheet } from '../models/Worksheet';
import { awaitingAcknowledgement } from '../policies/worksheetActions';
import { loadPeople } from './readRecord';
import type { People } from './readRecord';

/** What a row of a list needs beside the worksheet's own columns. */
export interface RowParts {
  worksheet: Worksheet;
  place: { siteName: string | null; timeZone: string };
  crew: WorksheetRow['crew'];
  awaiting: string[];
  questions: QuestionRow[];
  people: People;
}

interface Head {
  id: string;
  siteName: string | null;
  timeZone: string;
  crew: { userId?: string; name?: string }[] | null;
}

function heads(ids: string[]): Promise<Head[]> {
  return sequelize.query<Head>(
    `SELECT w.id, s.name AS "siteName", r.content -> 'crew' AS crew,
            coalesce(s.time_zone,
                     (SELECT z.time_zone FROM site_members m JOIN sites z ON z.id = m.site_id
                       WHERE m.user_id = w.lead_id ORDER BY z.name, z.id LIMIT 1),
                     'UTC') AS "timeZone"
       FROM worksheets w
       JOIN worksheet_revisions r ON r.worksheet_id = w.id AND r.revision = w.revision
       LEFT JOIN sites s ON s.id = w.site_id
      WHERE w.id = ANY($ids::uuid[])`,
    { bind: { ids }, type: QueryTypes.SELECT },
  );
}

/** Reads what a page of rows needs, in a fixed number of queries however long the page. */
export async function loadRowParts(worksheets: readonly Worksheet[]): Promise<RowParts[]> {
  if (worksheets.length === 0) return [];
  const ids = worksheets.map(({ id }) => id);
  const inBriefing = worksheets.filter(({ state }) => state === 'briefing').map(({ id }) => id);
  const [headRows, signatures, questions] = await Promise.all([
    heads(ids),
    SignatureRow.findAll({
      attributes: ['worksheetId', 'revision', 'meaning', 'signerId'],
      where: { worksheetId: inBriefing },
    }),
    QuestionRow.findAll({
      where: { worksheetId: ids, answer: { [Op.is]: null } },
      order: [['askedAt', 'ASC']],
    }),
  ]);
  const headOf = new Map(headRows.map((head) => [head.id, head]));
  const people = await loadPeople([
    ...worksheets.flatMap(({ leadId, reasonById }) => [leadId, reasonById]),
    ...questions.map(({ askedById }) => askedById),
  ]);
  return worksheets.map((worksheet) => {
    const { id, revision, state } = worksheet;
    const { siteName = null, timeZone = 'UTC', crew = null } = headOf.get(id) ?? {};
    const signed = signatures.filter((row) => row.worksheetId === id && row.revision === revision);
    return {
      worksheet,
      place: { siteName, timeZone },
      crew: (crew ?? []).map((member) => ({
        userId: member.userId ?? null,
        name: member.name ?? '',
      })),
      awaiting: state === 'briefing' ? awaitingAcknowledgement(worksheet, signed) : [],
      questions: questions.filter((row) => row.worksheetId === id),
      people,
    };
  });
}
