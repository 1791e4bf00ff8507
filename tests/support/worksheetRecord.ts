import { assess } from '@/hazard';
import type { WorksheetRecord } from '@/shared/record';
import { soundWorksheet } from './soundWorksheet';

/** A record as the server answers it, for tests of screens: the sound worksheet, waiting for its crew. */
export function buildRecord(changes: Partial<WorksheetRecord> = {}): WorksheetRecord {
  const { on, content } = soundWorksheet();
  const shown = changes.content ?? content;
  return {
    id: '0190b5a4-0000-7000-8000-0000000000e1',
    number: '2026-000417',
    state: 'briefing',
    proved: false,
    revision: 2,
    version: 7,
    content: shown,
    contentHash: '7b1e40c9a2d8'.padEnd(56, '0') + 'ad27f814',
    assessment: assess(shown, { on }),
    workAssessment: null,
    signatures: [],
    proofs: [],
    closeOut: null,
    questions: [],
    attachments: [],
    leadId: '0190b5a4-0000-7000-8000-0000000000b1',
    leadName: 'Ruth Ansbach',
    siteName: 'Brindle Court',
    timeZone: 'America/Chicago',
    reason: null,
    clearedStops: [],
    actions: ['sign:acknowledged', 'ask', 'stop'],
    createdAt: '2026-12-01T14:00:00.000Z',
    updatedAt: '2026-12-01T14:30:00.000Z',
    ...changes,
  };
}
