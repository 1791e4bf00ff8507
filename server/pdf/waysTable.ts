import type { Content, CustomTableLayout, TableCell } from 'pdfmake/interfaces';
import { list } from '@/shared/format';
import { enumWord } from '@/shared/messages';
import type { PdfContext } from './context';
import { bold, headCell, medium, PAGE, rows, sectionHead, strong } from './style';
import { text } from './text';

const tightRows: CustomTableLayout = {
  ...rows,
  paddingTop: () => 1.5,
  paddingBottom: () => 1.5,
};

/** Section 3 on the first page: one row a way. */
export function waysTable(context: PdfContext): Content[] {
  const { m, worksheet, locale } = context;
  const words = m.pdf.ways;
  const { sources = [], egressSupply } = worksheet.content;
  const unknown = m.common.notAnswered;
  const small = { fontSize: 9 };
  const supplies = egressSupply?.map((supply) => enumWord(locale, 'egressSupply', supply)) ?? [];
  const note = supplies.length > 0 ? words.egress(list(locale, supplies)) : words.egressNone;
  const title = sectionHead({
    number: 3,
    title: m.common.sections.sources,
    note: medium(note),
    width: PAGE.textWidth,
    gap: 7,
  });
  if (sources.length === 0) return [title, text(words.none)];
  const body: TableCell[][] = [
    ['', words.way, words.from, words.openedAt, words.held, words.lock, words.by].map((name) =>
      headCell(name),
    ),
    ...sources.map((source, index) => [
      bold(`3.${index + 1}`, small),
      strong(source.kind ? enumWord(locale, 'sourceKind', source.kind) : unknown, small),
      text(
        [source.from, source.system && enumWord(locale, 'system', source.system)]
          .filter(Boolean)
          .join('. '),
        small,
      ),
      text(source.openedAt ? enumWord(locale, 'openedAt', source.openedAt) : unknown, small),
      text(source.held ? enumWord(locale, 'held', source.held) : unknown, small),
      bold(source.lockNumber ?? '', small),
      text(context.crewName(source.byCrewId), small),
    ]),
  ];
  return [
    title,
    {
      table: {
        headerRows: 1,
        keepWithHeaderRows: 1,
        widths: [22, 100, '*', 73, 56, 34, 64],
        body,
        dontBreakRows: true,
      },
      layout: tightRows,
    },
  ];
}
