import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { v7 as newId } from 'uuid';
import { assess, type Finding, type WorksheetContent } from '@/hazard';
import { rules } from '@/hazard/rules';
import { citationWords, fieldLabel, findingWords } from '@/shared/messages';
import type { WorksheetRecord } from '@/shared/record';
import type { Locale } from '@/shared/user';
import { BROKEN_PLANS } from '../support/brokenWorksheets';
import { keepPicture, launchBrowser, newScreen, signInAs } from '../support/browser';
import { DEMO_ACCOUNTS, DEMO_PASSWORD } from '../support/demoAccounts';
import { withEdits } from '../support/ruleTable';
import { soundWorksheet } from '../support/soundWorksheet';
import { startWebServer, type WebServer } from '../support/webServer';

const STROKES = [
  [
    [10, 12],
    [34, 40],
    [60, 22],
  ],
];

let server: WebServer;
let browser: Browser;
beforeAll(async () => {
  server = await startWebServer();
  browser = await launchBrowser();
});
afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

/** A person at a screen, signed in through the interface and then set to a language. */
async function personAt(
  who: keyof typeof DEMO_ACCOUNTS,
  locale: Locale,
  width: number,
): Promise<Page> {
  const { page } = await newScreen(browser, server.base, {
    width,
    height: width < 600 ? 844 : 900,
    locale,
  });
  await signInAs(page, DEMO_ACCOUNTS[who].email, DEMO_PASSWORD);
  await page.request.patch('/api/session', { data: { locale, units: 'feet', theme: 'system' } });
  return page;
}

async function answered<T>(page: Page, path: string, data?: object): Promise<T> {
  const answer =
    data === undefined ? await page.request.get(path) : await page.request.post(path, { data });
  const body = (await answer.json()) as T;
  if (!answer.ok()) throw new Error(`${path} answered ${answer.status()} ${JSON.stringify(body)}`);
  return body;
}

const single = (text: string) => text.replace(/\s+/g, ' ').trim();
const textOf = async (page: Page) => single(await page.locator('body').innerText());

/** The test's worksheets are of one day in 2026: here they are of today, under way now. */
function ofToday(content: WorksheetContent): WorksheetContent {
  const day = new Intl.DateTimeFormat('en-CA', { timeZone: 'America/Chicago' }).format(new Date());
  return JSON.parse(JSON.stringify(content).replaceAll('2026-12-01', day)) as WorksheetContent;
}

async function placed(page: Page, content: WorksheetContent): Promise<WorksheetContent> {
  const { items } = await answered<{ items: { id: string }[] }>(page, '/api/sites');
  return { ...ofToday(content), job: { ...ofToday(content).job, siteId: items[0]?.id } };
}

/** Somebody of the lead's sites whose training has run out. */
async function lapsedPerson(page: Page): Promise<string> {
  const { items } = await answered<{ items: { id: string; qualifiedThrough: string | null }[] }>(
    page,
    '/api/users?limit=200',
  );
  const today = new Date().toISOString().slice(0, 10);
  const lapsed = items.find(
    ({ qualifiedThrough }) => qualifiedThrough !== null && qualifiedThrough < today,
  );
  if (lapsed === undefined) throw new Error('Nobody in the demo has let their training lapse.');
  return lapsed.id;
}

/** Shows everything that is folded: the sections, then the list of points of a phone. */
async function unfold(page: Page): Promise<void> {
  const folded = page.locator('h2 [aria-expanded="false"]');
  while ((await folded.count()) > 0) await folded.first().click();
  const points = page.getByRole('button', { name: /with their sources|con su fuente/ });
  if ((await points.count()) > 0 && (await points.first().getAttribute('aria-expanded')) !== 'true')
    await points.first().click();
}

const isUnanswered = ({ severity, params }: Finding) =>
  severity === 'open' && params.field !== undefined;
const isRule = ({ code }: Finding) => !code.endsWith('.unanswered');

/** Rules whose points are boxes to tick: the box itself says what is left. */
const BOXES = new Set(['equipment.not-at-hand', 'crew.briefing-open']);

/** What a finding must show: its title, what to do, where from and how that was checked. */
function wordsOf(locale: Locale, finding: Finding): string[] {
  const { title, text } = findingWords(locale, finding, 'feet');
  const isSaid = !isUnanswered(finding) && !BOXES.has(finding.code);
  const source = citationWords(locale, finding.citation);
  return [title, isSaid ? text : '', source].map(single).filter(Boolean);
}

function missingWords(locale: Locale, findings: Finding[], shown: string): string[] {
  return findings.filter(isRule).flatMap((finding) =>
    wordsOf(locale, finding)
      .filter((words) => !shown.includes(words))
      .map((words) => `${finding.code}: ${words}`),
  );
}

describe('every rule of the plan, provoked on the worksheet', () => {
  it.each<[Locale, number]>([
    ['en-US', 1280],
    ['es-MX', 390],
  ])('shows its words, its source and how that was checked: %s at %d', async (locale, width) => {
    const page = await personAt('lead', locale, width);
    const provoked = new Set<string>();
    const lapsedId = await lapsedPerson(page);
    for (const [name, base, edits] of BROKEN_PLANS) {
      // Without accounts: what the register says of a person would mend what is to be broken.
      const { content } = withEdits(base, {
        ...edits,
        'crew/0/userId': base === 'O' ? lapsedId : undefined,
        ...('crew/1' in edits ? {} : { 'crew/1/userId': undefined }),
      });
      const record = await answered<WorksheetRecord>(page, '/api/worksheets', {
        content: await placed(page, content),
      });
      const findings = record.assessment.findings;
      findings.forEach(({ code }) => provoked.add(code));
      await page.goto(`/worksheets/${record.id}`);
      await page.getByRole('heading', { level: 2 }).first().waitFor();
      await unfold(page);
      await expect
        .poll(async () => missingWords(locale, findings, await textOf(page)), {
          timeout: 10_000,
          message: name,
        })
        .toEqual([]);
      await keepPicture(page, `rules-${locale}-${name.replaceAll(' ', '-')}`);
    }
    const ofThePlan = rules.filter(({ stages }) => stages.includes('plan'));
    expect(ofThePlan.map(({ code }) => code).filter((code) => !provoked.has(code))).toEqual([]);
    await page.context().close();
  });
});

/** Signed by all three, through the server: the signatures themselves have a journey of their own. */
async function inForce(lead: Page, content: WorksheetContent): Promise<WorksheetRecord> {
  const helper = await personAt('helper', 'en-US', 390);
  const supervisor = await personAt('supervisor', 'en-US', 390);
  const idOf = async (page: Page) =>
    (await answered<{ user: { id: string } }>(page, '/api/session')).user.id;
  const [leadId, helperId, supervisorId] = [
    await idOf(lead),
    await idOf(helper),
    await idOf(supervisor),
  ];
  const [one, other] = content.crew ?? [];
  const crew = [
    { ...one, userId: leadId },
    { ...other, userId: helperId },
  ];
  const { id } = await answered<WorksheetRecord>(lead, '/api/worksheets', {
    content: { ...content, crew },
  });
  for (const [page, meaning, signerId, pin] of [
    [lead, 'prepared', leadId, '246810'],
    [helper, 'acknowledged', helperId, '135792'],
    [supervisor, 'countersigned', supervisorId, '864209'],
  ] as const) {
    const { contentHash } = await answered<WorksheetRecord>(page, `/api/worksheets/${id}`);
    await answered(page, `/api/worksheets/${id}/signatures`, {
      ...{ id: newId(), meaning, signerId, pin, strokes: STROKES, contentHash },
    });
  }
  await helper.context().close();
  await supervisor.context().close();
  return answered<WorksheetRecord>(lead, `/api/worksheets/${id}`);
}

const BATTERY = {
  id: 's4',
  kind: 'battery unit' as const,
  from: 'in A2',
  points: ['A2'],
  openedAt: 'battery connector' as const,
  held: 'exclusive control' as const,
  byCrewId: 'c1',
};

describe('every rule of the test and of the close-out', () => {
  it.each<[Locale, number]>([
    ['en-US', 390],
    ['es-MX', 1280],
  ])('shows its words, its source and how that was checked: %s at %d', async (locale, width) => {
    const lead = await personAt('lead', locale, width);
    const now = Date.now();
    const at = (hours: number) => new Date(now + hours * 3_600_000).toISOString();
    const { content } = soundWorksheet();
    const record = await inForce(lead, {
      ...(await placed(lead, content)),
      job: {
        ...(await placed(lead, content)).job,
        startsAt: at(-1),
        endsAt: at(3),
        occupied: false,
      },
      supply: { ...content.supply, neutralShared: 'not known' },
      egressSupply: ['generator', 'battery units'],
      sources: [...(content.sources ?? []), BATTERY],
      protectiveEquipment: {
        ...content.protectiveEquipment,
        gloves: {
          ...content.protectiveEquipment?.gloves,
          issuedOn: new Date(now - 40 * 86_400_000).toISOString().slice(0, 10),
          lastTestedOn: new Date(now - 60 * 86_400_000).toISOString().slice(0, 10),
        },
      },
    });
    const on = new Date().toISOString();
    const shows = async (findings: Finding[], codes: string[]) => {
      expect(codes.filter((code) => !findings.some((finding) => finding.code === code))).toEqual(
        [],
      );
      await expect
        .poll(async () => missingWords(locale, findings, await textOf(lead)), { timeout: 10_000 })
        .toEqual([]);
    };
    const blank = assess(record.content, { on, stage: 'work', proof: {} });
    await lead.goto(`/worksheets/${record.id}/proof`);
    await lead.getByRole('heading', { level: 2 }).first().waitFor();
    await unfold(lead);
    await shows(
      blank.findings.filter(({ severity }) => severity !== 'caution'),
      rules
        .filter(
          ({ stages, code }) =>
            !stages.includes('plan') && stages.includes('work') && !/voltage/.test(code),
        )
        .map(({ code }) => code),
    );
    await keepPicture(lead, `rules-${locale}-test`);
    const cell = lead.getByLabel(/^A2, (Phase to ground|Fase a tierra)$/);
    for (const volts of [5, 60]) {
      await cell.fill(String(volts));
      await cell.blur();
      const reading = { point: 'A2', from: 'A', to: 'G', volts, current: 'ac', at: on } as const;
      const read = assess(record.content, { on, stage: 'work', proof: { readings: [reading] } });
      const code = volts < 50 ? 'absence.stray-voltage' : 'absence.voltage-present';
      await shows(
        read.findings.filter((finding) => finding.code === code),
        [code],
      );
      await keepPicture(lead, `rules-${locale}-${volts}-volts`);
    }

    const end = assess(record.content, { on, stage: 'close-out', closeOut: {} });
    await lead.goto(`/worksheets/${record.id}/close`);
    await lead.getByRole('heading', { level: 2 }).first().waitFor();
    await unfold(lead);
    await shows(
      end.findings.filter(({ severity }) => severity !== 'caution'),
      ['closeout.not-cleared', 'closeout.locks-left'],
    );
    const restored = fieldLabel(locale, '/closeOut/restored') ?? '';
    await lead
      .getByRole('radiogroup', { name: restored })
      .getByText(/^(Yes|Sí)/)
      .click();
    const restoredEnd = assess(record.content, {
      on,
      stage: 'close-out',
      closeOut: { restored: true },
    });
    await shows(
      restoredEnd.findings.filter(({ severity }) => severity !== 'caution'),
      ['closeout.covers-off', 'closeout.egress-untested'],
    );
    await keepPicture(lead, `rules-${locale}-close-out`);
    await lead.context().close();
  });
});
