import { afterEach, beforeAll, describe, expect, it } from 'vitest';
import { buildApp } from '@/server/app';
import { clock } from '@/server/clock';
import { Event } from '@/server/models/Event';
import { RubberGoods } from '@/server/models/RubberGoods';
import type { Site } from '@/server/models/Site';
import { User } from '@/server/models/User';
import { importAnswerSchema } from '@/shared/registerCsv';
import { buildSite, buildUser, signIn } from '../support/server';

const app = buildApp();
let north: Site;
let south: Site;
let lead: Awaited<ReturnType<typeof signIn>>;
let safety: Awaited<ReturnType<typeof signIn>>;

beforeAll(async () => {
  north = await buildSite({ name: 'North Yard' });
  south = await buildSite({ name: 'South, Yard' });
  lead = await signIn(app, await buildUser({ sites: [north] }));
  safety = await signIn(app, await buildUser({ role: 'safety', email: 'Office@company.example' }));
});
afterEach(() => clock.set(null));

const HEADING = 'name,email,role,sites,qualifiedThrough,language,units';
const lines = (...rows: string[]) => [HEADING, ...rows].join('\r\n') + '\r\n';

type Path = 'users' | 'rubber-goods';
const send = (path: Path, csv: string, confirm?: boolean) =>
  safety.post(`/api/${path}/import`).send(confirm === undefined ? { csv } : { csv, confirm });

async function preview(path: Path, csv: string) {
  const { body } = await send(path, csv).expect(200);
  return importAnswerSchema.parse(body);
}

const faults = async (path: Path, csv: string) =>
  (await preview(path, csv)).errors.map(({ line, column, code }) => [line, column, code]);

describe('an import of people', () => {
  it('is for safety', async () => {
    await lead.post('/api/users/import').send({ csv: HEADING }).expect(403);
    await lead.get('/api/users/export.csv').expect(403);
    await lead.get('/api/rubber-goods/export.csv').expect(403);
  });

  it('names the three bad lines of twelve and imports nothing until all are right', async () => {
    const person = (n: number, fields: { role?: string; email?: string; sites?: string } = {}) =>
      [
        `Person ${n}`,
        fields.email ?? `twelve${n}@company.example`,
        fields.role ?? 'helper',
        fields.sites ?? 'North Yard',
        '2027-03-01',
        'es',
        'metric',
      ].join(',');
    const rows = Array.from({ length: 12 }, (_, n) => person(n));
    rows[2] = person(2, { role: 'foreman' });
    rows[6] = person(6, { email: 'not an address' });
    rows[10] = person(10, { sites: 'North Yard; West Yard' });
    const before = await User.count();
    const answer = await preview('users', lines(...rows));
    expect(answer.errors).toEqual([
      { line: 4, column: 'role', code: 'role', value: 'foreman' },
      { line: 8, column: 'email', code: 'email', value: 'not an address' },
      { line: 12, column: 'sites', code: 'no-such-site', value: 'North Yard; West Yard' },
    ]);
    expect(answer).toMatchObject({ count: 9, created: 0 });

    const refused = await send('users', lines(...rows), true).expect(422);
    expect(refused.body.errors.map(({ pointer }: { pointer: string }) => pointer)).toEqual([
      '#/csv/4/role',
      '#/csv/8/email',
      '#/csv/12/sites',
    ]);
    expect(await User.count()).toBe(before);

    const mended = lines(...rows.map((_, n) => person(n)));
    await preview('users', mended);
    expect(await User.count()).toBe(before);
    const { body } = await send('users', mended, true).expect(201);
    expect(body.created).toBe(12);
    const made = await User.findOne({ where: { email: 'twelve7@company.example' } });
    expect(made).toMatchObject({
      name: 'Person 7',
      role: 'helper',
      locale: 'es-MX',
      units: 'metric',
      qualifiedThrough: '2027-03-01',
    });
    expect(made?.invitedAt).toBeInstanceOf(Date);
    const events = await Event.findAll({ where: { subjectId: made?.id ?? '' } });
    expect(events.map(({ type }) => type)).toEqual(['created']);

    // The same file again finds everybody in the register.
    const again = await faults('users', mended);
    expect(again).toHaveLength(12);
    expect(again[0]).toEqual([2, 'email', 'taken']);
  });

  it('reads quotes, commas, line breaks in cells, a byte order mark and either line end', async () => {
    const csv =
      '\uFEFF' +
      [
        'Name,E-mail,ROLE,Sites,Qualified through',
        '"Marsh, ""Ollie""",quotes@company.example,lead,"South, Yard; North Yard",',
        '',
        '"Two\r\nLines",lines@company.example,lead,North Yard,',
        'Bo,wrong,lead,North Yard,',
      ].join('\n');
    const answer = await preview('users', csv);
    expect(answer.rows.map(({ line, cells }) => [line, cells['name'], cells['sites']])).toEqual([
      [2, 'Marsh, "Ollie"', 'South, Yard; North Yard'],
      [4, 'Two\nLines', 'North Yard'],
    ]);
    expect(answer.errors.map(({ line }) => line)).toEqual([6]);
  });

  it('reads a file that is parted by semicolons', async () => {
    const csv = `${HEADING.replaceAll(',', ';')}\nAda;ada@company.example;lead;North Yard|South, Yard;;;\n`;
    expect((await preview('users', csv)).rows[0]?.cells['sites']).toBe('North Yard; South, Yard');
  });

  it('finds who stands in the file twice or in the register already, whatever the case', async () => {
    const csv = lines(
      'A,same@company.example,lead,North Yard,,,',
      'B,SAME@company.example,lead,North Yard,,,',
      'C,office@COMPANY.example,lead,North Yard,,,',
    );
    expect(await faults('users', csv)).toEqual([
      [3, 'email', 'twice'],
      [4, 'email', 'taken'],
    ]);
  });

  it('names what is wrong with the file itself', async () => {
    expect(await faults('users', '')).toEqual([
      [1, 'name', 'missing-column'],
      [1, 'email', 'missing-column'],
      [1, 'role', 'missing-column'],
      [1, 'sites', 'missing-column'],
    ]);
    expect(await faults('users', `${HEADING}\n`)).toEqual([[1, null, 'no-rows']]);
    expect(await faults('users', `${HEADING},qualified_til\nA,a@b.example,lead,,,,,`)).toEqual([
      [1, null, 'unknown-column'],
    ]);
    expect(await faults('users', `${HEADING},NAME\n`)).toEqual([[1, 'name', 'column-twice']]);
    expect(await faults('users', `${HEADING}\nA,"b`)).toEqual([[2, null, 'unreadable']]);
    expect(await faults('users', lines('A,extra@company.example,lead,North Yard,,,,more'))).toEqual(
      [[2, null, 'too-many-cells']],
    );
    const many = Array.from(
      { length: 1001 },
      (_, n) => `P,m${n}@company.example,lead,North Yard,,,`,
    );
    expect(await faults('users', lines(...many))).toEqual([[1002, null, 'too-many-rows']]);
  });

  it('guesses no date, role, language or site', async () => {
    const csv = lines(
      'A,guess1@company.example,lead,North Yard,10/14/2027,,',
      'B,guess2@company.example,,North Yard,2027-02-30,,',
      'C,guess3@company.example,lead,,,french,inches',
      ',guess4@company.example,safety,,,,',
    );
    expect(await faults('users', csv)).toEqual([
      [2, 'qualifiedThrough', 'date'],
      [3, 'role', 'required'],
      [3, 'qualifiedThrough', 'date'],
      [4, 'sites', 'required'],
      [4, 'language', 'language'],
      [4, 'units', 'units'],
      [5, 'name', 'required'],
    ]);
  });
});

const GOODS = 'site,kind,class,serial,size,issuedOn,testedOn,result,laboratory';
const goods = (...rows: string[]) => [GOODS, ...rows].join('\n');

describe('an import of rubber goods', () => {
  it('takes in each item with its test and an event', async () => {
    clock.set('2026-06-01T12:00:00-05:00');
    const csv = goods(
      'North Yard,gloves,class 0,IMP-1,9,2026-04-02,2026-03-31,passed,Tallgrass',
      'North Yard,Line Hose,2,IMP-2,"36""",,2026-05-01,PASSED,',
    );
    const { body } = await send('rubber-goods', csv, true).expect(201);
    expect(body.created).toBe(2);
    const list = await lead.get('/api/rubber-goods').expect(200);
    const made = list.body.items.find(({ serial }: { serial: string }) => serial === 'IMP-1');
    expect(made).toMatchObject({ gloveClass: '0', dueOn: '2026-10-02', inTest: true });
    const events = await Event.findAll({ where: { subjectId: made.id } });
    expect(events.map(({ type }) => type)).toEqual(['created']);
    const hose = await RubberGoods.findOne({ where: { serial: 'IMP-2' } });
    expect(hose).toMatchObject({ kind: 'line hose', size: '36"' });
  });

  it('never takes a bare 0 for class 0, since a spreadsheet cuts 00 to 0', async () => {
    expect(
      await faults(
        'rubber-goods',
        goods(
          'North Yard,gloves,0,Z-1,,,2026-05-01,passed,',
          'North Yard,gloves,00,Z-2,,,2026-05-01,passed,',
          'North Yard,gloves,Class 0,Z-3,,,2026-05-01,passed,',
          'North Yard,gloves,5,Z-4,,,2026-05-01,passed,',
        ),
      ),
    ).toEqual([
      [2, 'class', 'class-zero'],
      [5, 'class', 'class'],
    ]);
  });

  it('takes no test that failed, is to come, or is not named', async () => {
    clock.set('2026-06-01T12:00:00-05:00');
    expect(
      await faults(
        'rubber-goods',
        goods(
          'North Yard,gloves,class 0,T-1,,,2026-05-01,failed,',
          'North Yard,gloves,class 0,T-2,,,2026-06-02,passed,',
          'North Yard,gloves,class 0,T-3,,,,passed,',
          'North Yard,gloves,class 0,T-4,,,2026-05-01,,',
          'North Yard,boots,class 0,T-5,,,2026-05-01,passed,',
        ),
      ),
    ).toEqual([
      [2, 'result', 'result'],
      [3, 'testedOn', 'after-today'],
      [4, 'testedOn', 'required'],
      [5, 'result', 'required'],
      [6, 'kind', 'kind'],
    ]);
  });

  it('finds an item that stands twice at one site, and lets another site have the number', async () => {
    const row = (site: string, serial: string) =>
      `${site},gloves,class 0,${serial},,,2026-03-31,passed,`;
    expect(
      await faults(
        'rubber-goods',
        goods(
          row('North Yard', 'imp-1'),
          row('North Yard', 'D-1'),
          row('"South, Yard"', 'D-1'),
          row('North Yard', 'd-1'),
        ),
      ),
    ).toEqual([
      [2, 'serial', 'taken'],
      [5, 'serial', 'twice'],
    ]);
  });
});

describe('an export', () => {
  it('is RFC 4180 with a byte order mark, and no cell that runs as a formula', async () => {
    await buildUser({ name: '=HYPERLINK("x")', email: 'formula@company.example', sites: [south] });
    const { text, headers } = await safety.get('/api/users/export.csv').expect(200);
    expect(headers['content-type']).toContain('text/csv');
    expect(headers['content-disposition']).toBe('attachment; filename="people.csv"');
    expect(text.startsWith(`\uFEFF${HEADING},account,retired\r\n`)).toBe(true);
    expect(text).toContain(
      `"'=HYPERLINK(""x"")",formula@company.example,lead,"South, Yard",2030-12-31,en-US,feet,in use,no\r\n`,
    );
  });

  it('can be read again', async () => {
    const { text } = await safety.get('/api/rubber-goods/export.csv').expect(200);
    const moved = text.replaceAll('IMP-', '=IMP-').replaceAll('=IMP', "'=IMP");
    const answer = await preview('rubber-goods', moved);
    expect(answer.errors).toEqual([]);
    expect(answer.rows.map(({ cells }) => [cells['serial'], cells['class']])).toEqual([
      ['=IMP-1', 'class 0'],
      ['=IMP-2', 'class 2'],
    ]);
  });
});
