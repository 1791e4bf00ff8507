import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { json } from 'node:stream/consumers';
import type { Attachment } from '@/shared/record';
import type { WorksheetContent } from '@/shared/worksheet';
import { finishedWork } from './drawFinishedWork';
import { boxCover, equipmentLabel, panelSchedule } from './drawings';
import type { DemoPhoto } from './scenarios';

const SCRIPT = path.join(import.meta.dirname, 'drawPhotos.mjs');

interface Subject {
  content: WorksheetContent;
  siteName: string;
}

type Section = Attachment['section'];

/** Where each photo belongs, and what is written under it. */
const PHOTOS: Record<
  DemoPhoto,
  { section: Section; caption: (subject: Subject) => string; draw: (subject: Subject) => string }
> = {
  label: {
    section: 'arcFlash',
    caption: ({ content }) => `Equipment label of ${content.supply?.panel ?? 'the panel'}`,
    draw: ({ content, siteName }) =>
      equipmentLabel(content.supply?.panel ?? '', content.supply?.system ?? '', siteName),
  },
  schedule: {
    section: 'supply',
    caption: ({ content }) => `Schedule inside the door of ${content.supply?.panel ?? 'the panel'}`,
    draw: ({ content }) =>
      panelSchedule(content.supply?.panel ?? '', content.supply?.circuit ?? ''),
  },
  cover: {
    section: 'supply',
    caption: () => 'Box cover at the place of work',
    draw: ({ content }) =>
      boxCover(`${content.supply?.panel ?? ''}-${content.supply?.circuit ?? ''}`),
  },
  finished: {
    section: 'closeOut',
    caption: () => 'Finished, covers on',
    draw: ({ content }) => finishedWork(content.job?.equipment ?? ''),
  },
};

export interface DrawnPhoto {
  section: Section;
  caption: string;
  svg: string;
}

/** A photo of the demo, still as SVG text. */
export function demoPhoto(kind: DemoPhoto, subject: Subject): DrawnPhoto {
  const { section, caption, draw } = PHOTOS[kind];
  return { section, caption: caption(subject), svg: draw(subject) };
}

/** The lettering comes from the packages, so that it is there on a machine without fonts. */
function fontConfiguration(folder: string): string {
  const require = createRequire(import.meta.url);
  const fonts = path.dirname(require.resolve('@expo-google-fonts/barlow/package.json'));
  const file = path.join(folder, 'fonts.conf');
  const places = ['400Regular', '700Bold'].map(
    (weight) => `<dir>${path.join(fonts, weight)}</dir>`,
  );
  writeFileSync(
    file,
    `<?xml version="1.0"?><fontconfig>${places.join('')}<cachedir>${folder}</cachedir></fontconfig>`,
  );
  return file;
}

/** JPEGs of SVG texts, drawn in a process of its own. */
export async function drawPhotos(svgs: readonly string[]): Promise<Map<string, Buffer>> {
  const unique = [...new Set(svgs)];
  if (unique.length === 0) return new Map();
  const folder = mkdtempSync(path.join(tmpdir(), 'wideberth-photos-'));
  try {
    const env = { ...process.env, FONTCONFIG_FILE: fontConfiguration(folder) };
    const child = spawn(process.execPath, [SCRIPT], { env, stdio: ['pipe', 'pipe', 'inherit'] });
    child.stdin.end(JSON.stringify(unique));
    const drawn = (await json(child.stdout)) as string[];
    return new Map(unique.map((svg, index) => [svg, Buffer.from(drawn[index] ?? '', 'base64')]));
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
