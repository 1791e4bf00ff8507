import { screen, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { BoardScreen } from '@/components/board/BoardScreen';
import type { WorksheetRow } from '@/shared/record';
import { stubServer } from '../../support/fetchFake';
import { buildUser, renderScreen } from '../../support/renderScreen';
import { buildRow } from '../../support/worksheetRow';

const supervisor = buildUser({
  id: '0190b5a4-0000-7000-8000-0000000000e1',
  name: 'Ines Dalgaard',
  role: 'supervisor',
});
/** 11:12 on the wall of the site. */
const NOW = '2026-12-01T19:12:00.000Z';
let count = 0;
const row = (changes: Partial<WorksheetRow>) => {
  count += 1;
  const id = `0190b5a4-0000-7000-8000-00000000f0${String(count).padStart(2, '0')}`;
  return buildRow({ id, number: `2026-0001${String(count).padStart(2, '0')}`, ...changes });
};

beforeEach(() => {
  vi.useFakeTimers({ now: new Date(NOW), shouldAdvanceTime: true });
  count = 0;
});
afterEach(() => {
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

function show(items: WorksheetRow[]) {
  stubServer({ '/worksheets?state=briefing': { items, nextCursor: null } });
  renderScreen(<BoardScreen />, { user: supervisor });
}

describe('BoardScreen', () => {
  it('puts energized work first, then over time and stopped, then treat as live', async () => {
    show([
      row({ state: 'in-force', proved: true }),
      row({ state: 'in-force', proved: false }),
      row({
        state: 'stopped',
        reasonBy: 'Bea Lindqvist',
        updatedAt: '2026-12-01T18:20:00.000Z',
      }),
      row({ state: 'expired', endsAt: '2026-12-01T18:30:00.000Z' }),
      row({ state: 'in-force', mode: 'energized' }),
    ]);
    const part = await screen.findByRole('region', { name: 'In force now' });
    const bars = within(part)
      .getAllByRole('img')
      .map((bar) => bar.getAttribute('aria-label'));
    expect(bars.map((bar) => bar?.split(', 0')[0]?.split(', 1')[0])).toEqual([
      'Energized',
      '42\u00a0min over, not closed',
      'Stopped 10:20 by Bea Lindqvist',
      'Not proved dead: treat as live',
      'Off, proved dead',
    ]);
    expect(within(part).getByText('3 in force, 1 over time, 1 stopped')).toBeTruthy();
  });

  it('asks nobody to countersign who is on the crew', async () => {
    const crew = [{ userId: supervisor.id, name: supervisor.name }];
    show([row({ state: 'countersign', crew })]);
    const waits = await screen.findByRole('region', { name: 'Waits for you' });
    expect(within(waits).getByText('Nothing waits for your signature.')).toBeTruthy();
  });

  it('names what waits and says when its exceptions could not be read', async () => {
    show([row({ state: 'countersign' })]);
    const waits = await screen.findByRole('region', { name: 'Waits for you' });
    expect(
      within(waits).getByRole('heading', { name: 'Replace a driver or ballast' }),
    ).toBeTruthy();
    expect(
      await within(waits).findByText('The exceptions could not be read. Open every field.'),
    ).toBeTruthy();
    expect(within(waits).getByRole('link', { name: 'Every field' })).toBeTruthy();
    expect(within(waits).queryByRole('link', { name: 'Countersign' })).toBeNull();
  });
});
