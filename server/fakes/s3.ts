import { createHash, randomUUID } from 'node:crypto';
import { createServer } from 'node:http';
import type { IncomingMessage, ServerResponse } from 'node:http';
import { mkdir, readdir, readFile, rename, rm, writeFile } from 'node:fs/promises';
import type { AddressInfo } from 'node:net';
import path from 'node:path';

export interface S3Fake {
  url: string;
  stop(): Promise<void>;
}

/** Letters, digits and single dots only, so that no key leaves the folder. */
const SAFE_PATH = /^\/[A-Za-z0-9_-]+(\/[A-Za-z0-9_-]+(\.[A-Za-z0-9]+)*)*$/;

/** The few calls of S3 that the server makes, with the objects as files of one folder. */
export async function startS3Fake(folder: string): Promise<S3Fake> {
  await mkdir(folder, { recursive: true, mode: 0o700 });
  const server = createServer((req, res) => {
    answer(folder, req, res).catch(() => res.writeHead(500).end());
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', () => resolve()));
  const { port } = server.address() as AddressInfo;
  return {
    url: `http://127.0.0.1:${port}`,
    stop: () =>
      new Promise((resolve) => {
        server.close(() => resolve());
        server.closeAllConnections();
      }),
  };
}

async function answer(folder: string, req: IncomingMessage, res: ServerResponse): Promise<void> {
  const url = new URL(req.url ?? '/', 'http://fake');
  const pathname = url.pathname.replace(/\/$/, '');
  if (!SAFE_PATH.test(pathname)) return end(res, 400);
  if (url.searchParams.get('list-type') === '2') return list(path.join(folder, pathname), res);
  const file = path.join(folder, pathname);
  if (req.method === 'PUT') {
    const body = await readBody(req);
    // A bucket needs no making here; an object is written beside and moved, so that none is ever half there.
    if (pathname.indexOf('/', 1) > 0) await replace(file, body);
    res.setHeader('ETag', `"${createHash('md5').update(body).digest('hex')}"`);
    return end(res, 200);
  }
  if (req.method === 'DELETE') {
    await rm(file, { force: true });
    return end(res, 204);
  }
  const body = await readFile(file).catch(() => null);
  if (body === null) return end(res, 404, '<Error><Code>NoSuchKey</Code></Error>');
  res.writeHead(200, { 'Content-Length': body.length });
  res.end(req.method === 'HEAD' ? undefined : body);
}

function end(res: ServerResponse, status: number, xml = ''): void {
  res.writeHead(status, { 'Content-Type': 'application/xml' }).end(xml);
}

async function readBody(req: IncomingMessage): Promise<Buffer> {
  const chunks: Buffer[] = [];
  for await (const chunk of req) chunks.push(chunk as Buffer);
  return Buffer.concat(chunks);
}

async function replace(file: string, body: Buffer): Promise<void> {
  await mkdir(path.dirname(file), { recursive: true, mode: 0o700 });
  const beside = `${file}~${randomUUID()}`;
  await writeFile(beside, body, { mode: 0o600 });
  await rename(beside, file);
}

async function list(bucket: string, res: ServerResponse): Promise<void> {
  const entries = await readdir(bucket, { recursive: true, withFileTypes: true }).catch(() => []);
  const contents = entries
    .filter((entry) => entry.isFile() && !entry.name.includes('~'))
    .map((entry) => path.relative(bucket, path.join(entry.parentPath, entry.name)))
    .map((key) => `<Contents><Key>${key}</Key></Contents>`)
    .join('');
  end(res, 200, `<ListBucketResult><IsTruncated>false</IsTruncated>${contents}</ListBucketResult>`);
}
