import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { SignOut } from '@/components/account/SignOut';
import { renderScreen } from '../../support/renderScreen';

const { drafts, forms } = vi.hoisted(() => ({
  drafts: [] as { worksheetId: string }[],
  forms: [] as string[],
}));
vi.mock('@/components/drafts/draftStore', () => ({
  draftStore: { list: () => Promise.resolve(drafts) },
}));
vi.mock('@/components/drafts/keptForms', () => ({
  keptForms: { list: () => Promise.resolve(forms) },
}));

const ONE = '0190b5a4-0000-7000-8000-0000000000e1';
const OTHER = '0190b5a4-0000-7000-8000-0000000000e2';
const server = vi.fn<typeof fetch>(() => Promise.resolve(new Response(null, { status: 204 })));

beforeEach(() => {
  vi.stubGlobal('fetch', server);
  server.mockClear();
  drafts.length = 0;
  forms.length = 0;
});
afterEach(() => void vi.unstubAllGlobals());

const press = async (name: string) => userEvent.click(await screen.findByRole('button', { name }));

describe('signing out', () => {
  it('asks nothing where nothing waits on this device', async () => {
    // The form of a glove in the register is nobody's worksheet.
    forms.push('rubber-goods/new');
    renderScreen(<SignOut />);
    await press('Sign out');
    await vi.waitFor(() => expect(server).toHaveBeenCalledTimes(1));
  });

  it.each<[string, () => void]>([
    ['a draft', () => drafts.push({ worksheetId: ONE })],
    ['a stop that was pressed without signal', () => forms.push(`stop/${ONE}/1`)],
    ['a test for absence of voltage', () => forms.push(`proof/${ONE}/1`)],
    ['a close-out', () => forms.push(`close/${ONE}/1`)],
  ])('asks first while %s waits', async (_, keep) => {
    keep();
    renderScreen(<SignOut />);
    // What is kept is read from the device at first.
    await new Promise((resolve) => setTimeout(resolve, 20));
    await press('Sign out');
    expect(await screen.findByText(/^1 worksheet is kept here and not sent/)).toBeTruthy();
    expect(server).not.toHaveBeenCalled();
    await press('Stay signed in');
    expect(server).not.toHaveBeenCalled();
    await press('Sign out');
    await press('Sign out, send later');
    await vi.waitFor(() => expect(server).toHaveBeenCalledTimes(1));
  });

  it('counts worksheets, not what waits of each', async () => {
    drafts.push({ worksheetId: ONE });
    forms.push(`stop/${ONE}/1`, `proof/${OTHER}/2`);
    renderScreen(<SignOut />);
    await new Promise((resolve) => setTimeout(resolve, 20));
    await press('Sign out');
    expect(await screen.findByText(/^2 worksheets are kept here/)).toBeTruthy();
  });
});
