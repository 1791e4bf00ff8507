import { QueryClient } from '@tanstack/react-query';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { sessionQuery } from '@/components/api/session';
import type { SessionUser } from '@/shared/user';

const user: SessionUser = {
  id: '0190b5a4-0000-7000-8000-0000000000b1',
  name: 'Ruth Ansbach',
  email: 'ruth@company.example',
  role: 'lead',
  qualifiedThrough: null,
  siteIds: [],
  locale: 'en-US',
  units: 'feet',
  theme: 'system',
  hasPin: true,
};

afterEach(() => {
  vi.unstubAllGlobals();
  window.localStorage.clear();
});

/** Reads the session where the server cannot be reached, with this text kept in the browser. */
function readWithoutSignal(kept: string | null) {
  vi.stubGlobal('fetch', () => Promise.reject(new TypeError('Failed to fetch')));
  if (kept !== null) window.localStorage.setItem('wideberth.user', kept);
  return new QueryClient().fetchQuery(sessionQuery());
}

describe('the person that this device last knew', () => {
  it('is known without signal', async () => {
    const session = await readWithoutSignal(JSON.stringify(user));
    expect(session).toEqual({ user, fromDevice: true });
  });

  it.each([
    ['cut off', JSON.stringify(user).slice(0, 40)],
    ['no JSON', 'undefined'],
    ['empty', ''],
    ['something else', '[1]'],
    ['null', 'null'],
    ['of an older release', JSON.stringify({ ...user, role: 'foreman' })],
    ['not there', null],
  ])(
    'is nobody where what was kept is %s; the fault that counts is that of the network',
    async (_, kept) => {
      await expect(readWithoutSignal(kept)).rejects.toThrow('Failed to fetch');
    },
  );
});
