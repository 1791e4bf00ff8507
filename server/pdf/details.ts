import type { Content } from 'pdfmake/interfaces';
import { distancePair } from '@/shared/format';
import { enumWord, itemWords } from '@/shared/messages';
import { BRIEFING_TOPICS } from '@/hazard/enumerations';
import { PRINT_UNITS, type PdfContext } from './context';
import { boundaries } from './boundaries';
import { crewTable } from './crewTable';
import { field, fieldsOf, fieldTable, notAnswered, sectionFields } from './fieldTable';
import { proofs } from './proofs';
import { signatures } from './signatures';
import { cite, headCell, label, medium, PAGE, rows, sectionHead, strong, subhead } from './style';
import { sources as cited } from './summary';
import { text } from './text';

type Section = (context: PdfContext) => Content[];

/** All twelve sections with every field, in the order of the form. */
const SECTIONS: readonly [keyof PdfContext['m']['common']['sections'], Section][] = [
  ['job', job],
  ['supply', (context) => fieldsIn('supply', context)],
  ['sources', ways],
  ['decision', decision],
  ['absenceTest', (context) => [...fieldsIn('absenceTest', context), ...proofs(context)]],
  ['boundaries', boundaries],
  ['arcFlash', arcFlash],
  ['protectiveEquipment', protectiveEquipment],
  ['surroundings', surroundings],
  ['crew', crew],
  ['signatures', signatures],
  ['closeOut', closeOut],
];

export function details(context: PdfContext): Content[] {
  return SECTIONS.flatMap(([key, section], index) => [
    sectionHead({
      number: index + 1,
      title: context.m.common.sections[key],
      width: PAGE.textWidth,
    }),
    ...section(context),
  ]);
}

type Prefix = 'job' | 'supply' | 'decision' | 'absenceTest' | 'arcFlash' | 'surroundings';

function fieldsIn(prefix: Prefix, context: PdfContext, except?: readonly string[]): Content[] {
  const record = context.worksheet.content[prefix];
  return sectionFields({ prefix, record, ...(except && { except }) }, context);
}

function job(context: PdfContext): Content[] {
  const notes = field('notes', context.worksheet.content.notes, context);
  return [...fieldsIn('job', context), ...(notes ? fieldTable([notes]) : [])];
}

function ways(context: PdfContext): Content[] {
  const { m, locale, worksheet } = context;
  const { content } = worksheet;
  const egress = [
    field('egressSupply', content.egressSupply, context),
    field('egressReaches', content.egressReaches, context),
    field('egress.toldTo', content.egress?.toldTo, context),
    field('egress.interim', content.egress?.interim, context),
  ].filter((row) => row !== null);
  const sources = content.sources ?? [];
  return [
    ...fieldTable(egress),
    ...(sources.length === 0 ? [text(m.pdf.ways.none)] : []),
    ...sources.flatMap((source, index): Content[] => {
      const kind = source.kind ? enumWord(locale, 'sourceKind', source.kind) : m.common.notAnswered;
      const except = ['sources.id', 'sources.kind'];
      const found = fieldsOf({ prefix: 'sources', except, record: source }, context);
      return [
        subhead(`3.${index + 1}  ${kind}`),
        ...fieldTable(found.answered),
        ...(found.missing.length > 0 ? [notAnswered(found.missing, context)] : []),
      ];
    }),
  ];
}

function decision(context: PdfContext): Content[] {
  const { m, worksheet, source } = context;
  const { permit } = worksheet.assessment;
  const because: Readonly<Record<string, string>> = m.permit.because;
  const exemptions: Readonly<Record<string, string>> = m.permit.exemption;
  const sentences = [
    permit.required ? m.permit.required : m.permit.notRequired,
    because[permit.because] ?? permit.because,
    permit.exemption === null ? '' : (exemptions[permit.exemption] ?? permit.exemption),
    permit.exemption === null ? '' : m.permit.stillProtected,
  ].filter((sentence) => sentence !== '');
  return [
    ...fieldsIn('decision', context),
    subhead(m.pdf.permit.title),
    text(sentences.join(' ')),
    cite(source(permit.citation), { margin: [0, 2, 0, 0] }),
  ];
}

function arcFlash(context: PdfContext): Content[] {
  const { m, locale, worksheet } = context;
  const { arcFlash: found } = worksheet.assessment;
  const words = m.pdf.arc;
  const boundary = found.arcFlashBoundary;
  const answers = [
    { label: words.likelihood, value: found.likely ? m.common.yes : m.common.no },
    { label: words.method, value: enumWord(locale, 'arcFlashMethod', found.method) },
    ...(found.ppeCategory === null
      ? []
      : [{ label: words.ppeCategory, value: String(found.ppeCategory) }]),
    ...(found.requiredArcRatingCalPerCm2 === null
      ? []
      : [
          {
            label: words.requiredRating,
            value: `${found.requiredArcRatingCalPerCm2}\u00a0cal/cm²`,
          },
        ]),
    ...(boundary
      ? [{ label: m.drawing.arcFlashFull, value: distancePair(boundary, PRINT_UNITS) }]
      : []),
  ];
  return [
    ...fieldTable(answers),
    cite(cited(found.citations, context), { margin: [0, 2, 0, 6] }),
    ...fieldsIn('arcFlash', context),
  ];
}

function protectiveEquipment(context: PdfContext): Content[] {
  const { m, locale, worksheet, source } = context;
  const words = m.pdf.equipment;
  const { protectiveEquipment: answers } = worksheet.content;
  const ready = new Set(answers?.ready ?? []);
  const required = worksheet.assessment.equipment;
  const table: Content =
    required.length === 0
      ? text(words.none)
      : {
          table: {
            headerRows: 1,
            keepWithHeaderRows: 1,
            widths: ['*', 50, 260],
            body: [
              [headCell(words.item), headCell(words.atHand), headCell(words.basis)],
              ...required.map((item) => [
                strong(itemWords(locale, item, PRINT_UNITS)),
                medium(ready.has(item.id) ? m.common.yes : m.common.no),
                cite(source(item.citation)),
              ]),
            ],
            dontBreakRows: true,
          },
          layout: rows,
          margin: [0, 0, 0, 4],
        };
  const except = ['protectiveEquipment.ready'];
  return [
    table,
    ...sectionFields({ prefix: 'protectiveEquipment', except, record: answers }, context),
  ];
}

function surroundings(context: PdfContext): Content[] {
  const { m, locale, worksheet } = context;
  const { groundedSurfaces } = worksheet.content.surroundings ?? {};
  const except = ['surroundings.groundedSurfaces'];
  const names = m.fields;
  const yesNo = (value: boolean | undefined) =>
    value === undefined ? m.common.notAnswered : value ? m.common.yes : m.common.no;
  const content = fieldsIn('surroundings', context, except);
  if (groundedSurfaces === undefined) return content;
  content.push(subhead(m.pdf.surfaces.title));
  if (groundedSurfaces.length === 0) return [...content, text(m.pdf.surfaces.looked)];
  content.push({
    table: {
      headerRows: 1,
      keepWithHeaderRows: 1,
      widths: ['*', 100, 120, 150],
      body: [
        [
          headCell(names['surroundings.groundedSurfaces.kind']),
          headCell(names['surroundings.groundedSurfaces.inReach']),
          headCell(names['surroundings.groundedSurfaces.covered']),
          headCell(names['surroundings.groundedSurfaces.keptClear']),
        ],
        ...groundedSurfaces.map(({ kind, inReach, covered, keptClear }) => [
          strong(kind ? enumWord(locale, 'surfaceKind', kind) : m.common.notAnswered),
          text(yesNo(inReach)),
          text(yesNo(covered)),
          text(yesNo(keptClear)),
        ]),
      ],
      dontBreakRows: true,
    },
    layout: rows,
  });
  return content;
}

function crew(context: PdfContext): Content[] {
  const { m, worksheet } = context;
  const { briefing } = worksheet.content;
  const topics: Readonly<Record<string, { name: string }>> = m.topics;
  const covered = new Set<string>(briefing?.topics ?? []);
  const named = (isCovered: boolean) =>
    BRIEFING_TOPICS.filter((topic) => covered.has(topic) === isCovered)
      .map((topic) => topics[topic]?.name ?? topic)
      .join(' · ');
  const list = [
    { label: m.pdf.crew.covered, value: named(true) || m.common.none },
    ...(named(false) === '' ? [] : [{ label: m.pdf.crew.notCovered, value: named(false) }]),
  ];
  const except = ['briefing.topics'];
  return [
    ...crewTable(context),
    subhead(m.pdf.crew.topics),
    ...fieldTable(list),
    subhead(m.pdf.crew.emergency),
    ...sectionFields({ prefix: 'briefing', except, record: briefing }, context),
  ];
}

function closeOut(context: PdfContext): Content[] {
  const { m, worksheet, at } = context;
  const record = worksheet.closeOut;
  if (!record) return [label(m.pdf.closeOut.none)];
  return [
    ...sectionFields({ prefix: 'closeOut', record: record.closeOut }, context),
    medium(m.pdf.closeOut.by(record.byName, at(record.at)), { margin: [0, 3, 0, 0] }),
  ];
}
