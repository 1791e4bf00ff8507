import { screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { chartMonths } from '@/components/insights/months';
import { InsightsScreen } from '@/components/insights/InsightsScreen';
import type { Insights } from '@/shared/insights';
import { stubServer } from '../../support/fetchFake';
import { buildUser, renderScreen } from '../../support/renderScreen';

const insights: Insights = {
  worksheets: 8,
  byMonth: [{ month: '2026-11', worksheets: 8, energized: 1 }],
  byVerdict: [{ verdict: 'ready', worksheets: 8 }],
  byMode: [
    { mode: 'off', worksheets: 7 },
    { mode: null, worksheets: 1 },
  ],
  byFinding: [
    {
      code: 'sources.battery-connected',
      severity: 'stop',
      worksheets: 3,
      byMonth: [{ month: '2026-11', worksheets: 3 }],
    },
  ],
  bySite: [{ siteId: 's1', siteName: 'Brindle Court', worksheets: 8, withStop: 3 }],
  stopsByReason: [{ reason: 'still live', stops: 2 }],
  voltageAtProof: 0,
  notClosedInTime: 1,
};

afterEach(() => vi.unstubAllGlobals());

describe('InsightsScreen', () => {
  it('leads from each finding and site to its worksheets, with the rate in 100', async () => {
    stubServer({ '/insights': insights });
    renderScreen(<InsightsScreen />, { user: buildUser({ role: 'safety' }) });
    const findings = await screen.findByRole('region', { name: 'Findings, one a worksheet' });
    const link = within(findings).getByRole('link', {
      name: 'Battery unit still connected: 3 worksheets. Read in the archive',
    });
    expect(link.getAttribute('href')).toBe('/archive');
    expect(screen.getByRole('link', { name: /^Brindle Court: 3 of 8, 38\sin 100/ })).toBeTruthy();
  });

  it('leads nowhere from what the archive cannot find', async () => {
    stubServer({ '/insights': insights });
    renderScreen(<InsightsScreen />, { user: buildUser({ role: 'safety' }) });
    const stopped = await screen.findByRole('region', { name: 'Stopped at work' });
    expect(within(stopped).queryAllByRole('link')).toHaveLength(0);
    expect(within(stopped).getByText('It is still live')).toBeTruthy();
  });
});

describe('chartMonths', () => {
  it('has every month of the span, also the empty ones', () => {
    expect(chartMonths('2025-12-01', '2026-02-10', ['2026-01'])).toEqual([
      '2025-12',
      '2026-01',
      '2026-02',
    ]);
  });

  it('begins with the first that has something where the span is open', () => {
    expect(chartMonths(undefined, '2026-02-10', ['2026-01'])).toEqual(['2026-01', '2026-02']);
  });
});
