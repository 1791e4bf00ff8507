import type { Browser } from 'playwright-core';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { WorksheetRecord } from '@/shared/record';
import { verifyRecord } from '@/server/services/verifyRecord';
import { drawSignature, launchBrowser, newScreen, signInAs } from '../support/browser';
import { NOW, buildCompany, create, read } from '../support/record';
import type { Company } from '../support/record';
import { startRoundRobin } from '../support/roundRobin';
import type { RoundRobin } from '../support/roundRobin';
import { PASSWORD, PIN } from '../support/server';
import { send, startServerProcess } from '../support/serverProcess';
import type { ServerProcess } from '../support/serverProcess';

let company: Company;
let record: WorksheetRecord;
let servers: ServerProcess[];
let proxy: RoundRobin;
let browser: Browser;

beforeAll(async () => {
  company = await buildCompany();
  record = await create(company);
  servers = await Promise.all([
    startServerProcess({ TEST_NOW: NOW }),
    startServerProcess({ TEST_NOW: NOW }),
  ]);
  proxy = await startRoundRobin(servers);
  browser = await launchBrowser();
});
afterAll(async () => {
  await browser?.close();
  await proxy?.stop();
  await Promise.all((servers ?? []).map((server) => server.stop()));
});

describe('two servers on one database behind a load balancer', () => {
  it('serve one browser, each request by the next of them', async () => {
    const { page, faults } = await newScreen(browser, proxy.base);
    // The servers of the test live at this instant, for which the worksheet is sound.
    await page.clock.setFixedTime(NOW);
    await signInAs(page, company.lead.user.email, PASSWORD);
    await page.goto(`/worksheets/${record.id}`);

    const job = page.getByRole('region', { name: 'Job' }).first();
    const head = job.getByRole('heading', { level: 2 }).getByRole('button');
    if ((await head.getAttribute('aria-expanded')) === 'false') await head.click();
    await job.getByLabel('Area', { exact: true }).fill('Level 3 hall');
    const area = async () => (await read(company.lead, record.id)).content.job?.area;
    await expect.poll(area, { timeout: 20_000 }).toBe('Level 3 hall');

    const ways = page.getByRole('region', { name: 'Ways it can be live' }).first();
    const waysHead = ways.getByRole('heading', { level: 2 }).getByRole('button');
    if ((await waysHead.getAttribute('aria-expanded')) === 'false') await waysHead.click();
    const picture = await sharp({
      create: { width: 320, height: 240, channels: 3, background: '#806040' },
    })
      .jpeg()
      .toBuffer();
    const chooser = page.waitForEvent('filechooser');
    await ways.getByRole('button', { name: 'Choose photos' }).click();
    await (await chooser).setFiles({ name: 'lock.jpg', mimeType: 'image/jpeg', buffer: picture });
    await ways.getByLabel('Caption').fill('Lock 12 on LA-1.');
    await ways.getByRole('button', { name: 'Send this photo' }).click();
    const photos = async () => (await read(company.lead, record.id)).attachments.length;
    await expect.poll(photos, { timeout: 20_000 }).toBe(1);
    await ways.getByLabel('Open the photo: Lock 12 on LA-1.').first().waitFor();

    await page.goto(`/worksheets/${record.id}/sign/prepared`);
    await page.locator('#signing-pin').fill(PIN);
    await drawSignature(page);
    await page.getByRole('button', { name: /^Sign as lead/ }).click();
    const state = async () => (await read(company.lead, record.id)).state;
    await expect.poll(state, { timeout: 20_000 }).toBe('briefing');

    await page.goto('/account');
    await page.getByRole('button', { name: 'Sign out' }).click();
    await page.waitForURL(/sign-in/);
    // Neither of them still knows the session.
    for (const server of servers) {
      const cookies = await page.context().cookies(proxy.base);
      const cookie = cookies.map(({ name, value }) => `${name}=${value}`).join('; ');
      expect((await send(`${server.base}/api/session`, { cookie })).status).toBe(401);
    }
    expect(Math.min(...proxy.counts)).toBeGreaterThan(10);
    expect(faults).toEqual([]);
    expect((await verifyRecord()).faults).toEqual([]);
  });

  it('count failed sign-ins together', async () => {
    const { page } = await newScreen(browser, proxy.base);
    await page.goto('/sign-in');
    const submit = page.getByRole('button', { name: /^Sign in/ });
    for (let tries = 1; tries <= 11; tries += 1) {
      await page.getByLabel(/^E-mail/).fill(company.helper.user.email);
      await page.getByLabel(/^Password/).fill(`not the password ${tries}`);
      const answer = page.waitForResponse(
        (response) =>
          response.url().endsWith('/api/session') && response.request().method() === 'POST',
      );
      await submit.click();
      // Ten failures of one account from one address in a quarter of an hour, whichever server counted them.
      expect((await answer).status()).toBe(tries <= 10 ? 401 : 429);
    }
  });
});
