import type { WorksheetRow } from '@/shared/record';
import type { RowParts } from '../services/readRows';

/** One line of a list, a queue or the board. */
export function presentWorksheetRow(parts: RowParts): WorksheetRow {
  const { worksheet, place, crew, awaiting, questions, people } = parts;
  const nameOf = (id: string | null) => (id === null ? '' : (people.get(id)?.name ?? ''));
  return {
    id: worksheet.id,
    number: worksheet.number,
    state: worksheet.state,
    proved: worksheet.proved,
    mode: worksheet.mode === 'off' || worksheet.mode === 'energized' ? worksheet.mode : null,
    verdict: worksheet.verdict,
    counts: {
      stop: worksheet.stopCount,
      open: worksheet.openCount,
      caution: worksheet.cautionCount,
    },
    metCodes: worksheet.metCodes,
    revision: worksheet.revision,
    siteId: worksheet.siteId,
    siteName: place.siteName,
    timeZone: place.timeZone,
    area: worksheet.area,
    equipment: worksheet.equipment,
    task: worksheet.task,
    system: worksheet.system,
    circuitVolts: worksheet.circuitVolts,
    leadId: worksheet.leadId,
    leadName: nameOf(worksheet.leadId),
    crew,
    awaiting,
    openQuestions: questions.map(({ text, askedById }) => ({ text, byName: nameOf(askedById) })),
    reason: worksheet.reason,
    reasonBy: worksheet.reasonById === null ? null : nameOf(worksheet.reasonById),
    startsAt: worksheet.startsAt?.toISOString() ?? null,
    endsAt: worksheet.endsAt?.toISOString() ?? null,
    createdAt: worksheet.createdAt.toISOString(),
    updatedAt: worksheet.updatedAt.toISOString(),
  };
}
