import { screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { workedOutHash } from '@/components/trail/contentCheck';
import { EventList } from '@/components/trail/EventList';
import { factDifferences } from '@/components/trail/factDifferences';
import { messages } from '@/shared/messages';
import type { WorksheetEvent } from '@/shared/record';
import { renderScreen } from '../../support/renderScreen';
import { soundWorksheet } from '../../support/soundWorksheet';

const { content } = soundWorksheet();
const options = { locale: 'en-US', units: 'feet', timeZone: 'America/Chicago' } as const;
const differ = (after: typeof content) =>
  factDifferences(content, after, options, messages('en-US').trail);

describe('factDifferences', () => {
  it('names the field, what it was and what it is', () => {
    const supply = { ...content.supply, circuit: '16' };
    expect(differ({ ...content, supply })).toMatchObject([
      { section: 'supply', label: 'Circuit', before: '7', after: '16' },
    ]);
  });

  it('follows a row to another place and lists only what changed in it', () => {
    const [first, ...rest] = content.sources ?? [];
    const moved = [...rest, { ...first, lockNumber: 'L-9' }];
    const added = { id: 'new', kind: 'traveler' as const };
    const found = differ({ ...content, sources: [added, ...moved] });
    expect(found.filter(({ after }) => after === 'L-9')).toHaveLength(1);
    expect(found.every(({ before, after }) => before === undefined || after === 'L-9')).toBe(true);
  });

  it('finds nothing between a content and itself', () => {
    expect(differ(structuredClone(content))).toEqual([]);
  });
});

describe('workedOutHash', () => {
  const signed = { worksheetId: 'w', revision: 1, content, attachments: [] };

  it('leaves the photos of the close-out aside and notices any other change', async () => {
    const photo = { id: 'p', caption: '', sha256: 'a', section: 'closeOut' as const };
    const plain = await workedOutHash(signed);
    expect(plain).toMatch(/^[0-9a-f]{64}$/);
    expect(await workedOutHash({ ...signed, attachments: [photo] })).toBe(plain);
    expect(await workedOutHash({ ...signed, content: { ...content, notes: 'x' } })).not.toBe(plain);
  });
});

describe('EventList', () => {
  const event = (seq: number, changes: Partial<WorksheetEvent>): WorksheetEvent => ({
    seq,
    type: 'created',
    actorId: 'a',
    actorName: 'Ruth Ansbach',
    enteredById: null,
    at: '2026-10-14T15:41:00Z',
    payload: {},
    hash: 'ab'.repeat(32),
    previousHash: null,
    ...changes,
  });

  it('tells who did what, in site time, on whose session', () => {
    const events = [
      event(1, {}),
      event(2, {
        type: 'acknowledged',
        actorId: 'm',
        actorName: 'Mateo Quiroga',
        enteredById: 'a',
        enteredByName: 'Ruth Ansbach',
      }),
      event(3, { type: 'stopped', payload: { reason: 'still live' } }),
    ];
    renderScreen(<EventList events={events} timeZone="America/Denver" />);
    const [, acknowledged, stopped] = screen.getAllByRole('listitem');
    expect(acknowledged?.textContent).toContain('Mateo Quiroga was briefed and signed.');
    expect(acknowledged?.textContent).toContain('Entered on the session of Ruth Ansbach');
    expect(acknowledged?.textContent).toContain('09:41');
    expect(stopped?.textContent).toContain('“It is still live”');
  });
});
