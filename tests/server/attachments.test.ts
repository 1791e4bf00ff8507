import sharp from 'sharp';
import { v7 } from 'uuid';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { WorksheetRecord } from '@/shared/record';
import { clock } from '@/server/clock';
import { sha256 } from '@/server/services/contentHash';
import { verifyRecord } from '@/server/services/verifyRecord';
import { NOW, buildCompany, close, create, read, sign, toInForce } from '../support/record';
import type { Company, Person } from '../support/record';

let company: Company;
let photo: Buffer;

beforeAll(async () => {
  company = await buildCompany();
  photo = await sharp({
    create: { width: 64, height: 48, channels: 3, background: { r: 200, g: 90, b: 20 } },
  })
    .jpeg()
    .withExif({ IFD0: { Make: 'Secret maker' }, IFD3: { GPSLatitudeRef: 'N' } })
    .toBuffer();
});
beforeEach(() => clock.set(NOW));

function add(
  record: WorksheetRecord,
  {
    who = company.lead,
    file = photo,
    fields = {},
  }: { who?: Person; file?: Buffer; fields?: Record<string, string> } = {},
) {
  const request = who.agent.post(`/api/worksheets/${record.id}/attachments`);
  const all = { section: 'sources', caption: 'The open breaker', ...fields };
  for (const [name, value] of Object.entries(all)) void request.field(name, value);
  return request.attach('file', file, 'photo.jpg');
}

describe('a photo', () => {
  it('is kept without what the phone wrote into it, and changes the content hash', async () => {
    const record = await create(company);
    const added = await add(record);
    expect(added.status).toBe(201);
    expect(added.body).toMatchObject({ section: 'sources', caption: 'The open breaker' });
    const sent = await company.helper.agent.get(`/api/attachments/${added.body.id}`);
    expect(sent.status).toBe(200);
    const bytes = sent.body as Buffer;
    expect(sha256(bytes)).toBe(added.body.sha256);
    expect(bytes.includes('Secret maker')).toBe(false);
    expect((await sharp(bytes).metadata()).exif).toBeUndefined();
    expect(sent.headers).toMatchObject({
      'content-type': 'image/jpeg',
      'content-disposition': `inline; filename="${added.body.id}.jpg"`,
      'x-content-type-options': 'nosniff',
      'content-security-policy': 'sandbox',
      'cache-control': 'no-store',
    });
    const thumbnail = await company.helper.agent.get(`/api/attachments/${added.body.id}/thumbnail`);
    expect(thumbnail.headers['cache-control']).toMatch(/^private/);
    const after = await read(company.lead, record.id);
    expect(after.attachments).toHaveLength(1);
    expect(after.contentHash).not.toBe(record.contentHash);
    expect(after.version).toBe(record.version);
    for (const who of [company.stranger, company.otherSupervisor, company.helper2]) {
      expect((await who.agent.get(`/api/attachments/${added.body.id}`)).status).toBe(404);
    }
  });

  it.each(['png', 'webp'] as const)('may be %s', async (format) => {
    const record = await create(company);
    const file = await sharp(photo).toFormat(format).toBuffer();
    expect((await add(record, { file })).status).toBe(201);
  });

  it('is one photo however often it is sent', async () => {
    const record = await create(company);
    const fields = { id: v7() };
    expect((await add(record, { fields })).status).toBe(201);
    expect((await add(record, { fields })).status).toBe(200);
    const file = await sharp(photo).negate().jpeg().toBuffer();
    expect((await add(record, { fields, file })).body.type).toBe('/problems/id-taken');
    expect((await read(company.lead, record.id)).attachments).toHaveLength(1);
  });

  it('is for the lead to add', async () => {
    const record = await create(company);
    expect((await add(record, { who: company.helper })).status).toBe(403);
    expect((await add(record, { who: company.stranger })).status).toBe(404);
  });

  it('can be taken back until somebody signs', async () => {
    const record = await create(company);
    const { id } = (await add(record)).body as { id: string };
    const remove = (who: Person) => who.agent.delete(`/api/attachments/${id}`);
    expect((await remove(company.helper)).status).toBe(403);
    expect((await remove(company.lead)).status).toBe(204);
    expect((await company.lead.agent.get(`/api/attachments/${id}`)).status).toBe(404);
    expect((await read(company.lead, record.id)).contentHash).toBe(record.contentHash);
    expect((await verifyRecord()).faults).toEqual([]);
  });

  it('is frozen from the first signature on; those of the close-out when it is closed', async () => {
    const record = await create(company);
    const { id } = (await add(record)).body as { id: string };
    await sign(await read(company.lead, record.id), 'prepared', company.lead);
    expect((await add(record)).status).toBe(409);
    expect((await company.lead.agent.delete(`/api/attachments/${id}`)).status).toBe(409);

    const inForce = await toInForce(company);
    expect((await add(inForce)).status).toBe(409);
    const closing = await add(inForce, { fields: { section: 'closeOut' } });
    expect(closing.status).toBe(201);
    expect((await read(company.lead, inForce.id)).contentHash).toBe(inForce.contentHash);
    expect((await close(company, inForce)).status).toBe(200);
    expect((await add(inForce, { fields: { section: 'closeOut' } })).status).toBe(409);
    expect((await company.lead.agent.delete(`/api/attachments/${closing.body.id}`)).status).toBe(
      409,
    );
    expect((await verifyRecord()).faults).toEqual([]);
  });

  it('is one of at most 20', async () => {
    const record = await create(company);
    for (let count = 0; count < 20; count += 1) expect((await add(record)).status).toBe(201);
    expect((await add(record)).status).toBe(409);
  });
});

describe('what is no photo', () => {
  it('is refused, whatever it calls itself', async () => {
    const record = await create(company);
    const svg = Buffer.from('<svg xmlns="http://www.w3.org/2000/svg" width="9" height="9"/>');
    const gif = Buffer.from('R0lGODlhAQABAAAAACw=', 'base64');
    const cut = photo.subarray(0, photo.length / 2);
    for (const file of [svg, gif, cut, Buffer.from('hello'), Buffer.alloc(0)]) {
      const answer = await add(record, { file });
      expect(answer.status).toBe(422);
      expect(answer.body.errors[0].pointer).toBe('#/file');
    }
    expect((await read(company.lead, record.id)).attachments).toEqual([]);
  });

  it('is refused when it holds too many pixels or bytes', async () => {
    const record = await create(company);
    const bomb = await sharp({
      create: { width: 10_000, height: 5_001, channels: 3, background: 'white' },
    })
      .png({ compressionLevel: 9 })
      .toBuffer();
    expect((await add(record, { file: bomb })).status).toBe(422);
    const large = Buffer.concat([photo, Buffer.alloc(15 * 1024 * 1024)]);
    expect((await add(record, { file: large })).status).toBe(413);
  });

  it('is refused when the form is not right', async () => {
    const record = await create(company);
    const path = `/api/worksheets/${record.id}/attachments`;
    const nothing = await company.lead.agent.post(path).field('section', 'sources');
    expect(nothing.status).toBe(422);
    const wrong = await add(record, { fields: { section: 'everywhere', other: 'x' } });
    expect(wrong.status).toBe(422);
    expect(wrong.body.errors.map(({ pointer }: { pointer: string }) => pointer).sort()).toEqual([
      '#/other',
      '#/section',
    ]);
    const broken = await company.lead.agent
      .post(path)
      .set('Content-Type', 'multipart/form-data; boundary=x')
      .send('--x\r\nContent-Disposition: form-data; name="file"; filename="a"\r\n\r\nabc');
    expect(broken.status).toBe(400);
  });
});
