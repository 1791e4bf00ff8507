import { act, configure, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { HelperScreen } from '@/components/helper/HelperScreen';
import type { WorksheetRecord } from '@/shared/record';
import type { SessionUser } from '@/shared/user';
import { usePlainStyles } from '../../support/plainStyles';
import { buildUser, renderScreen } from '../../support/renderScreen';
import { buildRecord } from '../../support/worksheetRecord';

/* A canvas cannot be drawn on here: one press stands for the strokes. */
vi.mock('@/components/ui/SignaturePad', () => ({
  SignaturePad: ({ onChange }: { onChange: (strokes: [number, number][][]) => void }) => (
    <button
      onClick={() =>
        onChange([
          [
            [1, 2],
            [3, 4],
          ],
        ])
      }
    >
      Draw
    </button>
  ),
}));

/* Nothing is hidden on this page; looking whether it is takes jsdom seconds. */
configure({ defaultHidden: true });
vi.setConfig({ testTimeout: 60_000 });
const user = userEvent.setup({ pointerEventsCheck: 0, delay: null });

const HELPER = '0190b5a4-0000-7000-8000-0000000000b2';
const LEAD = '0190b5a4-0000-7000-8000-0000000000b1';

const answer = (status: number, body: unknown) =>
  new Response(JSON.stringify(body), { status, headers: { 'Content-Type': 'application/json' } });
const problem = (status: number, name: string) =>
  answer(status, { type: `/problems/${name}`, title: name, status });

interface Posted {
  path: string;
  body: Record<string, unknown>;
}
let posted: Posted[];
let onPost: (post: Posted) => Response | Promise<Response>;
let record: WorksheetRecord;
let seeEnd: () => void;

beforeEach(() => {
  usePlainStyles();
  posted = [];
  record = buildRecord();
  onPost = () => answer(200, record);
  vi.stubGlobal('fetch', (input: string, init?: RequestInit) => {
    if (init?.method !== 'POST') return Promise.resolve(answer(200, record));
    const post = {
      path: input.replace(/^\/api/, ''),
      body: JSON.parse(init.body as string) as Record<string, unknown>,
    };
    posted.push(post);
    return Promise.resolve(onPost(post));
  });
  vi.stubGlobal(
    'IntersectionObserver',
    class {
      constructor(tell: (entries: { isIntersecting: boolean }[]) => void) {
        seeEnd = () => act(() => tell([{ isIntersecting: true }]));
      }
      observe() {}
      disconnect() {}
    },
  );
});
afterEach(() => vi.unstubAllGlobals());

async function show(
  signedIn: Partial<SessionUser> = { id: HELPER, role: 'helper', name: 'Teo Marsh' },
) {
  renderScreen(<HelperScreen worksheetId={record.id} signerId={HELPER} />, {
    user: buildUser(signedIn),
  });
  await screen.findByRole('heading', { name: /one minute before/ });
}

const signed = (id: unknown) =>
  answer(201, {
    id,
    meaning: 'acknowledged',
    signer: { id: HELPER, name: 'Helper', role: 'helper' },
    enteredById: HELPER,
    revision: 2,
    signedAt: '2026-12-01T15:00:00.000Z',
    receivedAt: '2026-12-01T15:00:00.000Z',
    method: 'pin',
  });

async function toSigning() {
  seeEnd();
  await user.click(screen.getByRole('button', { name: 'I understand' }));
  await user.type(screen.getByLabelText(/PIN, 6 digits/), '135792');
  await user.click(screen.getByRole('button', { name: 'Draw' }));
}

describe('the page that a helper reads', () => {
  it('says what can hurt, how close they may come and who is called', async () => {
    await show();
    expect(screen.getByText('It still counts as live')).toBeTruthy();
    expect(
      screen.getByRole('img', { name: /Current through a body.*6 to 30, cannot let go/ }),
    ).toBeTruthy();
    expect(screen.getByText('Stay outside the barricade')).toBeTruthy();
    const hurt = screen.getByRole('region', { name: 'If someone is hurt' });
    expect(within(hurt).getAllByRole('listitem').length).toBeGreaterThan(2);
  });

  it('lets nobody sign before the last block was on screen; a question and a no work at once', async () => {
    await show();
    const understand = screen.getByRole('button', { name: /I understand/ });
    expect(understand.getAttribute('aria-disabled')).toBe('true');
    expect(understand.textContent).toContain('Read to the end first');
    expect(
      screen.getByRole('button', { name: 'I have a question' }).getAttribute('aria-disabled'),
    ).toBeNull();
    seeEnd();
    expect(
      screen.getByRole('button', { name: 'I understand' }).getAttribute('aria-disabled'),
    ).toBeNull();
  });

  it('is read in the language of the reader, whoever is signed in', async () => {
    await show({ id: LEAD });
    await user.click(screen.getByRole('button', { name: 'Español' }));
    expect(screen.getByText('Quédese fuera de la barricada')).toBeTruthy();
    expect(screen.getByRole('button', { name: /Tengo una pregunta/ })).toBeTruthy();
  });

  it('sends a question under the name of who asks', async () => {
    onPost = ({ body }) =>
      answer(201, {
        id: body['id'],
        text: body['text'],
        askedBy: { id: LEAD, name: 'Lead', role: 'lead' },
        askedAt: '2026-12-01T15:00:00.000Z',
        revision: 2,
        answer: null,
        answeredBy: null,
        answeredAt: null,
      });
    await show({ id: LEAD });
    await user.click(screen.getByRole('button', { name: 'I have a question' }));
    await user.type(screen.getByLabelText('What do you want to know?'), 'Which panel?');
    await user.click(screen.getByRole('button', { name: 'Send the question' }));
    await screen.findByText(/Your question is sent/);
    expect(posted[0]?.path).toBe(`/worksheets/${record.id}/questions`);
    expect(posted[0]?.body['text']).toBe('Helper: Which panel?');
  });

  const stopped = () => {
    record = buildRecord({
      state: 'stopped',
      reason: { text: 'I will not do this', byName: 'Helper', at: '2026-12-01T15:00:00.000Z' },
    });
    return answer(200, record);
  };

  it('stops the work with one more press after "I will not do this"', async () => {
    await show();
    onPost = stopped;
    await user.click(screen.getByRole('button', { name: 'I will not do this' }));
    await user.click(screen.getByRole('button', { name: 'I will not do this' }));
    await screen.findByRole('region', { name: /Stopped: hands off/ });
    const body = { id: expect.any(String) as string, reason: 'I will not do this' };
    expect(posted).toEqual([{ path: `/worksheets/${record.id}/stop`, body }]);
  });

  it('sends the same stop again after a lost answer', async () => {
    await show();
    onPost = () => Promise.reject(new TypeError('Failed to fetch'));
    await user.click(screen.getByRole('button', { name: 'I will not do this' }));
    await user.click(screen.getByRole('button', { name: 'I will not do this' }));
    const again = await screen.findByRole('button', { name: 'Send it again' });
    onPost = stopped;
    await user.click(again);
    await screen.findByRole('region', { name: /Stopped: hands off/ });
    expect(posted).toHaveLength(2);
    expect(posted[1]?.body).toEqual(posted[0]?.body);
  });

  it('signs once, however often it is pressed after a lost answer', async () => {
    await show();
    await toSigning();
    onPost = () => Promise.reject(new TypeError('Failed to fetch'));
    await user.click(screen.getByRole('button', { name: 'Sign' }));
    await screen.findByText(/No signal. Nothing was signed/);
    onPost = ({ body }) => signed(body['id']);
    await user.click(screen.getByRole('button', { name: 'Sign' }));
    await screen.findByText('Signed.');
    expect(posted).toHaveLength(2);
    expect(posted[1]?.body).toEqual(posted[0]?.body);
    expect(posted[0]?.body).toMatchObject({
      meaning: 'acknowledged',
      signerId: HELPER,
      pin: '135792',
      contentHash: record.contentHash,
    });
  });

  it('says that the PIN is wrong beside its field and keeps what was entered', async () => {
    await show();
    await toSigning();
    onPost = () => problem(403, 'wrong-pin');
    await user.click(screen.getByRole('button', { name: 'Sign' }));
    await screen.findByText(/The PIN is wrong/);
    const pin = screen.getByLabelText<HTMLInputElement>(/PIN, 6 digits/);
    expect(pin.value).toBe('135792');
    expect(pin.getAttribute('aria-invalid')).toBe('true');
  });

  it('names what is missing inside the button', async () => {
    await show();
    seeEnd();
    await user.click(screen.getByRole('button', { name: 'I understand' }));
    const sign = () => screen.getByRole('button', { name: /^Sign/ });
    expect(sign().textContent).toContain('PIN and signature are missing');
    await user.type(screen.getByLabelText(/PIN, 6 digits/), '135');
    expect(sign().textContent).toContain('3 digits of the PIN are missing');
    await user.type(screen.getByLabelText(/PIN, 6 digits/), '792');
    expect(sign().textContent).toContain('The signature is missing');
  });

  it('says so where this signature is not waited for', async () => {
    record = buildRecord({ actions: ['stop'] });
    await show();
    seeEnd();
    expect(screen.getByRole('button', { name: /I understand/ }).textContent).toContain(
      'Your signature is not waited for now',
    );
  });
});
