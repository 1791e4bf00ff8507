import type { Content, TableCell } from 'pdfmake/interfaces';
import { enumWord } from '@/shared/messages';
import type { ProofRecord } from '@/shared/record';
import type { PdfContext } from './context';
import { sectionFields } from './fieldTable';
import { findingList } from './findings';
import { readingMatrix } from './readings';
import { cite, headCell, label, matrix, medium, strong, subhead } from './style';
import { text } from './text';

/** Every proof that was recorded on this revision, the latest marked, each with all its readings. */
export function proofs(context: PdfContext): Content[] {
  const { m, worksheet } = context;
  const own = worksheet.proofs.filter(({ revision }) => revision === worksheet.revision);
  if (own.length === 0) {
    const energized = worksheet.content.decision?.mode === 'energized';
    const words = m.pdf.test;
    return [strong(energized ? words.energized : words.none, { margin: [0, 4, 0, 0] })];
  }
  return own.flatMap((record, index) => proof(record, index, index === own.length - 1, context));
}

function proof(
  record: ProofRecord,
  index: number,
  isLatest: boolean,
  context: PdfContext,
): Content[] {
  const { m, locale, at } = context;
  const words = m.pdf.test;
  const { verdict, findings } = record.assessment;
  const title = isLatest ? `${words.proof(index + 1)} (${words.latest})` : words.proof(index + 1);
  const reading = readingMatrix(record, context);
  return [
    subhead(title),
    medium(`${words.by(record.byName, at(record.at))} ${enumWord(locale, 'verdict', verdict)}.`, {
      margin: [0, 0, 0, 3],
    }),
    ...sectionFields(
      { prefix: 'proof', except: ['proof.readings'], record: record.proof },
      context,
    ),
    ...(reading.lines.length > 0 ? [readingTable(reading, context)] : []),
    ...(reading.incomplete.length > 0
      ? [cite(`${words.incomplete}: ${reading.incomplete.join(' · ')}`, { margin: [0, 3, 0, 0] })]
      : []),
    // Those of the latest stand with the other findings.
    ...(isLatest
      ? []
      : findingList(
          findings.filter(({ path }) => path.startsWith('/proof')),
          context,
        )),
  ];
}

function readingTable(
  { pairs, lines }: ReturnType<typeof readingMatrix>,
  { m }: PdfContext,
): Content {
  const words = m.pdf.test;
  const size = pairs.length > 6 ? 7.5 : 9;
  const center = { alignment: 'center', fontSize: size } as const;
  const body: TableCell[][] = [
    [
      headCell(words.unit),
      ...pairs.map((pair) => headCell(pair, center)),
      headCell(words.at, center),
    ],
    ...lines.map((line) => [
      {
        stack: [strong(line.point, { fontSize: 9 }), ...(line.detail ? [label(line.detail)] : [])],
      },
      ...line.cells.map((cell) => strong(cell === '' ? '–' : cell, center)),
      text(line.at, center),
    ]),
  ];
  const cellWidth = pairs.length > 6 ? 34 : 54;
  return {
    table: {
      headerRows: 1,
      keepWithHeaderRows: 1,
      widths: ['*', ...pairs.map(() => cellWidth), 36],
      body,
      dontBreakRows: true,
    },
    layout: matrix,
    margin: [0, 5, 0, 0],
  };
}
