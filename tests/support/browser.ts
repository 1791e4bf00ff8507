import { mkdirSync } from 'node:fs';
import path from 'node:path';
import { chromium, type Browser, type Locator, type Page } from 'playwright-core';

const SHOTS = path.resolve(import.meta.dirname, '../../reports/screens');

/** Debian's Chromium, as root and without a display. */
export function launchBrowser(): Promise<Browser> {
  return chromium.launch({
    executablePath: process.env['CHROMIUM'] ?? '/usr/bin/chromium',
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
      '--no-first-run',
    ],
  });
}

export interface ScreenOptions {
  width?: number;
  height?: number;
  scheme?: 'light' | 'dark';
  locale?: string;
}

/** What the browser complained about: a page that works says nothing. */
export interface Watched {
  page: Page;
  faults: string[];
}

/** A browser of one person's own, with its own cookies. */
export async function newScreen(
  browser: Browser,
  base: string,
  { width = 390, height = 844, scheme = 'light', locale = 'en-US' }: ScreenOptions = {},
): Promise<Watched> {
  const context = await browser.newContext({
    baseURL: base,
    viewport: { width, height },
    colorScheme: scheme,
    locale,
    timezoneId: 'America/Chicago',
    reducedMotion: 'reduce',
    serviceWorkers: 'block',
  });
  const page = await context.newPage();
  page.setDefaultTimeout(20_000);
  const faults: string[] = [];
  page.on('pageerror', (error) => faults.push(String(error)));
  page.on('console', (message) => {
    if (message.type() === 'error' && !/Failed to load resource|WebSocket/.test(message.text())) {
      faults.push(message.text());
    }
  });
  return { page, faults };
}

export async function signInAs(page: Page, email: string, password: string): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel(/^(E-mail|Correo)/).fill(email);
  await page.getByLabel(/^(Password|Contraseña)/).fill(password);
  await page.getByRole('button', { name: /^(Sign in|Entrar|Iniciar)/ }).click();
  await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
}

/** Keeps a picture of the screen for whoever reads the reports. */
export async function keepPicture(page: Page, name: string): Promise<void> {
  mkdirSync(SHOTS, { recursive: true });
  await page.screenshot({ path: path.join(SHOTS, `${name}.png`) });
}

type Where = Page | Locator;

/** Types into the field of that label. */
export async function type(where: Where, label: string, value: string): Promise<void> {
  await where.getByLabel(label, { exact: true }).first().fill(value);
}

/** Chooses one answer that is in view. */
export async function pick(where: Where, label: string, option: string | RegExp): Promise<void> {
  const group = where.getByRole('radiogroup', { name: label, exact: true });
  await group.getByRole('radio', { name: option }).click();
}

/** Unfolds a list and chooses one answer of many. */
export async function select(where: Where, label: string, option: string | RegExp): Promise<void> {
  const start = new RegExp(`^${label.replace(/[.*+?^${}()|[\]\\]/g, '\\$&')}`);
  await where.getByRole('button', { name: start }).first().click();
  await pick(where, label, option);
}

/** Ticks one of several answers, or a line of a list. */
export async function tick(where: Where, option: string | RegExp): Promise<void> {
  const box = where.getByRole('checkbox', { name: option });
  if ((await box.getAttribute('aria-checked')) !== 'true') await box.click();
}

/** Draws two strokes as a finger would. */
export async function drawSignature(page: Page): Promise<void> {
  const pad = page.locator('canvas').first();
  await pad.scrollIntoViewIfNeeded();
  const box = await pad.boundingBox();
  if (box === null) throw new Error('The signature pad is not on the screen.');
  const at = (x: number, y: number) => [box.x + box.width * x, box.y + box.height * y] as const;
  for (const stroke of [
    [at(0.1, 0.5), at(0.25, 0.25), at(0.35, 0.6), at(0.45, 0.3)],
    [at(0.5, 0.5), at(0.6, 0.35), at(0.75, 0.55)],
  ]) {
    const [first, ...rest] = stroke;
    if (first === undefined) continue;
    await page.mouse.move(...first);
    await page.mouse.down();
    for (const point of rest) await page.mouse.move(...point, { steps: 4 });
    await page.mouse.up();
  }
}
