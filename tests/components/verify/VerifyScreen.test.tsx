import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { VerifyFormScreen } from '@/components/verify/VerifyFormScreen';
import { VerifyScreen } from '@/components/verify/VerifyScreen';
import { stubServer } from '../../support/fetchFake';
import { renderScreen } from '../../support/renderScreen';
import { router } from '../../support/routerFake';

const hash = '7b1e40c9a2d85f13'.repeat(4);
const paper = { number: '2026-002417', hash };
const signed = { matches: true, revision: 2, signedAt: '2026-10-14T18:04:00Z' };

afterEach(() => {
  vi.unstubAllGlobals();
  router.push.mockClear();
});

describe('VerifyScreen', () => {
  it.each([
    [{ ...signed, state: 'closed', superseded: false }, 'This is the record'],
    [{ ...signed, state: 'in-force', superseded: true }, 'Superseded'],
    [{ matches: false }, 'This is not the record'],
  ])('says %o as "%s"', async (answer, title) => {
    stubServer({ '/verify/': answer });
    renderScreen(<VerifyScreen paper={paper} />);
    expect(await screen.findByRole('heading', { name: title, level: 1 })).toBeTruthy();
  });

  it('shows neither state nor revision of what is not the record', async () => {
    stubServer({ '/verify/': { matches: false } });
    renderScreen(<VerifyScreen paper={paper} />);
    await screen.findByRole('heading', { name: 'This is not the record' });
    expect(screen.queryByText('Revision')).toBeNull();
  });
});

describe('VerifyFormScreen', () => {
  it('says how many characters were read', async () => {
    renderScreen(<VerifyFormScreen initial={{ number: '2026-002417', hash: hash.slice(0, 60) }} />);
    await userEvent.click(screen.getByRole('button', { name: 'Check' }));
    expect(screen.getByRole('link', { name: /^60 of 64 characters/ })).toBeTruthy();
    expect(router.push).not.toHaveBeenCalled();
  });

  it('takes a code in groups and capitals', async () => {
    const typed = (hash.match(/.{4}/g) ?? []).join(' ').toUpperCase();
    renderScreen(<VerifyFormScreen initial={{ number: ' 2026\u2013002417', hash: typed }} />);
    await userEvent.click(screen.getByRole('button', { name: 'Check' }));
    expect(router.push).toHaveBeenCalledWith({
      pathname: '/verify/[number]/[hash]',
      params: paper,
    });
  });
});
