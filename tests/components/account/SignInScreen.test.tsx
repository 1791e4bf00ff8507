import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { SignInScreen } from '@/components/account/SignInScreen';
import { deviceClient } from '@/components/api/queryClient';
import { redirected } from '../../support/routerFake';
import { buildUser, renderScreen } from '../../support/renderScreen';

const answer = (status: number, body: unknown) =>
  new Response(JSON.stringify(body), {
    status,
    headers: { 'Content-Type': status < 400 ? 'application/json' : 'application/problem+json' },
  });
const problem = (status: number, name: string) =>
  answer(status, { type: `/problems/${name}`, title: name, status });

const server = vi.fn<typeof fetch>();

beforeEach(() => {
  vi.stubGlobal('fetch', server);
  server.mockImplementation(() => Promise.resolve(problem(401, 'not-signed-in')));
  redirected.mockClear();
});
afterEach(() => {
  deviceClient.clear();
  server.mockReset();
  vi.unstubAllGlobals();
});

async function signIn() {
  await userEvent.type(screen.getByRole('textbox', { name: 'E-mail' }), 'lead@wideberth.example');
  await userEvent.type(screen.getByLabelText('Password'), 'wide-berth-demo');
  await userEvent.click(screen.getByRole('button', { name: 'Sign in' }));
}

describe('SignInScreen', () => {
  it('names what is missing and asks nothing of the server', async () => {
    renderScreen(<SignInScreen />);
    await userEvent.click(screen.getByRole('button', { name: 'Sign in' }));
    expect(screen.getByRole('link', { name: 'Enter your e-mail.' })).toBeTruthy();
    expect(screen.getByRole('link', { name: 'Enter your password.' })).toBeTruthy();
    expect(server.mock.calls.filter(([, init]) => init?.method === 'POST')).toHaveLength(0);
  });

  it('goes on to where the person wanted to go', async () => {
    renderScreen(<SignInScreen to="/worksheets/1" />);
    server.mockImplementation((_input, init) =>
      Promise.resolve(
        init?.method === 'POST'
          ? answer(201, { user: buildUser() })
          : problem(401, 'not-signed-in'),
      ),
    );
    await signIn();
    await waitFor(() => expect(redirected).toHaveBeenCalledWith('/worksheets/1'));
  });

  it.each(['//elsewhere.example', 'https://elsewhere.example', '/\\elsewhere.example'])(
    'never leads to another site: %s',
    async (to) => {
      renderScreen(<SignInScreen to={to} />);
      server.mockImplementation(() => Promise.resolve(answer(201, { user: buildUser() })));
      await signIn();
      await waitFor(() => expect(redirected).toHaveBeenCalledWith('/'));
    },
  );

  it.each([
    [401, 'wrong-credentials', 'The e-mail or the password is wrong.'],
    [429, 'too-many-requests', 'Too many tries. Wait a minute.'],
  ])('says what went wrong: %i', async (status, name, words) => {
    renderScreen(<SignInScreen />);
    server.mockImplementation(() => Promise.resolve(problem(status, name)));
    await signIn();
    expect((await screen.findByRole('alert')).textContent).toContain(words);
  });

  it('tells a server that does not answer from a wrong password', async () => {
    renderScreen(<SignInScreen />);
    server.mockImplementation(() => Promise.reject(new TypeError('Failed to fetch')));
    await signIn();
    expect((await screen.findByRole('alert')).textContent).toContain('Look for signal');
  });
});
