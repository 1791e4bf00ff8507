import { identifySystem } from '@/hazard';
import type { Citation, Distance } from '@/hazard/types';
import type { Content, TableCell } from 'pdfmake/interfaces';
import { calories, distance, metres, seconds, kiloamperes, volts } from '@/shared/format';
import { enumWord } from '@/shared/messages';
import { sectionGeometry } from '@/shared/drawing/section';
import { distanceLines, sectionInputOf } from '@/shared/drawing/worksheetDrawing';
import type { ZoneRole } from '@/shared/drawing/hatch';
import { PRINT_UNITS, shortSource, type PdfContext } from './context';
import { measured } from './fieldValue';
import { readingMatrix } from './readings';
import { bold, cite, headCell, matrix, medium, rows, sectionHead, SIZE, strong } from './style';
import { drawingSvg, figure, swatchSvg } from './svg';
import { text } from './text';

/** 96 px to the inch: the drawing keeps the units of the screen, print has 72 pt to the inch. */
const POINTS_PER_PIXEL = 0.75;
/** 3/8 in to the foot, or 1/4 in where the page has more to hold. */
export const PRINT_SCALES = { large: 36, small: 24 } as const;
/** Scales as a drafter writes them. */
const SCALE_NAMES: Readonly<Record<number, string>> = {
  36: '3/8',
  24: '1/4',
  18: '3/16',
  12: '1/8',
  9: '3/32',
  6: '1/16',
  3: '1/32',
};

const DISTANCE = 13;
/** A longer name of the place leaves no room for the scale beside the title. */
const LONGEST_PLACE = 12;

/** Section 6: the drawing, to scale. */
export function drawingColumn(
  context: PdfContext,
  width: number,
  pixelsPerFoot: number,
): Content[] {
  const { m, locale, worksheet } = context;
  const { content, assessment } = worksheet;
  const subject = { content, assessment, messages: m, locale, units: PRINT_UNITS };
  const drawing = sectionGeometry(
    sectionInputOf(subject, {
      width: Math.floor(width / POINTS_PER_PIXEL),
      pixelsPerFoot,
      medium: 'print',
    }),
  );
  const scale = SCALE_NAMES[drawing.pixelsPerFoot];
  const words = m.pdf.drawing;
  const at = worksheet.content.job?.equipment ?? '';
  const note = !scale
    ? m.drawing.notToPrintScale
    : at !== '' && at.length <= LONGEST_PLACE
      ? words.scale(at, scale)
      : m.drawing.printScale(scale);
  const alt = [words.alt, ...distanceLines(subject)].join(' ');
  return [
    sectionHead({
      number: 6,
      title: m.common.sections.boundaries,
      note: medium(note, { fontSize: SIZE.label }),
      width,
      gap: 8,
    }),
    figure(drawingSvg(drawing), alt, width, drawing.height * POINTS_PER_PIXEL),
  ];
}

/** A name cut for the first page; section 2 has it whole. */
function brief(name: string): string {
  return name.length <= 40 ? name : `${name.slice(0, 40)}…`;
}

/** Section 2 in three sentences. */
export function supplySummary(context: PdfContext, width: number): Content[] {
  const { m, locale, worksheet } = context;
  const words = m.pdf.supply;
  const { supply = {} } = worksheet.content;
  const { boundaries } = worksheet.assessment;
  const unknown = words.notKnown;
  const circuit = supply.circuitVolts === undefined ? unknown : volts(locale, supply.circuitVolts);
  const readings = [
    ...(supply.readings?.phaseToPhase ?? []),
    ...(supply.readings?.phaseToNeutral ?? []),
  ].map((each) => volts(locale, each));
  const parts = [
    bold(`${supply.system ? `${supply.system} V` : m.common.notAnswered}. `),
    text(`${words.at(brief(supply.panel ?? unknown), brief(supply.circuit ?? unknown), circuit)} `),
  ];
  if (boundaries) parts.push(medium(`${words.entered(volts(locale, boundaries.volts))} `));
  if (readings.length > 0) parts.push(text(`${words.read(readings.join(', '))} ${fit(context)}`));
  return [
    sectionHead({ number: 2, title: m.common.sections.supply, width, gap: 8 }),
    { text: parts },
  ];
}

function fit({ worksheet, m }: PdfContext): string {
  const { system, readings } = worksheet.content.supply ?? {};
  if (system === undefined) return '';
  const { phaseToPhase = [], phaseToNeutral = [] } = readings ?? {};
  const fits = identifySystem({ phaseToPhase, phaseToNeutral }).includes(system);
  return fits ? m.pdf.supply.fits : m.pdf.supply.doesNotFit;
}

function distanceRow(
  role: ZoneRole | 'barricade',
  figureText: { first: string; second: string | null },
  name: string,
  source: string,
): TableCell[] {
  const { first, second } = figureText;
  return [
    { svg: swatchSvg(role), width: 15, height: 21, margin: [0, 1, 0, 0] },
    {
      text: [
        bold(second === null ? first : `${first} `, {
          fontSize: first.length > 13 ? 10 : DISTANCE,
        }),
        ...(second === null ? [] : [text(second, { fontSize: SIZE.label })]),
      ],
      margin: [0, 1, 0, 0],
    },
    { stack: [strong(name, { fontSize: 8.75 }), cite(source, { fontSize: 7.5 })] },
  ];
}

const pair = (value: Distance) => ({
  first: distance(value, 'feet'),
  second: `(${metres(value.metres)})`,
});
const words = (first: string) => ({ first, second: null });

/** The distances, each with its swatch, both published figures and its source. */
export function distanceSummary(context: PdfContext, width: number): Content[] {
  const { m, worksheet, locale } = context;
  const source = (each: Citation) => shortSource(each, locale);
  const { boundaries, barricade } = worksheet.assessment;
  const names = m.drawing;
  const title = strong(m.pdf.distances.title, { fontSize: 12 });
  const head = [
    sectionHeadLess(width),
    { ...title, margin: [0, 0, 0, 3] as [number, number, number, number] },
  ];
  if (!boundaries) return [...head, strong(`${names.zones.distancesNotKnown}.`)];
  if (!boundaries.inTable) return [...head, strong(`${names.zones.outsideTable}.`)];
  const body: TableCell[][] = [];
  const { restricted, movable, citation } = boundaries;
  const contact = restricted === 'avoid contact' ? words(names.zones.avoidContact) : null;
  const none = words(m.pdf.distances.notSpecified);
  const restrictedFigure =
    contact ?? (restricted && restricted !== 'avoid contact' ? pair(restricted) : none);
  body.push(distanceRow('restricted', restrictedFigure, names.restrictedFull, source(citation)));
  const limited = movable ? boundaries.limitedMovable : boundaries.limitedFixed;
  const limitedName = movable ? names.limitedMovableFull : names.limitedFixedFull;
  body.push(distanceRow('limited', limited ? pair(limited) : none, limitedName, source(citation)));
  body.push(arcFlashRow(context));
  if (barricade && barricade.inches > 0) {
    body.push(
      distanceRow('barricade', pair(barricade), names.barricadeFull, source(barricade.citation)),
    );
  }
  return [...head, { table: { widths: [16, 84, '*'], body, dontBreakRows: true }, layout: rows }];
}

function arcFlashRow(context: PdfContext): TableCell[] {
  const { m, worksheet } = context;
  const { arcFlash } = worksheet.assessment;
  // The likelihood comes first; what the boundary itself was read from comes after it.
  const [likelihood, ...figures] = arcFlash.citations.map((each) =>
    shortSource(each, context.locale),
  );
  const plain = (place: string) => place.replace(' ‡', '');
  const of = figures.filter((place) => plain(place) === plain(figures[0] ?? ''));
  // Of two rows of one table the one that is to be checked is shown.
  const cited = of.find((place) => place.endsWith('‡')) ?? of[0] ?? likelihood ?? '';
  const name = m.drawing.arcFlashFull;
  if (arcFlash.arcFlashBoundary) {
    return distanceRow('arcFlash', pair(arcFlash.arcFlashBoundary), name, cited);
  }
  const notLikely = arcFlash.method === 'not likely';
  const figure = notLikely ? m.pdf.arc.notLikely : m.pdf.supply.notKnown;
  const because = notLikely ? m.pdf.distances.none : m.pdf.distances.study;
  return distanceRow('arcFlash', words(figure), name, `${because} ${cited}`);
}

function sectionHeadLess(width: number): Content {
  return {
    canvas: [{ type: 'line', x1: 0, y1: 0, x2: width, y2: 0, lineWidth: 1.5 }],
    margin: [0, 7, 0, 3],
  };
}

export function sources(citations: readonly Citation[], { source }: PdfContext): string {
  return [...new Set(citations.map(source))].join('; ');
}

/** Section 7 in a few words: likely or not, by which method, category and rating. */
export function arcFlashSummary(context: PdfContext, width: number): Content[] {
  const { m, locale, worksheet } = context;
  const { arcFlash } = worksheet.assessment;
  const asked = worksheet.content.arcFlash ?? {};
  const said = m.pdf.arc;
  const parts: string[] = [];
  if (arcFlash.ppeCategory !== null) parts.push(said.category(String(arcFlash.ppeCategory)));
  if (arcFlash.requiredArcRatingCalPerCm2 !== null) {
    parts.push(said.rating(calories(locale, arcFlash.requiredArcRatingCalPerCm2)));
  } else if (arcFlash.method === 'not likely') parts.push(said.noRating);
  if (arcFlash.method === 'study needed') parts.push(said.study);
  const limits = [
    asked.availableFaultKiloamperes === undefined
      ? ''
      : kiloamperes(locale, asked.availableFaultKiloamperes),
    asked.clearingSeconds === undefined ? '' : seconds(locale, asked.clearingSeconds),
    asked.workingDistanceInches === undefined ? '' : measured(asked.workingDistanceInches),
  ].filter(Boolean);
  const method = enumWord(locale, 'arcFlashMethod', arcFlash.method);
  return [
    sectionHead({
      number: 7,
      title: m.common.sections.arcFlash,
      note: medium(arcFlash.likely ? said.likely : said.notLikely),
      width,
      gap: 7,
    }),
    {
      text: [
        strong(parts.join(', ') || method),
        text(limits.length > 0 ? `. ${method}: ${limits.join(', ')}.` : ''),
      ],
    },
  ];
}

const LINES = 4;

/** Section 5: the latest readings, and what they were taken with. */
export function testSummary(context: PdfContext, width: number): Content[] {
  const { m, locale, worksheet } = context;
  const said = m.pdf.test;
  const test = worksheet.content.absenceTest ?? {};
  const latest = worksheet.proofs.at(-1);
  const head = sectionHead({
    number: 5,
    title: m.common.sections.absenceTest,
    ...(latest && { note: medium(said.unit) }),
    width,
    gap: 7,
  });
  const instrument = said.instrument(
    test.instrument ? enumWord(locale, 'instrument', test.instrument) : m.common.notAnswered,
    test.category ? enumWord(locale, 'category', test.category) : m.common.notAnswered,
    test.ratedVolts === undefined ? m.common.notAnswered : volts(locale, test.ratedVolts),
  );
  if (!latest) {
    const energized = worksheet.content.decision?.mode === 'energized';
    return [
      head,
      strong(energized ? said.energized : said.none),
      text(`${said.plan}: ${instrument}`),
    ];
  }
  const { pairs, lines } = readingMatrix(latest, context);
  const shownPairs = pairs.slice(0, 4);
  const body: TableCell[][] = [
    [
      headCell(''),
      ...shownPairs.map((each) => headCell(each, { alignment: 'center' })),
      headCell(said.at, { alignment: 'center' }),
    ],
    ...lines
      .slice(0, LINES)
      .map((line) => [
        strong([line.point, line.detail].filter(Boolean).join(', '), { fontSize: 9 }),
        ...shownPairs.map((_, index) =>
          strong(line.cells[index] ?? '', { fontSize: 9, alignment: 'center' }),
        ),
        strong(line.at, { fontSize: 9, alignment: 'center' }),
      ]),
  ];
  const more = lines.length - LINES;
  const { provedBefore, provedAfter } = latest.proof;
  const proved = provedBefore === true && provedAfter === true ? said.provedBoth : said.provedNot;
  const widths = ['*', ...shownPairs.map(() => 36), 36];
  return [
    head,
    ...(lines.length > 0 ? [{ table: { widths, body, dontBreakRows: true }, layout: matrix }] : []),
    text(
      `${more > 0 || pairs.length > 4 ? `${said.more(Math.max(more, 1))} ` : ''}${instrument} ${proved}`,
      { margin: [0, 3, 0, 0] },
    ),
  ];
}
