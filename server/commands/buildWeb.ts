import { spawn } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { copyFile, readFile, rename, rm, writeFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import path from 'node:path';
import { promisify } from 'node:util';
import { brotliCompress, constants, gzip } from 'node:zlib';
import { DATA, ROOT } from '../paths';
import { buildServiceWorker } from './serviceWorker';

const FOLDERS = ['app', 'components', 'shared', 'hazard', 'assets', 'public'];
const FILES = [
  'package-lock.json',
  'app.json',
  'babel.config.cjs',
  'metro.config.cjs',
  'tsconfig.json',
  'server/commands/buildWeb.ts',
  'server/commands/serviceWorker.ts',
];
const DIST = path.join(ROOT, 'dist');
/** Outside `dist`: nothing there but what the browser may read. */
const MARK = path.join(DATA, 'web-sources');
const PDF_WORKER = 'pdf.worker.min.mjs';

/** Builds the web app where its sources are not those of the last build. */
export async function buildWeb({ force = false } = {}): Promise<boolean> {
  const sources = hashOfSources();
  const isCurrent =
    existsSync(path.join(DIST, 'index.html')) &&
    existsSync(MARK) &&
    readFileSync(MARK, 'utf8') === sources;
  if (isCurrent && !force) return false;
  await copyPdfWorker();
  const beside = path.join(DATA, 'web-new');
  await rm(beside, { recursive: true, force: true });
  await exportWeb(beside);
  await buildServiceWorker(beside);
  await compressFiles(beside);
  await rm(DIST, { recursive: true, force: true });
  await rename(beside, DIST);
  await writeFile(MARK, sources);
  return true;
}

function hashOfSources(): string {
  const hash = createHash('sha256');
  const files = FOLDERS.flatMap((folder) =>
    readdirSync(path.join(ROOT, folder), { recursive: true, encoding: 'utf8' })
      .map((name) => path.join(folder, name))
      .filter((name) => !name.includes(PDF_WORKER) && statSync(path.join(ROOT, name)).isFile()),
  );
  for (const file of [...files.sort(), ...FILES]) {
    hash
      .update(`${file}\0`)
      .update(readFileSync(path.join(ROOT, file)))
      .update('\0');
  }
  return hash.digest('hex');
}

/** The reader of PDF attachments runs in a worker of its own, beside the bundle. */
async function copyPdfWorker(): Promise<void> {
  const { resolve } = createRequire(path.join(ROOT, 'package.json'));
  await copyFile(
    resolve(`pdfjs-dist/legacy/build/${PDF_WORKER}`),
    path.join(ROOT, 'public', PDF_WORKER),
  );
}

/** Runs Expo's exporter; its output is shown only where it fails. */
function exportWeb(output: string): Promise<void> {
  const { resolve } = createRequire(path.join(ROOT, 'package.json'));
  return new Promise((done, reject) => {
    const child = spawn(
      process.execPath,
      [resolve('expo/bin/cli'), 'export', '--platform', 'web', '--output-dir', output],
      {
        cwd: ROOT,
        env: {
          ...process.env,
          NODE_ENV: 'production',
          EXPO_OFFLINE: '1',
          EXPO_NO_TELEMETRY: '1',
          CI: '1',
        },
        stdio: ['ignore', 'pipe', 'pipe'],
      },
    );
    const lines: Buffer[] = [];
    child.stdout.on('data', (chunk: Buffer) => lines.push(chunk));
    child.stderr.on('data', (chunk: Buffer) => lines.push(chunk));
    child.once('error', reject);
    child.once('exit', (code) => {
      if (code === 0) return done();
      reject(new Error(`The web app did not build.\n${Buffer.concat(lines).toString('utf8')}`));
    });
  });
}

/** Compressed once here, so that no answer waits for it. */
async function compressFiles(folder: string): Promise<void> {
  const files = readdirSync(folder, { recursive: true, encoding: 'utf8' }).filter((name) =>
    /\.(html|m?js|css|svg|json|webmanifest|txt)$/.test(name),
  );
  for (const name of files) {
    const file = path.join(folder, name);
    const content = await readFile(file);
    if (content.length < 1024) continue;
    const params = {
      [constants.BROTLI_PARAM_QUALITY]: 10,
      [constants.BROTLI_PARAM_SIZE_HINT]: content.length,
    };
    await writeFile(`${file}.br`, await promisify(brotliCompress)(content, { params }));
    await writeFile(`${file}.gz`, await promisify(gzip)(content, { level: 9 }));
  }
}
