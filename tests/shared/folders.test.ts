import fs from 'node:fs';
import path from 'node:path';
import ts from 'typescript';
import { describe, expect, it } from 'vitest';

const root = path.resolve(__dirname, '../..');
const FOLDERS = ['hazard', 'shared', 'server', 'components', 'app'] as const;
type Folder = (typeof FOLDERS)[number];

/** Which folders of ours each folder may import; each may also import itself. */
const MAY_IMPORT: Record<Folder, readonly Folder[]> = {
  hazard: [],
  shared: ['hazard'],
  server: ['shared', 'hazard'],
  components: ['shared', 'hazard'],
  app: ['components', 'shared'],
};

/**
 * The only packages of the two folders that both client and server run: pure
 * ones, without a framework. All other folders are free.
 */
const MAY_USE: Partial<Record<Folder, readonly string[]>> = {
  hazard: ['date-fns'],
  shared: ['zod', 'date-fns', '@date-fns/tz'],
};

/** What would make the same question give another answer. */
const IMPURE = /\bDate\.now\b|\bnew Date\(\s*\)|\bMath\.random\b|\bfetch\(|\bprocess\./;

function sourcesOf(folder: string): string[] {
  const directory = path.join(root, folder);
  return fs
    .readdirSync(directory, { recursive: true, encoding: 'utf8' })
    .filter((name) => /\.(ts|tsx|mts)$/.test(name))
    .map((name) => path.join(directory, name));
}

/** Every module that a file names, in imports, re-exports, `import()` and `require()`. */
function importsOf(file: string): string[] {
  const text = fs.readFileSync(file, 'utf8');
  return ts.preProcessFile(text, true, true).importedFiles.map(({ fileName }) => fileName);
}

/** The top folder that an import leads to, or null for a package. */
function folderOf(file: string, specifier: string): string | null {
  if (specifier.startsWith('@/')) return specifier.slice(2).split('/')[0] ?? null;
  if (!specifier.startsWith('.')) return null;
  const target = path.relative(root, path.resolve(path.dirname(file), specifier));
  return target.split(path.sep)[0] ?? null;
}

const isFolder = (name: string): name is Folder => (FOLDERS as readonly string[]).includes(name);

describe.each(FOLDERS)('the folder %s', (folder) => {
  const files = sourcesOf(folder);
  const edges = files.flatMap((file) =>
    importsOf(file).map((specifier) => ({
      from: path.relative(root, file),
      specifier,
      to: folderOf(file, specifier),
    })),
  );
  const say = ({ from, specifier }: { from: string; specifier: string }) => `${from}: ${specifier}`;

  it('imports only the folders that it may', () => {
    const broken = edges.filter(
      ({ to }) => to !== null && isFolder(to) && to !== folder && !MAY_IMPORT[folder].includes(to),
    );
    expect(broken.map(say)).toEqual([]);
  });

  it('takes the alias from one folder to another, and a relative path inside one', () => {
    const broken = edges.filter(
      ({ to, specifier }) => to !== null && (to === folder) === specifier.startsWith('@/'),
    );
    expect(broken.filter(({ to }) => to !== 'assets').map(say)).toEqual([]);
  });

  it('imports nothing from the tests', () => {
    expect(edges.filter(({ to }) => to === 'tests').map(say)).toEqual([]);
  });

  const packages = MAY_USE[folder];
  it.runIf(packages !== undefined)('uses no package but its own few', () => {
    const broken = edges.filter(
      ({ to, specifier }) =>
        to === null &&
        !packages?.some((name) => specifier === name || specifier.startsWith(`${name}/`)),
    );
    expect(broken.map(say)).toEqual([]);
  });
});

describe('hazard', () => {
  it('has no clock, chance, network or process', () => {
    const broken = sourcesOf('hazard').filter((file) => IMPURE.test(fs.readFileSync(file, 'utf8')));
    expect(broken.map((file) => path.relative(root, file))).toEqual([]);
  });
});

describe('default exports', () => {
  it.each(FOLDERS.filter((folder) => folder !== 'app'))('are not used in %s', (folder) => {
    const broken = sourcesOf(folder).filter((file) =>
      /^export default /m.test(fs.readFileSync(file, 'utf8')),
    );
    expect(broken.map((file) => path.relative(root, file))).toEqual([]);
  });
});
