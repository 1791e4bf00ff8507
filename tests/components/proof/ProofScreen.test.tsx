import { act, configure, fireEvent, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { ProofScreen } from '@/components/proof/ProofScreen';
import type { WorksheetRecord } from '@/shared/record';
import type { Proof, WorksheetContent } from '@/shared/worksheet';
import { usePlainStyles } from '../../support/plainStyles';
import { buildUser, renderScreen } from '../../support/renderScreen';
import { soundWorksheet, withPath } from '../../support/soundWorksheet';
import { buildRecord } from '../../support/worksheetRecord';

/* Nothing is hidden on this page; looking whether it is takes jsdom seconds. */
configure({ defaultHidden: true });
vi.setConfig({ testTimeout: 60_000 });
const user = userEvent.setup({ pointerEventsCheck: 0, delay: null });
const NOW = '2026-12-01T15:00:00.000Z';
const answer = (status: number, body: unknown) =>
  new Response(JSON.stringify(body), { status, headers: { 'Content-Type': 'application/json' } });

let record: WorksheetRecord;
let posted: { id: string; proof: Proof; pin: string }[];

const inForce = (content: WorksheetContent = soundWorksheet().content) =>
  buildRecord({ state: 'in-force', actions: ['prove', 'stop', 'close'], content });

beforeEach(() => {
  usePlainStyles();
  vi.useFakeTimers({ now: new Date(NOW), toFake: ['Date'] });
  record = inForce();
  posted = [];
  vi.stubGlobal('fetch', (_input: string, init?: RequestInit) => {
    if (init?.method !== 'POST') return Promise.resolve(answer(200, record));
    const body = JSON.parse(init.body as string) as (typeof posted)[number];
    posted.push(body);
    return Promise.resolve(
      answer(201, { id: body.id, at: NOW, assessment: { verdict: 'open', findings: [] } }),
    );
  });
});
afterEach(() => {
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

async function show() {
  renderScreen(<ProofScreen worksheetId={record.id} />, {
    user: buildUser({ id: record.leadId }),
  });
  await screen.findByRole('heading', { name: 'Prove it dead' });
}

const cell = (name: string) => screen.getByLabelText<HTMLInputElement>(name);
const type = (name: string, text: string) => {
  act(() => cell(name).focus());
  fireEvent.change(cell(name), { target: { value: text } });
  act(() => cell(name).blur());
};
const point = (name: RegExp) => user.click(screen.getByRole('tab', { name }));

function readPoint(name: string) {
  type(`${name}, Phase to neutral`, '0.0');
  type(`${name}, Phase to ground`, '0.0');
  type(`${name}, Neutral to ground`, '0.1');
}

async function answerAllElse() {
  for (const way of screen.getAllByRole('checkbox', { name: /^3\.\d/ })) await user.click(way);
  for (const half of screen.getAllByRole('checkbox', { name: /: (Up|Down|On)$/ })) {
    await user.click(half);
  }
  await user.click(screen.getByRole('checkbox', { name: 'The tester showed the known voltage' }));
  await user.click(screen.getByRole('radio', { name: /covered or guarded/ }));
  await user.click(screen.getByRole('radio', { name: /Discharged/ }));
  await user.click(
    screen.getByRole('checkbox', { name: 'The tester showed the known voltage again' }),
  );
}

describe('the matrix of readings', () => {
  it('asks for every pair at every point of work, and for no pair twice', async () => {
    await show();
    const table = screen.getByRole('table', { name: '1, the circuit, AC' });
    expect(within(table).getAllByRole('textbox')).toHaveLength(3);
    expect(screen.getAllByRole('tab').map((tab) => tab.textContent)).toEqual([
      '10 of 3',
      '20 of 3',
    ]);
    readPoint('1');
    expect(screen.getByRole('tab', { name: /^1/ }).textContent).toBe('13 of 3');
  });

  it('reads whole equipment phase by phase', async () => {
    record = inForce(
      withPath<WorksheetContent>(soundWorksheet().content, '/supply/exposure', 'whole equipment'),
    );
    await show();
    const table = screen.getByRole('table', { name: '1, the circuit, AC' });
    expect(within(table).getAllByRole('textbox')).toHaveLength(10);
    expect(cell('1, A to B')).toBeTruthy();
  });

  it('asks a battery unit for AC to phase and ground and for DC', async () => {
    record = inForce(
      withPath<WorksheetContent>(soundWorksheet().content, '/sources/3', {
        id: 's4',
        kind: 'battery unit',
        from: 'in A2',
        points: ['A2'],
        openedAt: 'battery connector',
        held: 'exclusive control',
        byCrewId: 'c1',
      }),
    );
    await show();
    // The point that the source names stands first; the other is still without a name.
    expect(screen.getAllByRole('tab').map((tab) => tab.textContent)).toEqual([
      'A20 of 6',
      '20 of 3',
    ]);
    expect(cell('A2, AC to ground')).toBeTruthy();
    expect(cell('A2, DC + to −')).toBeTruthy();
  });

  it('stops at once at 50 V or more and offers to record that', async () => {
    await show();
    type('1, Phase to ground', '120');
    expect(screen.getByRole('region', { name: /Stop: Voltage present/ })).toBeTruthy();
    expect(screen.getByText('Voltage is present')).toBeTruthy();
    await user.type(screen.getByLabelText(/PIN, 6 digits/), '246810');
    await user.click(screen.getByRole('button', { name: 'Record, and stop the work' }));
    expect(posted[0]?.proof.readings).toMatchObject([
      { point: '1', from: 'A', to: 'G', volts: 120 },
    ]);
  });

  it('keeps a stray voltage beside the reading at low impedance that settles it', async () => {
    await show();
    type('1, Phase to ground', '14.2');
    expect(screen.getByRole('region', { name: /Stop: Stray voltage/ })).toBeTruthy();
    await user.click(screen.getByRole('radio', { name: 'Low impedance' }));
    type('1, Phase to ground', '0.2');
    expect(screen.queryByRole('region', { name: /Stop: Stray voltage/ })).toBeNull();
    expect(screen.getByText(/14.2.V, normal/)).toBeTruthy();
    expect(cell('1, Phase to ground').value).toBe('0.2');
  });

  it('does not let a stray voltage be typed over', async () => {
    await show();
    type('1, Phase to ground', '14.2');
    type('1, Phase to ground', '0');
    expect(screen.getByRole('region', { name: /Stop: Stray voltage/ })).toBeTruthy();
  });

  it('records nothing while a cell holds no number', async () => {
    await show();
    type('1, Phase to ground', '0,1');
    expect(screen.getByText(/One cell holds no number/)).toBeTruthy();
  });
});

describe('the record of a proof', () => {
  it('treats it as live until everything is answered, then records what was read', async () => {
    await show();
    expect(screen.getByText('Treat as live')).toBeTruthy();
    await user.click(screen.getByRole('button', { name: 'Name the points of work' }));
    await user.type(screen.getByLabelText('Point 1'), 'A1');
    readPoint('A1');
    await point(/^2/);
    readPoint('2');
    await answerAllElse();
    expect(screen.getByText('Nothing open, nothing stopped')).toBeTruthy();
    await user.type(screen.getByLabelText(/PIN, 6 digits/), '246810');
    await user.click(screen.getByRole('button', { name: 'Record: proved dead' }));
    expect(posted).toHaveLength(1);
    expect(posted[0]?.proof).toMatchObject({
      openedSources: ['s1', 's2', 's3'],
      controlsOperated: true,
      provedBefore: true,
      provedAfter: true,
      otherLiveParts: 'guarded',
      storedEnergy: 'discharged',
    });
    expect(posted[0]?.proof.readings).toHaveLength(6);
    expect(posted[0]?.proof.readings?.[0]).toEqual({
      point: 'A1',
      from: 'A',
      to: 'N',
      volts: 0,
      current: 'ac',
      at: '2026-12-01T09:00:00-06:00',
    });
  });

  it('cannot be recorded as proved with one control position left', async () => {
    await show();
    readPoint('1');
    await point(/^2/);
    readPoint('2');
    await answerAllElse();
    const halves = screen.getAllByRole('checkbox', { name: /: Down$/ });
    await user.click(halves[0] as HTMLElement);
    const button = screen.getByRole('button', { name: /Record: proved dead/ });
    expect(button.textContent).toContain('1 point is open');
    expect(button.getAttribute('aria-disabled')).toBe('true');
  });

  it('shows what was proved, where, and what makes it live again', async () => {
    const { proof } = soundWorksheet();
    record = {
      ...record,
      proved: true,
      proofs: [
        {
          id: 'p1',
          at: NOW,
          proof,
          assessment: record.assessment,
          byId: record.leadId,
          byName: 'Ruth Ansbach',
          revision: 2,
        },
      ],
    };
    renderScreen(<ProofScreen worksheetId={record.id} />, {
      user: buildUser({ id: record.leadId }),
    });
    await screen.findByRole('heading', { name: 'Proved dead 09:00' });
    const table = screen.getByRole('table', { name: 'Readings, V' });
    expect(
      within(table)
        .getAllByRole('rowheader')
        .map((head) => head.textContent),
    ).toEqual(['A1', 'A2']);
    await user.click(screen.getByRole('button', { name: 'Prove it again' }));
    expect(await screen.findByText('Treat as live')).toBeTruthy();
  });

  it('has nothing to record for energized work', async () => {
    record = inForce(
      withPath<WorksheetContent>(soundWorksheet().content, '/decision', { mode: 'energized' }),
    );
    record = { ...record, actions: ['stop', 'close'] };
    await show();
    expect(screen.getByText('Energized work has no proof.')).toBeTruthy();
  });
});
