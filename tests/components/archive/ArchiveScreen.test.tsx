import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { ArchiveScreen } from '@/components/archive/ArchiveScreen';
import { queryOf, readFilters } from '@/components/archive/filters';
import { stubServer } from '../../support/fetchFake';
import { buildUser, renderScreen } from '../../support/renderScreen';
import { router } from '../../support/routerFake';
import { buildRow } from '../../support/worksheetRow';

beforeEach(() => {
  vi.stubGlobal(
    'IntersectionObserver',
    class {
      observe() {}
      disconnect() {}
    },
  );
  router.setParams.mockClear();
});
afterEach(() => vi.unstubAllGlobals());

function show(role: 'safety' | 'lead') {
  const items = [buildRow({ state: 'closed', metCodes: ['sources.battery-connected'] })];
  const server = stubServer({ '/worksheets?': { items, nextCursor: null } });
  renderScreen(<ArchiveScreen />, { user: buildUser({ role }) });
  return server;
}

describe('ArchiveScreen', () => {
  it('lists what was found, with what was met before signing', async () => {
    show('lead');
    expect(await screen.findByText('1 worksheet')).toBeTruthy();
    expect(screen.getByText(/Battery unit still connected/)).toBeTruthy();
    expect(screen.queryByRole('button', { name: 'List as CSV' })).toBeNull();
  });

  it('offers the list and the records as files to the safety office', async () => {
    show('safety');
    expect(await screen.findByRole('button', { name: 'List as CSV' })).toBeTruthy();
    expect(screen.getByRole('button', { name: /PDFs as ZIP/ })).toBeTruthy();
  });

  it('puts the words of the search into the address', async () => {
    show('safety');
    await userEvent.type(screen.getByRole('searchbox', { name: 'Search' }), 'LP-2/14');
    await vi.waitFor(() => expect(router.setParams).toHaveBeenLastCalledWith({ q: 'LP-2/14' }));
  });
});

describe('filters', () => {
  it('keep what is a filter and drop what is none', () => {
    const filters = readFilters({
      q: 'battery unit',
      state: 'closed,nonsense',
      circuitVolts: '277,x',
      from: '2026-13',
      sort: 'sideways',
    });
    expect(queryOf(filters)).toBe('q=battery+unit&state=closed&circuitVolts=277');
  });

  it('send an export no order', () => {
    const filters = readFilters({ sort: 'number', siteId: 'a,b' });
    expect(queryOf(filters)).toBe('siteId=a%2Cb&sort=number');
    expect(queryOf(filters, { forExport: true })).toBe('siteId=a%2Cb');
  });
});
