import type {
  Column,
  Content,
  ContentText,
  CustomTableLayout,
  TableCell,
} from 'pdfmake/interfaces';
import { windowText } from '@/shared/format';
import { enumWord } from '@/shared/messages';
import type { Meaning, Signature } from '@/shared/record';
import { bannersOf } from './banners';
import type { PdfContext } from './context';
import { bold, cite, framed, framedBelow, label, medium, PAGE, rule, SIZE, strong } from './style';
import { qrSvg } from './qr';
import { markSvg } from './svg';
import {
  arcFlashSummary,
  distanceSummary,
  drawingColumn,
  PRINT_SCALES,
  supplySummary,
  testSummary,
} from './summary';
import { waysTable } from './waysTable';

/** The narrowest in which a section at 3/8 in to the foot has room for a person outside. */
const LEFT = 286;
const GUTTER = 12;
/** Side of the code that leads to the public check. */
const QR = 62;
const RIGHT = PAGE.textWidth - LEFT - GUTTER;

/** What an inspector asks first: who, where, off or energized, distances, readings, ways it can be live. */
export function firstPage(context: PdfContext): Content[] {
  return [
    titleLine(context),
    ...bannersOf(context),
    titleBlock(context),
    {
      columns: [
        { width: LEFT, stack: drawingColumn(context, LEFT, drawingScale(context)) },
        {
          width: RIGHT,
          stack: [
            ...supplySummary(context, RIGHT),
            ...distanceSummary(context, RIGHT),
            ...arcFlashSummary(context, RIGHT),
            ...testSummary(context, RIGHT),
          ],
        },
      ],
      columnGap: GUTTER,
    },
    ...waysTable(context),
  ];
}

/** With banners or many ways the page has less room for the drawing. */
function drawingScale(context: PdfContext): number {
  const ways = context.worksheet.content.sources?.length ?? 0;
  const isCrowded = bannersOf(context).length > 0 || ways > 4;
  return isCrowded ? PRINT_SCALES.small : PRINT_SCALES.large;
}

/** The head of the first page, in its margin. */
export function firstHead({ m, worksheet }: PdfContext): Content {
  return {
    margin: [PAGE.side, 33, PAGE.side, 0],
    stack: [
      {
        columns: [
          { svg: markSvg(), width: 21, margin: [0, 2, 0, 0] },
          { ...strong(m.common.product, { fontSize: 15 }), width: 'auto', margin: [7, 0, 0, 0] },
          {
            text: [
              medium(`${m.pdf.kind}   `, { fontSize: 10.5 }),
              bold(m.pdf.numbered(worksheet.number, worksheet.revision), { fontSize: 15 }),
            ],
            alignment: 'right',
            width: '*',
          },
        ],
      },
      rule(PAGE.textWidth, 1.5, [3, 0]),
    ],
  };
}

function titleLine(context: PdfContext): Content {
  const { m, worksheet, locale } = context;
  const { job } = worksheet.content;
  const title = job?.task ? enumWord(locale, 'task', job.task) : m.common.worksheet;
  return {
    columns: [
      { ...bold(title, { fontSize: SIZE.title, lineHeight: 1 }), width: '*' },
      {
        ...medium(statusLine(context), { fontSize: 10.5 }),
        width: 'auto',
        alignment: 'right',
        margin: [0, 9, 0, 0],
      },
    ],
    margin: [0, 0, 0, 6],
  };
}

function signed(worksheet: PdfContext['worksheet'], meaning: Meaning): Signature[] {
  return worksheet.signatures.filter(
    (each) => each.meaning === meaning && each.revision === worksheet.revision,
  );
}

/** `Off. In force 14 Oct 2026, 11:16 CDT, proved dead 11:33`. */
function statusLine(context: PdfContext): string {
  const { worksheet, m, locale } = context;
  const words = m.pdf.status;
  const mode = worksheet.content.decision?.mode;
  const first = mode === undefined ? words.undecided : words[mode];
  const [countersigned] = signed(worksheet, 'countersigned');
  const parts: string[] = [];
  if (worksheet.state === 'in-force' && countersigned) {
    parts.push(words.inForceSince(context.at(countersigned.signedAt)));
    const latest = worksheet.proofs.at(-1);
    if (worksheet.proved && latest) parts.push(words.provedAt(context.clock(latest.at)));
  } else if (worksheet.closeOut) {
    parts.push(words.closedAt(context.at(worksheet.closeOut.at)));
  } else {
    parts.push(enumWord(locale, 'state', worksheet.state));
  }
  const rest = parts.join(', ');
  return `${first}. ${rest.charAt(0).toUpperCase()}${rest.slice(1)}`;
}

/** The first page has room for so much; the section has it whole. */
const LONGEST = 90;

function shortened(value: string): string {
  return value.length <= LONGEST ? value : `${value.slice(0, LONGEST)}…`;
}

function cell(name: string, value: string | ContentText): TableCell {
  const shown = typeof value === 'string' ? strong(shortened(value)) : value;
  return { stack: [label(name), shown] };
}

function nameAndTime(context: PdfContext, name: string, signature: Signature | undefined): string {
  return signature ? `${name}, ${context.clock(signature.signedAt)}` : name;
}

function titleBlock(context: PdfContext): Content {
  const { m, worksheet, locale, site } = context;
  const words = m.pdf.block;
  const { job, crew = [] } = worksheet.content;
  const place = [site?.name ?? worksheet.siteName ?? '', job?.area ?? '']
    .filter(Boolean)
    .join(', ');
  const planned =
    job?.startsAt && job.endsAt
      ? windowText(locale, job.startsAt, job.endsAt, worksheet.timeZone)
      : m.common.notAnswered;
  const [prepared] = signed(worksheet, 'prepared');
  const [countersigned] = signed(worksheet, 'countersigned');
  const helpers = crew.filter((member) => !member.lead);
  const building = job?.occupied === false ? words.empty : words.occupied;
  const unknown = m.common.notAnswered;
  const width = PAGE.textWidth - QR - 10;
  return {
    columns: [
      {
        width,
        stack: [
          blockRow(width, [172, '*', 146], framed, [
            cell(words.siteAndArea, place || unknown),
            cell(words.equipment, job?.equipment ?? unknown),
            cell(words.planned, planned),
          ]),
          blockRow(width, [94, '*', 94, 62, 48], framedBelow, [
            cell(words.lead, nameAndTime(context, worksheet.leadName, prepared)),
            cell(words.crew(helpers.length), helperNames(context, helpers)),
            cell(
              words.countersigned,
              countersigned
                ? nameAndTime(context, countersigned.signer.name, countersigned)
                : words.notYet,
            ),
            cell(words.workOrder, job?.workOrder ?? words.none),
            cell(words.building, building),
          ]),
        ],
      },
      check(context),
    ],
    columnGap: 10,
  };
}

/** One row of the block: its columns have widths of their own, its frame joins the next. */
function blockRow(
  width: number,
  columns: readonly (number | '*')[],
  layout: CustomTableLayout,
  cells: TableCell[],
): Content {
  // Padding and lines come on top of the widths of the columns.
  const padding = columns.length * 12 + (columns.length - 1) * 0.75 + 3;
  const fixed = columns.reduce<number>((sum, each) => sum + (each === '*' ? 0 : each), 0);
  const widths = columns.map((each) => (each === '*' ? width - padding - fixed : each));
  return { table: { widths, body: [cells], dontBreakRows: true }, layout };
}

const NAMED_HELPERS = 3;

function helperNames(
  context: PdfContext,
  helpers: NonNullable<PdfContext['worksheet']['content']['crew']>,
): string {
  const { m, worksheet } = context;
  const words = m.pdf.block;
  if (helpers.length === 0) return words.none;
  const acknowledged = signed(worksheet, 'acknowledged');
  const named = helpers.slice(0, NAMED_HELPERS).map((member) => {
    const signature = acknowledged.find(({ signer }) => signer.id === member.userId);
    return nameAndTime(context, member.name ?? m.common.notKnown, signature);
  });
  const rest = helpers.length - named.length;
  return rest > 0 ? `${named.join('; ')} ${words.more(rest)}` : named.join('; ');
}

/** The code that leads to the public check of this revision. */
function check({ m, verifyUrl }: PdfContext): Column {
  return {
    width: QR,
    stack: [
      { svg: qrSvg(verifyUrl), width: QR, height: QR },
      cite(m.pdf.checkTitle, { alignment: 'center', fontSize: 6.5, margin: [0, 1, 0, 0] }),
    ],
  };
}
