import { spawn } from 'node:child_process';
import { once } from 'node:events';
import path from 'node:path';
import type { Writable } from 'node:stream';
import { QueryTypes } from 'sequelize';
import { v7 } from 'uuid';
import type { WorksheetContent } from '@/shared/worksheet';
import { command, StartFault, withDatabase } from './environment';
import { postgresFolder } from './postgresTools';
import { FINISH, PREPARE, TAKE } from './seedLargeSql';

/*
 * Fills the archive for measurements: `npm run seed:large -- 1000000`. Each
 * worksheet is closed, lies three to twelve years back and has one event.
 */

const BATCH = 20_000;
const YEARS = 10;
const YEARS_BACK = 12;
const HOUR = 3_600_000;

const KINDS = [
  { task: 'replace lamp', words: 'Replace lamps', equipment: 'Downlights' },
  { task: 'replace driver or ballast', words: 'Replace one driver', equipment: 'Troffers' },
  { task: 'replace luminaire', words: 'Replace luminaires', equipment: 'High bays' },
  { task: 'add or extend circuit', words: 'Extend the circuit', equipment: 'Strip lights' },
] as const;
const AREAS = ['Corridor', 'Open office', 'Stair', 'Warehouse aisle', 'Lobby', 'Plant room'];
const SUPPLIES = [
  { system: '480Y/277', volts: 277, panel: 'LP' },
  { system: '208Y/120', volts: 120, panel: 'L' },
] as const;

interface Lead {
  id: string;
  name: string;
  siteId: string;
  siteName: string;
}

function countArgument(): number {
  const count = Number(process.argv[2]);
  if (Number.isInteger(count) && count > 0 && count <= 10_000_000) return count;
  throw new StartFault('Say how many: npm run seed:large -- 1000000');
}

async function readRegister(): Promise<{ leads: Lead[]; last: Map<number, number>; year: number }> {
  const { sequelize } = await import('../db');
  const { clock } = await import('../clock');
  const leads = await sequelize.query<Lead>(
    `SELECT u.id, u.name, s.id AS "siteId", s.name AS "siteName"
       FROM users u JOIN site_members m ON m.user_id = u.id JOIN sites s ON s.id = m.site_id
      WHERE u.role = 'lead' AND u.retired_at IS NULL AND s.retired_at IS NULL ORDER BY u.id, s.id`,
    { type: QueryTypes.SELECT },
  );
  if (leads.length === 0) throw new StartFault('No lead has a site yet. Run npm start once first.');
  const numbers = await sequelize.query<{ year: number; last: number }>(
    'SELECT year, last FROM worksheet_numbers',
    { type: QueryTypes.SELECT },
  );
  const last = new Map(numbers.map((row) => [row.year, row.last]));
  return { leads, last, year: clock.now().getUTCFullYear() };
}

/** How each kind of job is judged: the archive claims nothing that `assess` would not say. */
async function judgements(): Promise<string> {
  const { assessAt } = await import('../services/assessAt');
  const { verdictColumns } = await import('../services/writeDraft');
  const at = new Date('2020-01-15T15:00:00Z');
  const lines = KINDS.map(({ task, words, equipment }, kind) => {
    const content: WorksheetContent = {
      job: { task, description: words, equipment, area: 'Corridor', siteId: v7() },
      decision: { mode: 'off' },
      supply: { system: '480Y/277', circuitVolts: 277, panel: 'LP-1', circuit: '1' },
      crew: [{ id: 'c1', userId: v7(), name: 'Lead', lead: true }],
    };
    const assessment = assessAt({ content, at, timeZone: 'UTC' });
    const { verdict, stopCount, openCount, cautionCount, findingCodes, standing } =
      verdictColumns(assessment);
    const codes = `{${findingCodes.join(',')}}`;
    const counts = [stopCount, openCount, cautionCount];
    return [kind, assessment.edition, verdict, ...counts, codes, JSON.stringify(standing)].join(
      '\t',
    );
  });
  return `COPY kinds FROM STDIN;\n${lines.join('\n')}\n\\.\n`;
}

interface Archive {
  leads: Lead[];
  year: number;
  count: number;
  last: ReadonlyMap<number, number>;
}

/** One line of the COPY. None of the texts holds a tab, a line break or a backslash. */
function line(index: number, { leads, year, count, last }: Archive): string {
  const perYear = Math.ceil(count / YEARS);
  const ofYear = index % perYear;
  const itsYear = year - YEARS_BACK + Math.floor(index / perYear);
  const span = Date.UTC(itsYear + 1, 0, 1) - Date.UTC(itsYear, 0, 1) - 24 * HOUR;
  const created = new Date(Date.UTC(itsYear, 0, 1) + Math.floor((ofYear / perYear) * span));
  const later = (hours: number) => new Date(created.getTime() + hours * HOUR).toISOString();
  const number = `${itsYear}-${String((last.get(itsYear) ?? 0) + ofYear + 1).padStart(6, '0')}`;
  const lead = leads[index % leads.length] ?? { id: '', name: '', siteId: '', siteName: '' };
  const kind = index % KINDS.length;
  const { task, words, equipment } = KINDS[kind] ?? KINDS[0];
  const { system, volts, panel } = SUPPLIES[index % SUPPLIES.length] ?? SUPPLIES[0];
  const place = 1 + (index % 97);
  return [
    ...[v7({ msecs: created.getTime() }), number, lead.id, clean(lead.name), lead.siteId],
    ...[clean(lead.siteName), created.toISOString(), later(1), later(8), kind],
    ...[`${AREAS[index % AREAS.length] ?? ''} ${place}`, `${equipment} ${place}-1 to ${place}-4`],
    ...[task, `${words} at ${place}.`, `AR-${index + 1}`],
    ...[system, volts, `${panel}-${1 + (index % 9)}`, String(1 + (index % 42))],
  ].join('\t');
}

const clean = (text: string) => text.replace(/[\t\n\r\\]/g, ' ');

async function write(to: Writable, text: string): Promise<void> {
  if (!to.write(text)) await once(to, 'drain');
}

/** psql of the owner, with every statement and every row on its standard input. */
function openPsql(ownerUrl: string) {
  const { hostname, port, username, password, pathname } = new URL(ownerUrl);
  const child = spawn(
    path.join(postgresFolder(), 'psql'),
    ['--no-psqlrc', '--quiet', '--set=ON_ERROR_STOP=1'],
    {
      stdio: ['pipe', 'ignore', 'inherit'],
      env: {
        ...process.env,
        PGHOST: decodeURIComponent(hostname),
        PGPORT: port || '5432',
        PGUSER: decodeURIComponent(username),
        PGPASSWORD: decodeURIComponent(password),
        PGDATABASE: pathname.slice(1),
        PGOPTIONS: '-c synchronous_commit=off',
      },
    },
  );
  // psql that stops at a fault closes its input; its exit code tells of it.
  child.stdin.on('error', () => undefined);
  const ended = once(child, 'close').then(([code]) => {
    if (code !== 0) throw new StartFault(`psql ended with ${String(code)}.`);
  });
  return { input: child.stdin, ended };
}

async function fill(input: Writable, archive: Archive): Promise<void> {
  await write(input, `${PREPARE}\n${await judgements()}`);
  for (let from = 0; from < archive.count; from += BATCH) {
    const size = Math.min(BATCH, archive.count - from);
    const rows = Array.from({ length: size }, (_, index) => line(from + index, archive));
    await write(input, `COPY staged FROM STDIN;\n${rows.join('\n')}\n\\.\n${TAKE}\n`);
    console.log(`${from + size} of ${archive.count} sent`);
  }
  input.end(FINISH);
}

async function seedLarge(): Promise<void> {
  const count = countArgument();
  const ownerUrl = process.env['DATABASE_OWNER_URL'];
  if (!ownerUrl) throw new StartFault('Set DATABASE_OWNER_URL.');
  const { closeDatabase } = await import('../db');
  const register = await readRegister().finally(closeDatabase);
  const began = performance.now();
  const { input, ended } = openPsql(ownerUrl);
  await Promise.race([Promise.all([fill(input, { ...register, count }), ended]), ended]);
  const seconds = Math.round((performance.now() - began) / 1000);
  console.log(`${count} worksheets are in the archive after ${seconds} s.`);
}

command(() => withDatabase(seedLarge));
