import { execFile } from 'node:child_process';
import { createHash } from 'node:crypto';
import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { promisify } from 'node:util';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Proof, WorksheetContent } from '@/hazard';
import { escapeXml } from '@/server/pdf/svg';
import { printable } from '@/server/pdf/text';
import type { PdfInput, PdfLanguage } from '@/server/pdf/input';
import { renderWorksheetPdf, stopPdfWorkers } from '@/server/pdf/renderWorksheetPdf';
import { messages } from '@/shared/messages';
import { buildPdfInput, corridorContent, corridorProof } from '../support/pdfInput';
import { soundEnergizedWorksheet } from '../support/soundWorksheet';

const run = promisify(execFile);
let folder = '';

beforeAll(async () => {
  folder = await mkdtemp(path.join(tmpdir(), 'wideberth-pdf-'));
});
afterAll(async () => {
  await stopPdfWorkers();
  await rm(folder, { recursive: true, force: true });
});

let count = 0;

interface Printed {
  bytes: Buffer;
  file: string;
  /** All words, every run of white space one space, so that a line's end does not matter. */
  text: string;
  firstPage: string;
  info: Record<string, string>;
}

async function printed(input: PdfInput, language: PdfLanguage = 'en'): Promise<Printed> {
  const bytes = await renderWorksheetPdf(input, language);
  const file = path.join(folder, `${(count += 1)}.pdf`);
  await writeFile(file, bytes);
  const options = { maxBuffer: 64 * 1024 * 1024 };
  const [all, first, info] = await Promise.all([
    run('pdftotext', [file, '-'], options),
    run('pdftotext', ['-l', '1', file, '-'], options),
    run('pdfinfo', [file]),
  ]);
  const entries = info.stdout
    .split('\n')
    .map((line) => line.split(/:\s+/, 2))
    .filter((pair): pair is [string, string] => pair.length === 2);
  const flat = (words: string) => words.replace(/\s+/g, ' ');
  return {
    bytes,
    file,
    text: flat(all.stdout),
    firstPage: flat(first.stdout),
    info: Object.fromEntries(entries),
  };
}

async function qpdfCheck(file: string): Promise<string> {
  // Exit code 0: no error and no warning.
  const { stdout, stderr } = await run('qpdf', ['--check', file]);
  return stdout + stderr;
}

async function attachmentOf(file: string): Promise<string> {
  const { stdout } = await run('qpdf', ['--show-attachment=worksheet.json', file], {
    encoding: 'utf8',
  });
  return stdout;
}

describe('a worksheet in force and proved dead', () => {
  const input = buildPdfInput();
  let pdf: Printed;
  beforeAll(async () => {
    pdf = await printed(input);
  });

  it('is a sound, tagged PDF/A-3a in English that shows its title', async () => {
    expect(await qpdfCheck(pdf.file)).toContain('No syntax or stream encoding errors');
    expect(pdf.info['Tagged']).toBe('yes');
    expect(pdf.info['Title']).toBe('WB-2026-000731, revision 2');
    expect(pdf.info['Page size']).toContain('letter');
    const raw = pdf.bytes.toString('latin1');
    expect(raw).toContain('/Lang (en-US)');
    expect(raw).toContain('/DisplayDocTitle true');
    expect(raw).toContain('/OutputIntent');
    expect(raw).toContain('<pdfaid:conformance>A</pdfaid:conformance>');
    expect(raw).toContain('<pdfaid:part>3</pdfaid:part>');
  });

  it('has a structure of headings, text and pictures with words for them', async () => {
    const { stdout, stderr } = await run('pdfinfo', ['-struct-text', pdf.file]);
    expect(stderr).toBe('');
    expect(stdout).toMatch(/^Document\n {2}H1/);
    expect(stdout).toContain('"Approach boundaries"');
    expect(stdout).toContain('Figure');
    const { stdout: json } = await run('qpdf', ['--json=2', '--json-key=qpdf', pdf.file], {
      maxBuffer: 256 * 1024 * 1024,
    });
    expect(json).toContain('Limited approach boundary, fixed: 3');
  });

  it('embeds every typeface', async () => {
    const { stdout } = await run('pdffonts', [pdf.file]);
    const faces = stdout.split('\n').slice(2).filter(Boolean);
    expect(faces.length).toBeGreaterThanOrEqual(4);
    for (const face of faces) {
      expect(face).toContain('Barlow');
      expect(face).toMatch(/yes\s+yes\s+yes/);
    }
  });

  it('carries the canonical content whose hash is printed on it', async () => {
    const json = await attachmentOf(pdf.file);
    expect(json).toBe(input.canonicalJson);
    const hash = createHash('sha256').update(json).digest('hex');
    expect(hash).toBe(input.worksheet.contentHash);
    expect(pdf.text).toContain(`SHA-256 ${hash}`);
    const raw = pdf.bytes.toString('latin1');
    expect(raw).toMatch(/\/AFRelationship \/Source/);
  });

  it('answers on the first page what is asked first', () => {
    for (const words of [
      'Replace a driver or ballast',
      'Off. In force 1 Dec 2026, 08:40 CST, proved dead 08:58',
      'Harrow Mill, Building 4, level 2 corridor',
      'Nadia Okafor, 08:20',
      'Tomás Beltrán, 08:26',
      'Iris Lindqvist, 08:40',
      '480Y/277 V',
      '1 ft 0 in (0.3 m)',
      '3 ft 6 in (1.0 m)',
      '5 ft 0 in (1.5 m)',
      'NFPA 70E-2024 Table 130.7(C)(15)(a) ‡',
      'PPE category 2, arc rating at least 8 cal/cm²',
      'A to G',
      '0.0',
      'Normal branch circuit',
      'Battery connector',
      '0733',
      'Check this record',
    ]) {
      expect(pdf.firstPage, words).toContain(words);
    }
    expect(pdf.firstPage).not.toContain('Not proved dead');
  });

  it('prints every figure and every answer of the content', () => {
    for (const words of [
      'K-2207',
      'Replace four drivers that flicker',
      '482 V, 480 V, and 481 V',
      '2200 W',
      'Brown and Gray',
      'HL-3, circuit 9, one pole',
      'Three-way switch at the west stair',
      'Desk of the building',
      '12 kA',
      '0.025 s',
      '1 ft 6 in (0.457 m)',
      '12 cal/cm²',
      'Class 00, up to 500 V',
      '1 Sep 2026',
      '6 ft 0 in (1.828 m)',
      '9 ft 0 in (2.743 m)',
      '10 ft 0 in (3.0 m)',
      'Above 150 V to 750 V',
      '368 mA, 242 mA, 162 mA',
      'Clamp ammeter for the neutral',
      '31 Mar 2028',
      '911, then the desk on 4400',
      'Lobby, beside the stair',
      'The tiles above F3 are stained.',
      'own to G',
      '-0.2',
      'Not covered Permit',
      'Entered in the session of Nadia Okafor',
      'Does the stair light hang on the same circuit?',
      'No, on circuit 11. It stays lit.',
      'Battery unit still connected',
      'Emergency lighting out of service',
      'Tomás Beltrán, entered by Nadia Okafor',
      '1'.repeat(64),
    ]) {
      expect(pdf.text, words).toContain(words);
    }
  });

  it('says where each boundary comes from and how that was checked', () => {
    expect(pdf.text).toContain('NFPA 70E-2024 Table 130.4(E)(a)');
    expect(pdf.text).toContain('Two sources agree');
    expect(pdf.text).toContain('From memory, to be checked ‡');
  });

  it('holds the caution text in full and defers on every page', async () => {
    const full = messages('en-US').caution.full({
      editions: 'NFPA 70E-2024, 29 CFR 1910 S, I',
      contact: '911, then the desk on 4400',
      place: 'Lobby, beside the stair',
    });
    expect(full).toHaveLength(12);
    for (const { lead, text } of full) {
      expect(pdf.text).toContain(lead);
      expect(pdf.text).toContain(text.replace(/\s+/g, ' '));
    }
    const { stdout } = await run('pdftotext', [pdf.file, '-']);
    const pages = stdout.split('\f').filter((page) => page.trim() !== '');
    expect(pages).toHaveLength(Number(pdf.info['Pages']));
    pages.forEach((page, index) => {
      const flat = page.replace(/\s+/g, ' ');
      expect(flat).toContain('This worksheet gives no permission to work.');
      expect(flat).toContain(`SHA-256 ${input.worksheet.contentHash}`);
      expect(flat).toContain('WB-2026-000731, revision 2');
      expect(flat).toContain('Assessed under NFPA 70E-2024.');
      expect(flat).toContain(`Page ${index + 1} of ${pages.length}`);
    });
  });

  it('gives the same bytes for the same record', async () => {
    const again = await renderWorksheetPdf(structuredClone(input), 'en');
    expect(again.equals(pdf.bytes)).toBe(true);
  });

  it('keeps the drawing and the signatures as vectors', () => {
    expect(pdf.bytes.toString('latin1')).not.toContain('/Subtype /Image');
  });
});

describe('in Spanish', () => {
  it('prints the same figures in Spanish words', async () => {
    const pdf = await printed(buildPdfInput(), 'es');
    for (const words of [
      'Cambiar un driver o balastro',
      '3 ft 6 in (1.0 m)',
      'Esta hoja no da permiso para trabajar.',
      'Límite de aproximación restringido',
      'Firma',
    ]) {
      expect(pdf.text, words).toContain(words);
    }
    expect(pdf.bytes.toString('latin1')).toContain('/Lang (es-MX)');
    await qpdfCheck(pdf.file);
  });
});

describe('a sheet that nobody may take for one in force', () => {
  const reason = { text: 'still live', byName: 'Tomás Beltrán', at: '2026-12-01T09:10:00-06:00' };

  it.each([
    ['not proved', { worksheet: { proved: false } }, 'Not proved dead: treat as live'],
    [
      'a draft',
      { worksheet: { state: 'draft', signatures: [] } },
      'Draft. Not signed, not in force',
    ],
    ['waiting', { worksheet: { state: 'briefing' } }, 'Not in force: waits for the crew'],
    ['stopped', { worksheet: { state: 'stopped', reason } }, 'It is still live (Tomás Beltrán,'],
    ['sent back', { worksheet: { state: 'returned', reason } }, 'Sent back. Not in force'],
    ['void', { worksheet: { state: 'void', reason } }, 'Void. Not in force'],
    ['late', { worksheet: { state: 'expired' } }, 'Past its planned end. Not in force'],
    ['replaced', { input: { latestRevision: 3 } }, 'Superseded by revision 3'],
  ] as const)('says on each page that it is %s', async (_, change, words) => {
    const pdf = await printed(buildPdfInput(change as Parameters<typeof buildPdfInput>[0]));
    expect(pdf.firstPage).toContain(words);
    const title = words.split(' (')[0] ?? '';
    const shown = title === 'It is still live' ? 'Stopped. Not in force' : title;
    expect(pdf.text.split(shown).length - 1).toBe(Number(pdf.info['Pages']));
  });

  it('marks energized work whatever its state', async () => {
    const { content } = soundEnergizedWorksheet();
    for (const state of ['in-force', 'closed'] as const) {
      const pdf = await printed(buildPdfInput({ content, proof: null, worksheet: { state } }));
      expect(pdf.firstPage).toContain('Energized. Work or testing on live parts.');
      expect(pdf.firstPage).toContain('Avoid contact');
      expect(pdf.firstPage).toContain('1 ft 7 in (0.485 m)');
      expect(pdf.firstPage).not.toContain('treat as live');
    }
  });

  it('prints an empty draft with no distance on it', async () => {
    const pdf = await printed(
      buildPdfInput({ content: {}, proof: null, worksheet: { state: 'draft', signatures: [] } }),
    );
    expect(pdf.firstPage).toContain('Distances: not known until section 2 is complete');
    expect(pdf.firstPage).not.toMatch(/\d+ ft \d+ in/);
    expect(pdf.firstPage).toContain('Engineering study needed.');
  });

  it('shows the close-out of a closed one', async () => {
    const closeOut = {
      closeOut: { toolsClear: true, restored: true, egressTestedSeconds: 45, notes: 'All lit.' },
      at: '2026-12-01T11:40:00-06:00',
      byName: 'Nadia Okafor',
    };
    const pdf = await printed(buildPdfInput({ worksheet: { state: 'closed', closeOut } }));
    expect(pdf.firstPage).toContain('Closed 1 Dec 2026, 11:40 CST');
    expect(pdf.text).toContain('All lit.');
    expect(pdf.text).toContain('45 s');
  });
});

describe('texts that mean harm', () => {
  const HOSTILE = [
    '<svg onload="x"><script>1</script></svg>',
    '"/><image href="file:///etc/passwd"/>',
    'A'.repeat(200),
    '🔥🔥 漢字 \u202Eright to left',
    'line\nline\ttab \u0007 bell',
    '%PDF-1.4 endstream endobj',
    '{"svg":"<svg/>"}',
    'שלום عليكم',
  ];

  function hostileContent(text: string): WorksheetContent {
    const content = corridorContent();
    return {
      ...content,
      job: {
        ...content.job,
        area: text,
        equipment: text,
        description: text.repeat(8),
        workOrder: text,
      },
      supply: { ...content.supply, panel: text, circuit: text },
      sources:
        content.sources?.map((source) => ({ ...source, from: text, lockNumber: text })) ?? [],
      crew: content.crew?.map((member) => ({ ...member, name: text })) ?? [],
      briefing: { ...content.briefing, emergency: { contact: text, rescue: text, aedAt: text } },
      notes: text,
    };
  }

  it.each(HOSTILE)('prints %j as words', async (text) => {
    const input = buildPdfInput({
      content: hostileContent(text),
      worksheet: {
        siteName: text,
        leadName: text,
        reason: { text, byName: text, at: '2026-12-01T09:10:00-06:00' },
      },
      input: {
        site: { name: text, address: text },
        attachments: [
          { id: text, section: 'job', caption: text, sha256: 'f'.repeat(64), jpeg: null },
        ],
      },
    });
    const pdf = await printed(input);
    await qpdfCheck(pdf.file);
    const squeezed = pdf.text.replace(/ /g, '');
    const expected = printable(text).replace(/\s/g, '');
    expect(squeezed).toContain(expected);
    expect(await attachmentOf(pdf.file)).toBe(input.canonicalJson);
  });

  it('escapes what enters a drawing', () => {
    expect(escapeXml('<a href="x">&\'')).toBe('&lt;a href=&quot;x&quot;&gt;&amp;&apos;');
  });

  it('replaces what the typeface lacks one for one', () => {
    expect(printable('a🔥b\u202Ec\u0000d')).toBe('a◊b◊c◊d');
    expect(printable('3 ft 6 in ≤ 8 cal/cm² Ωł')).toBe('3 ft 6 in ≤ 8 cal/cm² Ωł');
  });
});

describe('photos', () => {
  it('prints those that are JPEG and says which it cannot print', async () => {
    const jpeg = await sharp({
      create: { width: 320, height: 240, channels: 3, background: '#888' },
    })
      .jpeg()
      .toBuffer();
    const photo = { section: 'sources', sha256: 'e'.repeat(64) };
    const pdf = await printed(
      buildPdfInput({
        input: {
          attachments: [
            { ...photo, id: '1', caption: 'Lock on breaker 9', jpeg },
            {
              ...photo,
              id: '2',
              caption: 'Broken',
              jpeg: Buffer.from('not a picture at all, this'),
            },
            { ...photo, id: '3', caption: 'Cut', jpeg: jpeg.subarray(0, 60) },
            { ...photo, id: '4', caption: '', jpeg: null },
          ],
        },
      }),
    );
    await qpdfCheck(pdf.file);
    expect(pdf.bytes.toString('latin1')).toContain('/DCTDecode');
    expect(pdf.text).toContain('Photo 1, Ways it can be live');
    expect(pdf.text).toContain('Lock on breaker 9');
    expect(pdf.text).toContain('This photo cannot be printed.');
    expect(pdf.text).toContain('The photo is not at hand.');
  });

  it('stand on the page of their heading, wherever that falls', async () => {
    const jpeg = await sharp({
      create: { width: 320, height: 240, channels: 3, background: '#888' },
    })
      .jpeg()
      .toBuffer();
    const photo = { id: '1', section: 'sources', sha256: 'e'.repeat(64), caption: 'Lock', jpeg };
    const [event] = buildPdfInput().events;
    // So many that the heading would still fit at the foot of a page, and no photo.
    const events = Array.from({ length: 12 }, () => event).filter((one) => one !== undefined);
    const pdf = await printed(buildPdfInput({ input: { events, attachments: [photo] } }));
    const { stdout } = await run('pdftotext', [pdf.file, '-']);
    const page = stdout.split('\f').find((words) => words.includes('Photo 1,'));
    expect(page).toMatch(/^Photos$/m);
  });
});

describe('the largest record', () => {
  it('prints 40 people, 40 ways and 120 readings within the limit', async () => {
    const content = corridorContent();
    const many = <T>(each: (index: number) => T): T[] =>
      Array.from({ length: 40 }, (_, i) => each(i));
    const readings: NonNullable<Proof['readings']> = many((index) => index).flatMap((index) =>
      (['A', 'N', 'B'] as const).map((from) => ({
        point: `Luminaire ${index + 1}`,
        from,
        to: 'G' as const,
        volts: index / 10,
        at: '2026-12-01T08:52:00-06:00',
      })),
    );
    const large: WorksheetContent = {
      ...content,
      job: { ...content.job, pointsOfWork: 40, description: 'word '.repeat(400).trim() },
      sources: many((index) => ({
        ...content.sources?.[index % 4],
        id: `s${index}`,
        from: `Panel ${index}, ${'a long name of a place '.repeat(6)}`,
      })),
      crew: many((index) => ({
        ...content.crew?.[1],
        id: `c${index}`,
        name: `Person number ${index + 1}`,
        lead: index === 0,
      })),
    };
    const strokes = buildPdfInput().worksheet.signatures.map((signature) => ({
      ...signature,
      strokes: many((index): [number, number][] =>
        Array.from({ length: 120 }, (_, step) => [step * 4, index * 4 + (step % 7)]),
      ),
    }));
    const input = buildPdfInput({
      content: large,
      proof: { ...corridorProof(), readings },
      worksheet: { signatures: strokes },
    });
    // A worker that is still loading its code is not what the limit is about.
    await renderWorksheetPdf(buildPdfInput(), 'en');
    const started = performance.now();
    await renderWorksheetPdf(input, 'en');
    expect(performance.now() - started).toBeLessThan(20_000);
    const pdf = await printed(input);
    await qpdfCheck(pdf.file);
    expect(pdf.text).toContain('Person number 40');
    expect(pdf.text).toContain('3.40');
    expect(pdf.text).toContain('Luminaire 40');
    expect(pdf.text).toContain('3.9');
  });
});

describe('the workers', () => {
  it('print several records at once', async () => {
    const all = await Promise.all(
      (['en', 'es', 'en', 'es'] as const).map((language) =>
        renderWorksheetPdf(buildPdfInput(), language),
      ),
    );
    expect(all[0]?.equals(all[2] ?? Buffer.alloc(0))).toBe(true);
    expect(all[1]?.equals(all[3] ?? Buffer.alloc(0))).toBe(true);
  });

  it('go on after a record that cannot be printed', async () => {
    const broken = buildPdfInput();
    Object.assign(broken.worksheet, { updatedAt: 'no date' });
    await expect(renderWorksheetPdf(broken, 'en')).rejects.toThrow();
    expect((await renderWorksheetPdf(buildPdfInput(), 'en')).length).toBeGreaterThan(1000);
  });

  it('refuse what still runs when they are ended, as a problem', async () => {
    const running = renderWorksheetPdf(buildPdfInput(), 'en');
    const refused = expect(running).rejects.toMatchObject({ problem: 'took-too-long' });
    await stopPdfWorkers();
    await refused;
  });
});

describe('what may be read', () => {
  it('names no file and no address outside the project in its code', async () => {
    const source = await readFile('server/pdf/worker.ts', 'utf8');
    expect(source).toContain('setUrlAccessPolicy(() => false)');
    expect(source).toContain('setLocalAccessPolicy(isFontFile)');
  });
});
