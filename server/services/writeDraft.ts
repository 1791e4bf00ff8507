import { Op } from 'sequelize';
import type { Transaction } from 'sequelize';
import type { Assessment, Finding, Severity } from '@/hazard/types';
import type { WorksheetContent } from '@/shared/worksheet';
import { clock } from '../clock';
import { AttachmentRow } from '../models/AttachmentRow';
import { User } from '../models/User';
import type { Severities, Worksheet } from '../models/Worksheet';
import { WorksheetRevision } from '../models/WorksheetRevision';
import type { SeenStop } from '../models/WorksheetRevision';
import { assessAt } from './assessAt';
import { canonicalJson, contentHash } from './contentHash';
import { placeOf } from './placeOf';

/** The photos that a revision holds: its own and those of the revisions before. */
export function attachmentsOf(
  worksheetId: string,
  revision: number,
  transaction?: Transaction,
): Promise<AttachmentRow[]> {
  return AttachmentRow.findAll({
    where: { worksheetId, revision: { [Op.lte]: revision } },
    order: [['id', 'ASC']],
    transaction,
  });
}

function dateOrNull(value: string | undefined): Date | null {
  return value === undefined ? null : new Date(value);
}

function unique<T>(values: readonly T[]): T[] {
  return [...new Set(values)];
}

/** The columns that lists, filters and the search read; all of them follow from the content. */
export function columnsOf(content: WorksheetContent) {
  const { job, supply, decision, crew } = content;
  return {
    siteId: job?.siteId ?? null,
    startsAt: dateOrNull(job?.startsAt),
    endsAt: dateOrNull(job?.endsAt),
    mode: decision?.mode ?? null,
    task: job?.task ?? null,
    system: supply?.system ?? null,
    circuitVolts: supply?.circuitVolts ?? null,
    area: job?.area ?? '',
    equipment: job?.equipment ?? '',
    crewIds: unique((crew ?? []).flatMap(({ userId }) => userId ?? [])),
  };
}

/** Everything that the search finds a worksheet by. */
function searchDocument(
  content: WorksheetContent,
  { number, siteName, leadName }: { number: string; siteName: string | null; leadName: string },
): string {
  const { job, supply, crew, notes } = content;
  const circuit = [supply?.panel, supply?.circuit].filter(Boolean).join('/');
  const names = (crew ?? []).map(({ name }) => name);
  return [
    number,
    siteName,
    job?.area,
    job?.equipment,
    job?.task,
    job?.description,
    job?.workOrder,
    circuit,
    leadName,
    ...names,
    notes,
  ]
    .filter((part) => part !== undefined && part !== null && part !== '')
    .join('\n');
}

const RANK: Record<Severity, number> = { stop: 0, open: 1, caution: 2 };

function worstOf(
  before: Severities,
  findings: readonly Pick<Finding, 'code' | 'severity'>[],
): Severities {
  const worst = { ...before };
  for (const { code, severity } of findings) {
    const known = worst[code];
    if (known === undefined || RANK[severity] < RANK[known]) worst[code] = severity;
  }
  return worst;
}

/** The columns that say how the worksheet stands. */
export function verdictColumns(assessment: Assessment) {
  const count = (severity: string) =>
    assessment.findings.filter((finding) => finding.severity === severity).length;
  return {
    verdict: assessment.verdict,
    stopCount: count('stop'),
    openCount: count('open'),
    cautionCount: count('caution'),
    findingCodes: unique(assessment.findings.map(({ code }) => code)),
    standing: worstOf({}, assessment.findings),
  };
}

/** What was met on the way, with more findings added to it. */
export function metColumns(
  { met }: Pick<Worksheet, 'met'>,
  findings: readonly Pick<Finding, 'code' | 'severity'>[],
) {
  const all = worstOf(met, findings);
  return { met: all, metCodes: Object.keys(all) };
}

function stopsOf(assessment: Assessment): SeenStop[] {
  return assessment.findings
    .filter(({ severity }) => severity === 'stop')
    .map(({ code, path }) => ({ code, path }));
}

function addStops(seen: readonly SeenStop[], met: readonly SeenStop[]): SeenStop[] {
  const known = new Set(seen.map(({ code, path }) => `${code} ${path}`));
  return [...seen, ...met.filter(({ code, path }) => !known.has(`${code} ${path}`))];
}

/** True when two contents are the same to whoever signs them. */
export function isSameContent(one: WorksheetContent, other: WorksheetContent): boolean {
  return canonicalJson(one) === canonicalJson(other);
}

interface Draft {
  worksheet: Worksheet;
  content: WorksheetContent;
  actorId: string;
}

/**
 * Puts a content into the draft revision of a worksheet whose row the caller
 * holds: its hash, its columns, and every stop that it held on the way.
 */
export async function writeDraft(
  { worksheet, content, actorId }: Draft,
  transaction: Transaction,
): Promise<WorksheetRevision> {
  const { id: worksheetId, revision, leadId, number } = worksheet;
  const now = clock.now();
  const columns = columnsOf(content);
  const { siteName, timeZone } = await placeOf({ siteId: columns.siteId, leadId }, transaction);
  const assessment = assessAt({ content, at: now, timeZone });
  const attachments = await attachmentsOf(worksheetId, revision, transaction);
  const lead = await User.findByPk(leadId, { attributes: ['name'], transaction });
  const [row] = await WorksheetRevision.findOrBuild({
    where: { worksheetId, revision },
    defaults: {
      worksheetId,
      revision,
      content,
      contentHash: '',
      edition: assessment.edition,
      assessment: null,
      createdById: actorId,
      createdAt: now,
      updatedAt: now,
    },
    transaction,
  });
  const stops = stopsOf(assessment);
  row.set({
    content,
    contentHash: contentHash({ worksheetId, revision, content, attachments }),
    edition: assessment.edition,
    stopsSeen: addStops(row.stopsSeen, stops),
    updatedAt: now,
  });
  await row.save({ transaction });
  const document = searchDocument(content, { number, siteName, leadName: lead?.name ?? '' });
  worksheet.set({
    ...columns,
    ...verdictColumns(assessment),
    ...metColumns(
      worksheet,
      assessment.findings.filter(({ severity }) => severity === 'stop'),
    ),
    authorIds: unique([
      ...worksheet.authorIds,
      ...(Object.keys(content).length > 0 ? [actorId] : []),
    ]),
    searchDocument: document,
    updatedAt: now,
  });
  await worksheet.save({ transaction });
  return row;
}
