import { describe, expect, it } from 'vitest';
import { homeGroups } from '@/components/home/groups';
import { waitsFor } from '@/components/home/waiting';
import { messages } from '@/shared/messages';
import { buildUser } from '../../support/renderScreen';
import { buildRow } from '../../support/worksheetRow';

const words = messages('en-US');
const lead = buildUser();
const helper = buildUser({ id: '0190b5a4-0000-7000-8000-000000000002', role: 'helper' });
const supervisor = buildUser({ id: '0190b5a4-0000-7000-8000-000000000003', role: 'supervisor' });

describe('what waits for a person', () => {
  it('puts what is in force and not proved dead before all else', () => {
    const rows = [
      buildRow({
        id: 'a',
        state: 'returned',
        reason: 'The traveler is not listed.',
        reasonBy: 'Ines Dalgaard',
      }),
      buildRow({ id: 'b', state: 'in-force' }),
    ];
    const found = waitsFor(lead, rows, words);
    expect(found.map((item) => item.title)).toEqual([
      'Not proved dead: treat as live',
      'Returned by Ines Dalgaard',
    ]);
    expect(found[0]?.note).toContain('Until 13:30');
    expect(found[1]?.action).toBe('Make revision 2');
    expect(found[1]?.note).toContain('“The traveler is not listed.”');
  });

  it('asks for no proof of energized work, which has none', () => {
    const [item] = waitsFor(lead, [buildRow({ state: 'in-force', mode: 'energized' })], words);
    expect(item).toMatchObject({ mark: 'energized', action: 'Close it out' });
  });

  it('shows nothing for proved work that is in time', () => {
    expect(waitsFor(lead, [buildRow({ state: 'in-force', proved: true })], words)).toEqual([]);
  });

  it('shows a question to the lead, whatever the state', () => {
    const row = buildRow({
      state: 'countersign',
      openQuestions: [{ text: 'Who watches the door?', byName: 'Lio Petrov' }],
    });
    expect(waitsFor(lead, [row], words)).toMatchObject([
      { title: 'Lio Petrov asks', action: 'Answer' },
    ]);
  });

  it('shows a briefing only to those who have not signed', () => {
    const row = buildRow({ state: 'briefing', awaiting: [helper.id] });
    expect(waitsFor(helper, [row], words)).toMatchObject([{ action: 'Read and sign' }]);
    expect(waitsFor(helper, [{ ...row, awaiting: [] }], words)).toEqual([]);
  });

  it('tells the crew of a stopped worksheet to keep hands off', () => {
    const row = buildRow({ state: 'stopped', reasonBy: 'Lio Petrov', reason: 'still live' });
    expect(waitsFor(helper, [row], words)[0]?.title).toBe('Stopped by Lio Petrov: hands off');
  });

  it('asks a supervisor to countersign, unless named on the crew', () => {
    const row = buildRow({ state: 'countersign' });
    expect(waitsFor(supervisor, [row], words)).toHaveLength(1);
    const named = { ...row, crew: [{ userId: supervisor.id, name: supervisor.name }] };
    expect(waitsFor(supervisor, [named], words)).toEqual([]);
  });

  it('leads to a ready draft to be signed, and not to an open one', () => {
    expect(waitsFor(lead, [buildRow({ verdict: 'ready' })], words)).toMatchObject([
      { action: 'Sign the plan' },
    ]);
    expect(waitsFor(lead, [buildRow()], words)).toEqual([]);
  });
});

describe('the days of the start page', () => {
  // 23:30 on 1 December in Los Angeles is already the 2nd in UTC and in Chicago.
  const now = '2026-12-02T07:30:00.000Z';

  it('counts days on the wall of the site', () => {
    const groups = homeGroups([buildRow()], now);
    expect(groups.today).toHaveLength(1);
  });

  it('keeps what is in force with today, whatever day it was planned for', () => {
    const row = buildRow({ state: 'in-force', startsAt: '2026-11-30T22:00:00-08:00' });
    expect(homeGroups([row], now).today).toHaveLength(1);
  });

  it('tells earlier open ones from later ones and leaves old closed ones out', () => {
    const at = (day: string) => `2026-${day}T09:30:00-08:00`;
    const groups = homeGroups(
      [
        buildRow({ id: 'a', startsAt: at('11-20') }),
        buildRow({ id: 'b', startsAt: at('12-09') }),
        buildRow({ id: 'c', state: 'closed', startsAt: at('11-20'), updatedAt: at('11-20') }),
      ],
      now,
    );
    expect(groups.earlier.map((row) => row.id)).toEqual(['a']);
    expect(groups.later.map((row) => row.id)).toEqual(['b']);
    expect(groups.today).toEqual([]);
  });

  it('puts energized work first', () => {
    const rows = [
      buildRow({ id: 'a', state: 'in-force' }),
      buildRow({ id: 'b', state: 'in-force', mode: 'energized' }),
    ];
    expect(homeGroups(rows, now).today.map((row) => row.id)).toEqual(['b', 'a']);
  });
});
