import { fireEvent, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { ImportScreen } from '@/components/register/ImportScreen';
import { PersonForm } from '@/components/register/PersonForm';
import { TestForm } from '@/components/register/TestForm';
import type { RegisterViewControl } from '@/components/register/useRegisterView';
import type { RubberGoods, Site } from '@/shared/register';
import { buildUser, renderScreen } from '../../support/renderScreen';

const SITE = '0190b5a4-0000-7000-8000-0000000000a1';
const site: Site = {
  id: SITE,
  name: 'Orrin Street',
  timeZone: 'America/Chicago',
  address: '',
  systems: [],
  panels: [],
  emergency: {},
  deskToTell: '',
  retired: false,
};
const item: RubberGoods = {
  id: '0190b5a4-0000-7000-8000-0000000000b1',
  siteId: SITE,
  kind: 'gloves',
  gloveClass: '0',
  serial: 'RG-018',
  size: '10',
  issuedOn: null,
  tests: [{ testedOn: '2026-03-31', passed: true }],
  lastTestedOn: '2026-03-31',
  dueOn: '2026-09-30',
  inTest: true,
  retired: false,
  retiredBecause: null,
};
const view: RegisterViewControl = { set: vi.fn(), open: vi.fn(), close: vi.fn() };
const safety = { user: buildUser({ role: 'safety' }) };

const answer = (status: number, body: unknown) =>
  new Response(JSON.stringify(body), { status, headers: { 'Content-Type': 'application/json' } });
const server = vi.fn<typeof fetch>();
const sent = () =>
  server.mock.calls.flatMap(([, init]) =>
    typeof init?.body === 'string' ? [JSON.parse(init.body) as Record<string, unknown>] : [],
  );

beforeEach(() => vi.stubGlobal('fetch', server));
afterEach(() => {
  server.mockReset();
  vi.unstubAllGlobals();
});

describe('a test that failed', () => {
  it('is sent as one test, which retires the item at the server', async () => {
    const onDone = vi.fn();
    server.mockImplementation(() => Promise.resolve(answer(200, { ...item, retired: true })));
    renderScreen(
      <TestForm item={item} today="2026-09-20" onDone={onDone} onCancel={vi.fn()} />,
      safety,
    );
    fireEvent.change(await screen.findByLabelText('Tested on'), {
      target: { value: '2026-09-18' },
    });
    await userEvent.click(screen.getByRole('radio', { name: 'Failed' }));
    await userEvent.click(screen.getByRole('button', { name: 'Save and retire it' }));
    await waitFor(() => expect(onDone).toHaveBeenCalled());
    expect(sent()).toEqual([
      {
        id: expect.stringMatching(/^[0-9a-f-]{36}$/) as unknown,
        testedOn: '2026-09-18',
        passed: false,
      },
    ]);
    expect(server.mock.calls.at(-1)?.[0]).toBe(`/api/rubber-goods/${item.id}/tests`);
  });

  it('is not guessed, and lies not in time to come', async () => {
    renderScreen(
      <TestForm item={item} today="2026-09-20" onDone={vi.fn()} onCancel={vi.fn()} />,
      safety,
    );
    fireEvent.change(await screen.findByLabelText('Tested on'), {
      target: { value: '2026-09-21' },
    });
    await userEvent.click(screen.getByRole('button', { name: 'Save the test' }));
    expect(screen.getByRole('link', { name: 'Result: Not filled in.' })).toBeTruthy();
    expect(
      screen.getByRole('link', { name: 'Tested on: This day is still to come.' }),
    ).toBeTruthy();
    expect(server).not.toHaveBeenCalled();
  });
});

describe('an invitation', () => {
  async function fillIn() {
    await userEvent.type(await screen.findByLabelText('Name'), 'Ines Dalgaard');
    await userEvent.type(screen.getByLabelText('E-mail'), 'ines@company.example');
    await userEvent.click(screen.getByRole('radio', { name: /^Helper/ }));
    await userEvent.click(screen.getByRole('checkbox', { name: 'Orrin Street' }));
  }
  const form = () =>
    renderScreen(
      <PersonForm person={undefined} sites={[site]} onDone={vi.fn()} onCancel={vi.fn()} />,
      safety,
    );

  it('names each field that is missing, and asks nothing of the server', async () => {
    form();
    await userEvent.click(await screen.findByRole('button', { name: 'Send the invitation' }));
    for (const field of ['Name', 'E-mail', 'Role', 'Sites']) {
      expect(screen.getByRole('link', { name: `${field}: Not filled in.` })).toBeTruthy();
    }
    expect(server).not.toHaveBeenCalled();
  });

  it('shows beside the field what the server did not take, until it is mended', async () => {
    const errors = [{ pointer: '#/email', code: 'taken', message: 'x' }];
    server.mockImplementation(() =>
      Promise.resolve(answer(409, { type: '/problems/conflict', title: 'x', status: 409, errors })),
    );
    form();
    await fillIn();
    await userEvent.click(screen.getByRole('button', { name: 'Send the invitation' }));
    const said = 'E-mail: Another account has this address.';
    expect(await screen.findByRole('link', { name: said })).toBeTruthy();
    expect(sent()[0]).toMatchObject({ role: 'helper', siteIds: [SITE], qualifiedThrough: null });
    await userEvent.type(screen.getByLabelText('E-mail'), 'x');
    expect(screen.queryByRole('link', { name: said })).toBeNull();
    expect(screen.getByLabelText<HTMLInputElement>('Name').value).toBe('Ines Dalgaard');
  });
});

describe('an import', () => {
  const rows = [{ line: 2, cells: { name: 'Ada', email: 'ada@company.example', role: 'lead' } }];
  const error = { line: 3, column: 'role', code: 'role', value: 'foreman' };

  async function check(errors: unknown[]) {
    server.mockImplementation(() =>
      Promise.resolve(answer(200, { count: 1, rows, errors, created: 0 })),
    );
    renderScreen(<ImportScreen subject="people" view={view} />, safety);
    fireEvent.change(await screen.findByLabelText('Lines of the file'), {
      target: { value: 'name,email,role,sites' },
    });
    await userEvent.click(screen.getByRole('button', { name: 'Check the lines' }));
  }

  it('cannot be confirmed while a line is not right, and says which and why', async () => {
    await check([error]);
    expect(await screen.findByText('1 thing to mend. Nothing is imported.')).toBeTruthy();
    expect(screen.getByText('Write lead, helper, supervisor or safety.')).toBeTruthy();
    expect(screen.queryByRole('button', { name: /^Import and invite/ })).toBeNull();
  });

  it('is confirmed for the lines that were checked, never for others', async () => {
    await check([]);
    const name = 'Import and invite 1 person';
    expect(await screen.findByRole('button', { name })).toBeTruthy();
    fireEvent.change(screen.getByLabelText('Lines of the file'), { target: { value: 'other' } });
    expect(screen.queryByRole('button', { name })).toBeNull();
    fireEvent.change(screen.getByLabelText('Lines of the file'), {
      target: { value: 'name,email,role,sites' },
    });
    server.mockImplementation(() =>
      Promise.resolve(answer(201, { count: 1, rows, errors: [], created: 1 })),
    );
    await userEvent.click(screen.getByRole('button', { name }));
    expect(await screen.findByText('1 line is imported.')).toBeTruthy();
    expect(sent().at(-1)).toEqual({ csv: 'name,email,role,sites', confirm: true });
  });
});
