import type { Browser, Locator, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  drawSignature,
  keepPicture,
  launchBrowser,
  newScreen,
  pick,
  select,
  signInAs,
  tick,
  type,
} from '../support/browser';
import { DEMO_ACCOUNTS, DEMO_PASSWORD } from '../support/demoAccounts';
import { textOfPdf } from '../support/pdfText';
import { startWebServer, type WebServer } from '../support/webServer';

/** A loaded machine takes its time to draw what was typed. */
const SETTLED = { timeout: 10_000 };
const { lead: LEAD, helper: HELPER, supervisor: SUPERVISOR } = DEMO_ACCOUNTS;

const CLOSE = /^Close as lead/;

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

/** One of the twelve sections, unfolded. */
async function section(page: Page, name: string): Promise<Locator> {
  const region = page.getByRole('region', { name }).first();
  const head = region.getByRole('heading', { level: 2 }).getByRole('button');
  if ((await head.getAttribute('aria-expanded')) === 'false') await head.click();
  return region;
}

async function fillJob(page: Page): Promise<void> {
  const job = await section(page, 'Job');
  await select(job, 'Site', 'Ashgrove Commons');
  await type(job, 'Area', 'Level 2 corridor');
  await type(job, 'Equipment', 'LED luminaires C1, C3, C5, C6');
  await select(job, 'Task', 'Replace a driver or ballast');
  await select(job, 'Lamps', /Any other/);
  await type(job, 'What will be done', 'Replace four LED drivers in the level 2 corridor.');
  const now = new Date();
  const day = new Intl.DateTimeFormat('en-CA', { timeZone: 'America/Chicago' }).format(now);
  const clock = (minutes: number) =>
    new Intl.DateTimeFormat('en-GB', {
      timeZone: 'America/Chicago',
      hour: '2-digit',
      minute: '2-digit',
    }).format(new Date(now.getTime() + minutes * 60_000));
  const later = new Date(now.getTime() + 4 * 3_600_000);
  const laterDay = new Intl.DateTimeFormat('en-CA', { timeZone: 'America/Chicago' }).format(later);
  await type(job, 'Work starts, Date', day);
  await type(job, 'Work starts, Time', clock(-1));
  await type(job, 'Work ends, Date', laterDay);
  await type(job, 'Work ends, Time', clock(240));
  await type(job, 'Points of work', '4');
  await pick(job, 'Are people in the building?', 'Yes');
  await pick(job, 'Does the work run into another shift?', 'No');
  await tick(job, 'None of these');
}

async function fillSupply(page: Page): Promise<void> {
  const supply = await section(page, 'Supply');
  await select(supply, 'System', /480Y\/277/);
  await pick(supply, 'Circuit voltage', /277/);
  await type(supply, 'Panel', 'LP-2');
  await type(supply, 'Circuit', '14');
  await tick(supply, /two or more places/);
  await pick(supply, 'Is the neutral shared?', /^No,/);
  await select(supply, 'Has the breaker tripped?', /^No$/);
  await pick(supply, 'Is anything damaged?', 'No');
  for (const [label, volts] of [
    ['A to B', '481'],
    ['B to C', '479'],
    ['C to A', '480'],
    ['A to N', '277'],
    ['B to N', '278'],
    ['C to N', '277'],
  ] as const) {
    await type(supply, label, volts);
  }
  await type(supply, 'Load on the circuit', '728');
}

interface Way {
  kind: RegExp;
  from: string;
  openedAt: string;
  held: string;
  lock?: string;
  same?: RegExp;
  points?: string;
}

async function addWay(page: Page, way: Way): Promise<void> {
  const ways = await section(page, 'Ways it can be live');
  await ways.getByRole('button', { name: 'Add a way it can be live' }).click();
  await select(ways, 'Kind of way', way.kind);
  await type(ways, 'Where it comes from', way.from);
  if (way.same !== undefined) await select(ways, 'Same conductors as', way.same);
  if (way.points !== undefined) await type(ways, 'Points of work that it reaches', way.points);
  await select(ways, 'Opened at', way.openedAt);
  await select(ways, 'Held open by', way.held);
  if (way.lock !== undefined) await type(ways, 'Lock number', way.lock);
  await select(ways, 'Who opens and locks it', new RegExp(LEAD.name));
  if (way.lock !== undefined) await tick(ways, new RegExp(LEAD.name));
  // Folds the way, so that the next one's fields are the only ones on the screen.
  await ways.locator('[aria-expanded="true"][aria-label^="3."]').last().click();
}

async function fillSources(page: Page, battery: string): Promise<void> {
  const ways = await section(page, 'Ways it can be live');
  await tick(ways, 'Battery units');
  await pick(ways, 'Does it reach this equipment?', /It reaches this equipment/);
  await type(ways, 'Who runs the building and was told', 'Building control room');
  await type(
    ways,
    'What stands in until it is restored',
    'Two battery work lights, corridor closed',
  );
  await addWay(page, {
    kind: /^Normal/,
    from: 'LP-2 circuit 14',
    openedAt: 'Branch breaker',
    held: 'Lock and tag',
    lock: '0417',
  });
  await addWay(page, {
    kind: /^Traveler/,
    from: 'Three-way switch at the stair',
    same: /^3\.1/,
    openedAt: 'Branch breaker',
    held: 'Lock and tag',
    lock: '0417',
  });
  for (const point of ['C3', 'C6']) {
    await addWay(page, {
      kind: /^Battery unit/,
      from: `Inside luminaire ${point}`,
      points: point,
      openedAt: point === 'C6' ? battery : 'Battery connector',
      held: 'In the hands of the person who works',
    });
  }
}

async function fillTheRest(page: Page): Promise<void> {
  await pick(await section(page, 'Off or energized'), 'Off or energized', /^Off/);

  const test = await section(page, 'Test for absence of voltage');
  await pick(test, 'Instrument', 'Contact tester');
  await pick(test, 'Measurement category', 'CAT III');
  await type(test, 'Rated for', '1000');
  await select(test, 'Who tests', new RegExp(LEAD.name));
  await tick(test, /instrument, leads and probes/);

  const boundaries = await section(page, 'Approach boundaries');
  await pick(boundaries, 'What is exposed', /two-wire circuit/);
  await pick(boundaries, 'Can a conductor swing toward someone?', /^No/);

  const arc = await section(page, 'Arc flash');
  await select(arc, 'Kind of equipment', /^Luminaire/);
  for (const condition of await arc.getByRole('checkbox').all()) await condition.click();
  await type(arc, 'Working distance, face and chest to the part', '18 in');
  await pick(arc, 'No arc flash label on the equipment', 'Yes');
  await type(arc, 'Available fault current', '12');
  await type(arc, 'Clearing time', '0.025');
  await type(arc, 'Lowest arc rating worn', '8');

  const equipment = await section(page, 'Protective equipment');
  await select(equipment, 'Gloves from the register', /AC-0-117/);

  const around = await section(page, 'Surroundings');
  await around.getByRole('button', { name: 'Add a grounded surface' }).click();
  await select(around, 'Grounded surface', 'Ceiling grid');
  await pick(around, 'Is it in reach?', 'Yes');
  await tick(around, /covered with insulation/);
  await select(around, 'Where the work is done from', /^Stepladder/);
  await type(around, 'Ceiling height', '9 ft');
  await select(around, 'Ladder material', 'Fiberglass');
  await type(around, 'Ladder size', '6 ft');
  await type(around, 'Height of the step stood on', '3 ft');
  await pick(around, 'Is the ladder locked open, level and kept from doors and traffic?', 'Yes');
  await pick(around, 'Asbestos or PCBs', 'No suspect material');
  await pick(around, 'Is there enough light with the circuit off?', 'Yes');
  await pick(around, 'Is anything wet?', 'No');
  await pick(around, 'Are rings, watch, chains and metal frames off?', 'Yes');
  await pick(around, 'May people walk up to the work?', 'Yes');
  await type(around, 'Barricade at', '5 ft');
  await pick(around, 'Does an attendant keep people out?', 'No');
  await pick(around, 'Is the work outdoors?', 'No');
}

async function fillCrew(page: Page): Promise<void> {
  const crew = await section(page, 'Crew and briefing');
  await select(crew, 'How close they come until it is proved dead', /restricted/i);
  for (const line of [/wear arc-rated/, /trained in release/]) await tick(crew, line);
  const works = crew.getByRole('radiogroup', { name: 'Do they work on the circuit?' });
  await works.nth(0).getByRole('radio', { name: 'Yes' }).click();
  await select(crew, 'Add a person of this site', new RegExp(HELPER.name));
  await works.nth(1).getByRole('radio', { name: 'No' }).click();
  const closest = crew.getByRole('button', { name: /^How close they come/ }).nth(1);
  await closest.click();
  await pick(crew, 'How close they come until it is proved dead', /Outside all/i);
}

/** Ticks every line that is still open; each tick may bring new lines. */
async function tickAll(where: Locator, name?: RegExp): Promise<void> {
  const left = where.getByRole('checkbox', { checked: false, ...(name && { name }) });
  while ((await left.count()) > 0) await left.first().click();
}

async function finish(page: Page): Promise<void> {
  await tickAll(await section(page, 'Protective equipment'));
  const crew = await section(page, 'Crew and briefing');
  for (const [label, value] of [
    ['Who to call', '911, then 555-0142'],
    ['Rescue', 'Second person with the insulated hook'],
    ['First aid', 'Control room'],
    ['AED place', 'East lobby'],
  ] as const) {
    await type(crew, label, value);
  }
  await tickAll(
    crew,
    /tasks|hazards|protection$|procedures|precautions|each source|Protective equipment|how close$|Emergency plan|refusing/,
  );
}

async function signWith(page: Page, pin: string, button: RegExp): Promise<void> {
  await page.locator('#signing-pin').fill(pin);
  await drawSignature(page);
  await page.getByRole('button', { name: button }).click();
}

/** The test for absence of voltage at each of four points, all at zero. */
async function proveDead(page: Page): Promise<void> {
  await page
    .getByRole('button', { name: 'Prove it dead' })
    .or(page.getByRole('link', { name: 'Prove it dead' }))
    .first()
    .click();
  await page.getByRole('heading', { name: 'Prove it dead' }).waitFor();
  for (const way of await page.getByRole('checkbox', { name: /^3\.\d/ }).all()) await way.click();
  for (const half of await page.getByRole('checkbox', { name: /: (Up|Down|On)$/ }).all()) {
    await half.click();
  }
  await page
    .getByRole('checkbox', { name: 'The tester showed the known voltage', exact: true })
    .click();
  const points = page.getByRole('tab');
  expect(await points.count()).toBe(4);
  for (let point = 0; point < 4; point += 1) {
    await points.nth(point).click();
    for (const cell of await page.getByRole('table').getByRole('textbox').all())
      await cell.fill('0.0');
  }
  await type(page, 'Current in the neutral, before it is parted', '0');
  await page.getByRole('radio', { name: /covered or guarded/ }).click();
  await page.getByRole('radio', { name: /Discharged/ }).click();
  await page.getByRole('checkbox', { name: 'The tester showed the known voltage again' }).click();
  await page.getByLabel(/PIN, 6 digits/).fill(LEAD.pin);
  await page.getByRole('button', { name: /^Record: proved dead/ }).click();
  await page
    .getByText(/^Proved dead/)
    .first()
    .waitFor();
}

async function closeOut(page: Page): Promise<void> {
  for (const question of [
    'Are tools, jumpers and test leads out?',
    'Are all covers back on?',
    'Is everybody near warned that power returns?',
    'Is each lock off, taken off by its owner?',
    'Is everybody clear of the circuit?',
    'Is the circuit restored?',
  ]) {
    await pick(page, question, 'Yes');
  }
  await type(page, 'Emergency lights tested on battery for', '30');
  await page.getByLabel(/PIN, 6 digits/).fill(LEAD.pin);
  await page.getByRole('button', { name: CLOSE }).click();
}

describe('four LED drivers in a level 2 corridor, 480Y/277, LP-2/14', () => {
  it('goes from sign-in to a closed record and its PDF through the interface alone', async () => {
    const { page, faults } = await newScreen(browser, server.base);
    await signInAs(page, LEAD.email, DEMO_PASSWORD);
    await page.getByRole('link', { name: 'New worksheet' }).click();
    await page.getByText('Ways it can be live').first().waitFor();
    await fillJob(page);
    await fillSupply(page);
    await fillCrew(page);
    await fillSources(page, 'Not opened');
    await fillTheRest(page);
    await finish(page);

    // NFPA 70E-2024 Table 130.4(E)(a), 480 V: limited 3 ft 6 in fixed, restricted 1 ft 0 in;
    // Table 130.7(C)(15)(a), rows 2 and 6 together: arc flash 5 ft 0 in.
    const strip = page.getByRole('button', { name: /Limited/ }).first();
    await expect.poll(() => strip.getAttribute('aria-label'), SETTLED).toMatch(/3\sft\s6\sin/);
    expect(await strip.getAttribute('aria-label')).toMatch(/1\sft\s0\sin/);
    expect(await strip.getAttribute('aria-label')).toMatch(/5\sft\s0\sin/);

    // The battery unit that is still connected stops the worksheet, with its reason and its source.
    const stop = page.getByRole('region', { name: /^Stop: .*battery/i }).first();
    await stop.waitFor();
    expect(await stop.textContent()).toMatch(/1910\.333|Common practice/);
    await keepPicture(page, 'worksheet-stop');
    const ways = await section(page, 'Ways it can be live');
    await ways.locator('[aria-label^="3.4"]').first().click();
    await select(ways, 'Opened at', 'Battery connector');
    await tickAll(await section(page, 'Protective equipment'));
    await keepPicture(page, 'worksheet-mended');
    await page.getByText('Ready to sign', { exact: true }).first().waitFor();
    await page
      .getByText(/^Sent /)
      .first()
      .waitFor();
    await keepPicture(page, 'worksheet-ready');
    const address = page.url();

    await page.getByRole('link', { name: /^Sign the plan/ }).click();
    await signWith(page, LEAD.pin, /^Sign as lead/);
    await page.getByRole('link', { name: `Hand the phone to ${HELPER.name}` }).click();

    // The helper reads to the end and signs on the lead's phone with their own PIN.
    await page.getByTestId('briefing-end').scrollIntoViewIfNeeded();
    await keepPicture(page, 'helper');
    await page.getByRole('button', { name: /^(I understand|Entiendo)/ }).click();
    await signWith(page, '111222', /^(Sign|Firmar)/);
    await page
      .getByText(/The PIN is wrong|El PIN/)
      .first()
      .waitFor();
    await page.locator('#signing-pin').fill(HELPER.pin);
    await page.getByRole('button', { name: /^(Sign|Firmar)/ }).click();
    await page
      .getByText(/^(Signed|Firmado)/)
      .first()
      .waitFor();

    const tablet = await newScreen(browser, server.base, { width: 820, height: 1180 });
    await signInAs(tablet.page, SUPERVISOR.email, DEMO_PASSWORD);
    await tablet.page.goto(`${address}/sign/countersigned`);
    await signWith(tablet.page, SUPERVISOR.pin, /^Countersign/);
    await tablet.page
      .getByText(/In force/)
      .first()
      .waitFor();
    await keepPicture(tablet.page, 'countersigned');

    await page.goto(address);
    await page.getByText('Not proved dead: treat as live').first().waitFor();
    await proveDead(page);
    await keepPicture(page, 'proved');
    await page.goto(`${address}/close`);
    await closeOut(page);
    await page.goto(address);
    await page.getByText('Closed', { exact: true }).first().waitFor();
    await keepPicture(page, 'closed');

    const id = address.split('/').at(-1) ?? '';
    const pdf = await page.request.get(`/api/worksheets/${id}/pdf`);
    expect(pdf.status()).toBe(200);
    expect(pdf.headers()['content-type']).toBe('application/pdf');
    const text = await textOfPdf(await pdf.body());
    for (const figure of [
      '3 ft 6 in',
      '1 ft 0 in',
      '5 ft 0 in',
      'LP-2',
      '480Y/277',
      '0417',
      LEAD.name,
      HELPER.name,
    ]) {
      expect(text).toContain(figure);
    }
    expect(faults).toEqual([]);
    expect(tablet.faults).toEqual([]);
  });
});
