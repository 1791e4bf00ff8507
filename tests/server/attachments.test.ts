import { once } from 'node:events';
import { request } from 'node:http';
import type { AddressInfo } from 'node:net';
import { setTimeout as wait } from 'node:timers/promises';
import sharp from 'sharp';
import supertest from 'supertest';
import { v7 } from 'uuid';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { WorksheetRecord } from '@/shared/record';
import { AttachmentRow } from '@/server/models/AttachmentRow';
import { Event } from '@/server/models/Event';
import { clock } from '@/server/clock';
import { sha256 } from '@/server/services/contentHash';
import { verifyRecord } from '@/server/services/verifyRecord';
import { NOW, buildCompany, close, create, read, sign, toInForce } from '../support/record';
import type { Company, Person } from '../support/record';
import { PASSWORD, storedFiles } from '../support/server';

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

/** The same worksheet, signed by everybody. */
async function toInForceOf(record: WorksheetRecord): Promise<WorksheetRecord> {
  const prepared = await sign(await read(company.lead, record.id), 'prepared', company.lead);
  const acknowledged = await sign(prepared, 'acknowledged', company.helper);
  return sign(acknowledged, 'countersigned', company.supervisor);
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
    const kept = storedFiles().filter((name) => name === id);
    expect(kept).toHaveLength(2);
    expect((await remove(company.lead)).status).toBe(204);
    expect(storedFiles()).not.toContain(id);
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
    const kept = storedFiles();
    expect((await add(record)).status).toBe(409);
    expect(storedFiles()).toEqual(kept);
  });
});

describe('the caption of a photo', () => {
  const recaption = (who: Person, id: string, body: object = { caption: 'LP-2, door open' }) =>
    who.agent.patch(`/api/attachments/${id}`).send(body);

  it('can be put right by the lead until somebody signs, and the trail tells of it', async () => {
    const record = await create(company);
    const added = (await add(record)).body as { id: string; sha256: string };
    const before = await read(company.lead, record.id);
    const changed = await recaption(company.lead, added.id);
    expect(changed.status).toBe(200);
    expect(changed.body).toEqual({ ...added, caption: 'LP-2, door open' });
    const after = await read(company.lead, record.id);
    expect(after.attachments).toEqual([changed.body]);
    expect(after.contentHash).toBe(before.contentHash);
    await recaption(company.lead, added.id).expect(200);
    const events = await Event.findAll({
      where: { subjectId: record.id, type: 'photo-captioned' },
    });
    expect(events).toHaveLength(1);
    expect(events[0]?.payload).toMatchObject({ attachmentId: added.id });
    expect(JSON.stringify(events[0]?.payload)).not.toContain('door');
    expect((await verifyRecord()).faults).toEqual([]);

    await sign(after, 'prepared', company.lead);
    expect((await recaption(company.lead, added.id, { caption: 'Later' })).status).toBe(409);
  });

  it('is for the lead, who must be signed in', async () => {
    const { id } = (await add(await create(company))).body as { id: string };
    expect((await supertest(company.app).patch(`/api/attachments/${id}`).send({})).status).toBe(
      401,
    );
    expect((await recaption(company.helper, id)).status).toBe(403);
    expect((await recaption(company.stranger, id)).status).toBe(404);
    expect((await recaption(company.lead, v7())).status).toBe(404);
    for (const body of [{}, { caption: 'x'.repeat(201) }, { caption: '', section: 'job' }]) {
      expect((await recaption(company.lead, id, body)).status).toBe(422);
    }
  });

  it('of a close-out may change until it is closed; what was signed stays', async () => {
    const record = await create(company);
    const planned = (await add(record)).body as { id: string };
    const inForce = await toInForceOf(record);
    const closing = (await add(inForce, { fields: { section: 'closeOut' } })).body as {
      id: string;
    };
    expect((await recaption(company.lead, planned.id)).status).toBe(409);
    expect((await recaption(company.lead, closing.id)).status).toBe(200);
    expect((await close(company, inForce)).status).toBe(200);
    expect((await recaption(company.lead, closing.id, { caption: 'Later' })).status).toBe(409);
    expect((await verifyRecord()).faults).toEqual([]);
  });

  it('is all that the database lets change', async () => {
    const { id } = (await add(await create(company))).body as { id: string };
    await expect(AttachmentRow.update({ section: 'job' }, { where: { id } })).rejects.toThrow(
      /permission denied/,
    );
  });
});

describe('what is no photo', () => {
  it('is refused, whatever it calls itself, and leaves nothing behind', async () => {
    const record = await create(company);
    const kept = storedFiles();
    const png = await sharp(photo).png().toBuffer();
    const webp = await sharp(photo).webp().toBuffer();
    const svg = Buffer.from('<svg xmlns="http://www.w3.org/2000/svg" width="9" height="9"/>');
    const files = {
      svg,
      'svg behind a byte order mark': Buffer.concat([Buffer.from([0xef, 0xbb, 0xbf]), svg]),
      gif: Buffer.from('R0lGODlhAQABAIAAAAAAAP///yH5BAEAAAAALAAAAAABAAEAAAIBRAA7', 'base64'),
      'gif that is a script': Buffer.from('GIF89a/*....*/=alert(1)//'),
      pdf: Buffer.from('%PDF-1.7\n1 0 obj<</Type/Catalog>>endobj\ntrailer<</Root 1 0 R>>'),
      tiff: await sharp(photo).tiff().toBuffer(),
      'html with the first bytes of a jpeg': Buffer.concat([
        photo.subarray(0, 24),
        Buffer.from('<html><script>alert(1)</script></html>'),
      ]),
      'jpeg cut in half': photo.subarray(0, photo.length / 2),
      'jpeg without its last bytes': photo.subarray(0, photo.length - 40),
      'png cut in half': png.subarray(0, png.length / 2),
      'webp cut in half': webp.subarray(0, webp.length / 2),
      words: Buffer.from('hello'),
      nothing: Buffer.alloc(0),
    };
    for (const [name, file] of Object.entries(files)) {
      const answer = await add(record, { file });
      expect(answer.status, name).toBe(422);
      expect(answer.body.errors[0], name).toMatchObject({ pointer: '#/file', code: 'no-photo' });
    }
    expect((await read(company.lead, record.id)).attachments).toEqual([]);
    expect(storedFiles()).toEqual(kept);
  });

  it('rides on a photo no further than the server: the picture is written anew', async () => {
    const record = await create(company);
    const script = '<html><script>alert(document.domain)</script></html>';
    const archive = Buffer.concat([Buffer.from('PK\u0003\u0004'), Buffer.from(script)]);
    const answer = await add(record, { file: Buffer.concat([photo, archive]) });
    expect(answer.status).toBe(201);
    for (const path of [answer.body.id, `${answer.body.id}/thumbnail`]) {
      const sent = await company.lead.agent.get(`/api/attachments/${path}`);
      expect((sent.body as Buffer).includes('script')).toBe(false);
      expect((sent.body as Buffer).includes('PK\u0003\u0004')).toBe(false);
      expect(sent.headers).toMatchObject({
        'content-type': 'image/jpeg',
        'content-security-policy': 'sandbox',
      });
    }
  });

  it('is refused when it holds too many pixels or bytes, before it is unpacked', async () => {
    const record = await create(company);
    const kept = storedFiles();
    const bomb = await sharp({
      create: { width: 10_000, height: 5_001, channels: 3, background: 'white' },
    })
      .png({ compressionLevel: 9 })
      .toBuffer();
    // The heading alone claims 65500 times 65500 pixels: nothing of that size is ever held.
    const claim = Buffer.from(bomb);
    claim.writeUInt32BE(65_500, 16);
    claim.writeUInt32BE(65_500, 20);
    for (const file of [bomb, claim]) {
      const answer = await add(record, { file });
      expect(answer.status).toBe(422);
      expect(answer.body.errors[0].pointer).toBe('#/file');
    }
    expect((await add(record, { file: bomb })).body.errors[0].code).toBe('too-many-pixels');
    const large = Buffer.concat([photo, Buffer.alloc(15 * 1024 * 1024)]);
    expect((await add(record, { file: large })).status).toBe(413);
    expect((await read(company.lead, record.id)).attachments).toEqual([]);
    expect(storedFiles()).toEqual(kept);
  });

  it('leaves nothing behind when the connection is cut on the way', async () => {
    const record = await create(company);
    const kept = storedFiles();
    const server = company.app.listen(0, '127.0.0.1');
    try {
      await once(server, 'listening');
      const { port } = server.address() as AddressInfo;
      const base = `http://127.0.0.1:${port}`;
      const { email } = company.lead.user;
      const session = await fetch(`${base}/api/session`, {
        method: 'POST',
        headers: { 'Content-Type': 'application/json' },
        body: JSON.stringify({ email, password: PASSWORD }),
      });
      const cookie = session.headers.get('set-cookie')?.split(';')[0] ?? '';
      const upload = request(`${base}/api/worksheets/${record.id}/attachments`, {
        method: 'POST',
        headers: {
          'Content-Type': 'multipart/form-data; boundary=x',
          'Content-Length': photo.length + 10_000,
          Cookie: cookie,
        },
      });
      const cut = once(upload, 'error');
      upload.write('--x\r\nContent-Disposition: form-data; name="section"\r\n\r\nsources\r\n');
      upload.write('--x\r\nContent-Disposition: form-data; name="file"; filename="a.jpg"\r\n\r\n');
      upload.write(photo);
      await wait(200);
      upload.destroy(new Error('cut'));
      await cut;
      await wait(500);
      expect((await fetch(`${base}/api/health`)).status).toBe(200);
    } finally {
      await new Promise((resolve) => server.close(resolve));
    }
    expect(await AttachmentRow.count({ where: { worksheetId: record.id } })).toBe(0);
    expect(storedFiles()).toEqual(kept);
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
