import type { Content, TableCell } from 'pdfmake/interfaces';
import { dateText } from '@/shared/format';
import { enumWord } from '@/shared/messages';
import type { PdfContext } from './context';
import { fieldValue } from './fieldValue';
import { headCell, label, rows, strong } from './style';
import { text } from './text';

/** Who comes how close, and what they are qualified and equipped for. */
export function crewTable(context: PdfContext): Content[] {
  const { m, locale, worksheet } = context;
  const words = m.pdf.crew;
  const { crew = [] } = worksheet.content;
  if (crew.length === 0) return [label(m.pdf.fields.nothing)];
  const yesNo = (value: boolean | undefined) =>
    value === undefined ? m.common.notAnswered : value ? m.common.yes : m.common.no;
  const gloves = (own: (typeof crew)[number]['gloves']) =>
    own === undefined
      ? ''
      : Object.entries(own)
          .map(([key, value]) => {
            const path = `crew.gloves.${key}`;
            const labels: Readonly<Record<string, string>> = m.fields;
            return `${labels[path] ?? key}: ${fieldValue(path, value, context) ?? ''}`;
          })
          .join(' · ');
  const body: TableCell[][] = [
    [
      words.name,
      words.qualified,
      words.closest,
      words.clothing,
      words.rescue,
      m.fields['crew.worksOnCircuit'],
    ].map((name) => headCell(name)),
    ...crew.flatMap((member): TableCell[][] => {
      const qualified =
        member.qualified === undefined
          ? m.common.notAnswered
          : member.qualified
            ? member.qualifiedThrough
              ? dateText(locale, member.qualifiedThrough)
              : m.common.yes
            : words.notQualified;
      const own = gloves(member.gloves);
      return [
        [
          {
            stack: [
              strong(member.name ?? m.common.notAnswered),
              label(
                member.lead ? enumWord(locale, 'role', 'lead') : enumWord(locale, 'role', 'helper'),
              ),
            ],
          },
          text(qualified),
          text(member.closest ? enumWord(locale, 'closest', member.closest) : m.common.notAnswered),
          text(yesNo(member.arcRated)),
          text(yesNo(member.rescueTrained)),
          text(yesNo(member.worksOnCircuit)),
        ],
        ...(own === ''
          ? []
          : [[{ ...label(`${words.gloves}: ${own}`), colSpan: 6 }, {}, {}, {}, {}, {}]]),
      ];
    }),
  ];
  return [
    {
      table: {
        headerRows: 1,
        keepWithHeaderRows: 1,
        widths: ['*', 90, 130, 56, 56, 70],
        body,
        dontBreakRows: true,
      },
      layout: rows,
    },
  ];
}
