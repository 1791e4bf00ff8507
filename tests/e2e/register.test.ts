import type { Browser, Locator, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  keepPicture,
  launchBrowser,
  newScreen,
  pick,
  select,
  signInAs,
  tick,
  type,
} from '../support/browser';
import type { Watched } from '../support/browser';
import { DEMO_ACCOUNTS, DEMO_PASSWORD } from '../support/demoAccounts';
import { receivedMails } from '../support/server';
import { startWebServer, type WebServer } from '../support/webServer';

const SITE = 'Ashgrove Commons';
const HELPER = {
  name: 'Ingrid Castellane',
  email: 'ingrid@company.example',
  password: 'seven herons by the weir',
  pin: '573914',
};
/** In test at the site, and the one that fails here. */
const GOOD_PAIR = 'AC-0-117';
const FAILED_PAIR = 'AC-0-121';

const NAMES = ['Abel', 'Bruna', 'Cyril', 'Dafne', 'Emeric', 'Fedra', 'Gaspar', 'Hedda', 'Ivo'];
const HEADING = 'name,email,role,sites,qualifiedThrough,language';
const line = (name: string, fields = `${SITE},2031-05-31,en`, role = 'lead') =>
  `${name} Norwood,${name.toLowerCase()}@company.example,${role},${fields}`;
const RIGHT = NAMES.map((name, index) =>
  index % 2 === 0 ? line(name) : line(name, `${SITE},,es`, 'helper'),
);
/** A role that there is not, a site that there is not, a date as nobody can read it for sure. */
const WRONG = [
  line('Jorun', `${SITE},,en`, 'foreman'),
  line('Kaspar', 'Ashgrove Comons,,en', 'helper'),
  line('Lorna', `${SITE},05/06/2031,en`),
];
const MENDED = [
  line('Jorun', `${SITE},,en`, 'helper'),
  line('Kaspar', `${SITE},,en`, 'helper'),
  line('Lorna', `${SITE},2031-06-05,en`),
];
const fileOf = (lines: readonly string[]) => ({
  name: 'people.csv',
  mimeType: 'text/csv',
  buffer: Buffer.from([HEADING, ...lines].join('\r\n')),
});

let server: WebServer;
let browser: Browser;
let desk: Watched;

beforeAll(async () => {
  server = await startWebServer();
  browser = await launchBrowser();
  desk = await newScreen(browser, server.base, { width: 1280, height: 800 });
  await signInAs(desk.page, DEMO_ACCOUNTS.safety.email, DEMO_PASSWORD);
});
afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

const place = (page: Page, name: string) =>
  page.getByRole('navigation').getByRole('link', { name, exact: true });

/** The link in the latest invitation to that address. */
async function invitationOf(email: string): Promise<string> {
  const links = () =>
    receivedMails()
      .filter(({ to }) => to.includes(email))
      .flatMap(({ text }) => /\/invitation\/[\w-]+/.exec(text)?.[0] ?? []);
  await expect.poll(() => links().length, { timeout: 30_000 }).toBeGreaterThan(0);
  return links().at(-1) ?? '';
}

async function chooseFile(page: Page, lines: readonly string[]): Promise<void> {
  const chooser = page.waitForEvent('filechooser');
  await page.getByRole('button', { name: 'Choose a file' }).click();
  await (await chooser).setFiles(fileOf(lines));
}

async function section(page: Page, name: string): Promise<Locator> {
  const region = page.getByRole('region', { name }).first();
  const head = region.getByRole('heading', { level: 2 }).getByRole('button');
  if ((await head.getAttribute('aria-expanded')) === 'false') await head.click();
  return region;
}

/** What may be chosen in a list, with the words under each. */
async function offeredIn(where: Locator, label: string): Promise<string[]> {
  const start = new RegExp(`^${label}`);
  await where.getByRole('button', { name: start }).first().click();
  const group = where.getByRole('radiogroup', { name: label, exact: true });
  await group.getByRole('radio').first().waitFor();
  return group.getByRole('radio').allTextContents();
}

describe('the register, from an invitation to the next worksheet', () => {
  it('invites a helper, who opens the link on a phone and signs in', async () => {
    const { page } = desk;
    await place(page, 'People').click();
    await page.getByRole('button', { name: 'Invite a person' }).click();
    await type(page, 'Name', HELPER.name);
    await type(page, 'E-mail', HELPER.email);
    await pick(page, 'Role', /^Helper/);
    await tick(page, SITE);
    await page.getByRole('button', { name: 'Send the invitation' }).click();
    await page.getByText(`${HELPER.name} is in the register.`, { exact: false }).waitFor();
    await keepPicture(page, 'register-invited');
    const first = await invitationOf(HELPER.email);
    await page.getByRole('button', { name: 'Send the invitation again' }).click();
    await page.getByText(`A new invitation to ${HELPER.name} is on its way.`).waitFor();
    await expect.poll(() => invitationOf(HELPER.email), { timeout: 30_000 }).not.toBe(first);

    const phone = await newScreen(browser, server.base);
    const choose = async (link: string) => {
      await phone.page.goto(link);
      await type(phone.page, 'New password', HELPER.password);
      await phone.page.getByLabel('New signing PIN, 6 digits').fill(HELPER.pin);
      await phone.page.getByRole('button', { name: 'Open the account' }).click();
    };
    await choose(first);
    await phone.page
      .getByText('This invitation has run out or was used.', { exact: false })
      .waitFor();
    await choose(await invitationOf(HELPER.email));
    await phone.page.getByText('The account is open.', { exact: false }).waitFor();
    await keepPicture(phone.page, 'register-account-open');
    await signInAs(phone.page, HELPER.email, HELPER.password);
    await phone.page.getByText(HELPER.name).first().waitFor();
    expect(phone.faults).toEqual([]);
    await phone.page.context().close();

    await page.reload();
    const again = page.getByRole('button', { name: 'Send the invitation again' });
    await expect.poll(() => again.count(), { timeout: 20_000 }).toBe(0);
  });

  it('retires a pair of gloves with the test that it failed', async () => {
    const { page } = desk;
    await place(page, 'Rubber goods').click();
    await page.getByRole('button', { name: FAILED_PAIR, exact: true }).click();
    await page.getByRole('button', { name: 'Record a test' }).click();
    const today = new Intl.DateTimeFormat('en-CA', { timeZone: 'America/Chicago' }).format();
    await type(page, 'Tested on', today);
    await pick(page, 'Result', 'Failed');
    await page.getByText('A failed test takes it out of use', { exact: false }).waitFor();
    await page.getByRole('button', { name: 'Save and retire it' }).click();
    await page.getByText(`The test of ${FAILED_PAIR} is recorded.`).waitFor();
    await page.getByText('Retired: Failed its test', { exact: false }).first().waitFor();
    await keepPicture(page, 'register-failed-pair');
    // The pair that the crews wear tells where it was worn.
    await page.getByRole('button', { name: GOOD_PAIR, exact: true }).click();
    const worn = page.getByRole('region', { name: 'Worksheets' });
    await worn.getByRole('link').first().waitFor();
    expect(await worn.getByRole('link').count()).toBeGreaterThan(1);
  });

  it('imports twelve people once the three lines that were not right are mended', async () => {
    const { page } = desk;
    await place(page, 'People').click();
    await page.getByText(/^\d+ people on /).waitFor();
    const countOf = async () =>
      Number(
        /^(\d+) people/.exec((await page.getByText(/^\d+ people on /).textContent()) ?? '')?.[1],
      );
    const before = await countOf();
    await page.getByRole('button', { name: 'Import a CSV' }).click();
    await chooseFile(page, [...RIGHT, ...WRONG]);
    await page.getByText('3 things to mend. Nothing is imported.').waitFor();
    const faults = page.getByRole('table', { name: /things to mend/ });
    const rows = await faults.getByRole('row').allTextContents();
    // The heading is line 1, so the tenth person stands in line 11.
    expect(rows.slice(1)).toEqual([
      expect.stringMatching(/^11role.*foreman.*Write lead, helper, supervisor or safety/),
      expect.stringMatching(/^12sites.*Ashgrove Comons.*No site in use has this name/),
      expect.stringMatching(/^13qualified ?through.*05\/06\/2031.*year-month-day/i),
    ]);
    expect(await page.getByRole('button', { name: /^Import and invite/ }).count()).toBe(0);
    await keepPicture(page, 'register-import-to-mend');

    await chooseFile(page, [...RIGHT, ...MENDED]);
    await page.getByText('12 lines are right').waitFor();
    await page.getByRole('button', { name: 'Import and invite 12 people' }).click();
    await page.getByText('12 lines are imported.').waitFor();
    await page.getByRole('button', { name: 'People', exact: true }).last().click();
    await expect.poll(countOf, { timeout: 20_000 }).toBe(before + 12);
    for (const name of [...NAMES, 'Jorun', 'Kaspar', 'Lorna']) {
      expect(await page.getByRole('button', { name: `${name} Norwood`, exact: true }).count()).toBe(
        1,
      );
    }
    await keepPicture(page, 'register-imported');
    expect(desk.faults).toEqual([]);
  });

  it('offers the lead the new people and the good pair, and answers of the site to confirm', async () => {
    const { page, faults } = await newScreen(browser, server.base);
    await signInAs(page, DEMO_ACCOUNTS.lead.email, DEMO_PASSWORD);
    await page.getByRole('link', { name: 'New worksheet' }).click();
    await page.getByText('Ways it can be live').first().waitFor();
    const job = await section(page, 'Job');
    await select(job, 'Site', SITE);
    const fromLast = /^From worksheet \d{4}-\d{6} of .*, to be confirmed$/;
    await job.getByText(fromLast).waitFor();
    await keepPicture(page, 'register-new-worksheet');

    const crew = await section(page, 'Crew and briefing');
    const people = await offeredIn(crew, 'Add a person of this site');
    for (const name of [HELPER.name, 'Abel Norwood', 'Bruna Norwood']) {
      expect(
        people.filter((words) => words.startsWith(name)),
        name,
      ).toHaveLength(1);
    }
    await pick(crew, 'Add a person of this site', new RegExp(HELPER.name));
    await select(crew, 'Add a person of this site', /Abel Norwood/);

    const equipment = await section(page, 'Protective equipment');
    const pairs = await offeredIn(equipment, 'Gloves from the register');
    expect(pairs.filter((words) => words.includes(FAILED_PAIR))).toEqual([]);
    const good = pairs.find((words) => words.includes(GOOD_PAIR)) ?? '';
    expect(good).toMatch(/Class 0/i);
    expect(good).toMatch(/Tested .*20\d\d, due .*20\d\d, \d+ days left/);
    await pick(equipment, 'Gloves from the register', new RegExp(GOOD_PAIR));
    await keepPicture(page, 'register-gloves');

    // Nothing is answered until a person takes it.
    const emergency = crew.getByLabel('Who to call', { exact: true });
    expect(await emergency.inputValue()).toBe('');
    await crew.getByRole('button', { name: /^Take 911, then/ }).click();
    expect(await emergency.inputValue()).toMatch(/^911, then/);

    const supply = await section(page, 'Supply');
    const system = supply.getByRole('button', { name: /^System/ });
    expect(await system.textContent()).not.toContain('480Y');
    await supply.getByText('From the site, to be confirmed').first().waitFor();
    await supply.getByRole('button', { name: 'Take LP-3' }).click();
    expect(await supply.getByLabel('Panel', { exact: true }).inputValue()).toBe('LP-3');
    await supply.getByRole('button', { name: /^Take 480Y\/277/ }).click();
    expect(await system.textContent()).toContain('480Y/277');
    await supply.getByRole('button', { name: 'Take 4', exact: true }).click();
    expect(await supply.getByLabel('Circuit', { exact: true }).inputValue()).toBe('4');
    await keepPicture(page, 'register-supply');

    const occupied = job.getByRole('radiogroup', { name: 'Are people in the building?' });
    expect(await occupied.getByRole('radio', { checked: true }).count()).toBe(0);
    await job.getByRole('button', { name: /^Take (Yes|No)$/ }).click();
    expect(await occupied.getByRole('radio', { checked: true }).count()).toBe(1);

    const ways = await section(page, 'Ways it can be live');
    await ways.getByText(fromLast).waitFor();
    expect(await ways.getByRole('checkbox', { checked: true }).count()).toBe(0);
    await ways
      .getByRole('button', { name: /^Take / })
      .first()
      .click();
    expect(await ways.getByRole('checkbox', { checked: true }).count()).toBeGreaterThan(0);
    await page
      .getByText(/^Sent /)
      .first()
      .waitFor();
    await keepPicture(page, 'register-ways');
    expect(faults).toEqual([]);
  });
});
