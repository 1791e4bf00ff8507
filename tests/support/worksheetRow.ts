import type { WorksheetRow } from '@/shared/record';

/** A row of a list as the server answers it, all of it invented. */
export function buildRow(changes: Partial<WorksheetRow> = {}): WorksheetRow {
  return {
    id: '0190b5a4-0000-7000-8000-00000000f001',
    number: '2026-000123',
    state: 'draft',
    proved: false,
    mode: 'off',
    verdict: 'open',
    counts: { stop: 0, open: 3, caution: 0 },
    revision: 1,
    siteId: '0190b5a4-0000-7000-8000-0000000000a1',
    siteName: 'Brindle Court',
    timeZone: 'America/Los_Angeles',
    area: 'level 2 corridor',
    equipment: 'Luminaire C6',
    task: 'replace driver or ballast',
    system: '480Y/277',
    circuitVolts: 277,
    leadId: '0190b5a4-0000-7000-8000-000000000001',
    leadName: 'Ruth Ansbach',
    crew: [
      { userId: '0190b5a4-0000-7000-8000-000000000001', name: 'Ruth Ansbach' },
      { userId: '0190b5a4-0000-7000-8000-000000000002', name: 'Mateo Quiroga' },
    ],
    awaiting: [],
    openQuestions: [],
    reason: null,
    reasonBy: null,
    startsAt: '2026-12-01T09:30:00-08:00',
    endsAt: '2026-12-01T13:30:00-08:00',
    createdAt: '2026-12-01T16:00:00.000Z',
    updatedAt: '2026-12-01T16:30:00.000Z',
    ...changes,
  };
}
