import type { Content, ContentText, CustomTableLayout, TableCell } from 'pdfmake/interfaces';
import { text } from './text';

/** The light safety colours, on white. */
export const COLORS = {
  paper: '#FFFFFF',
  field: '#FFFFFF',
  ink: '#1B1916',
  ink2: '#494339',
  hair: '#B9B2A3',
  tone: '#F1EEE6',
  red: '#A6081C',
  onRed: '#FFFFFF',
  yellow: '#FFCF1A',
  onYellow: '#1B1916',
  zRed: '#B00A20',
  zOrange: '#C25700',
} as const;

/** Letter, 1/2 in margins, in pt; head and foot stand inside the margins of the text. */
export const PAGE = {
  width: 612,
  height: 792,
  side: 36,
  textWidth: 540,
  top: 62,
  bottom: 80,
} as const;

export const SIZE = { body: 9.75, label: 8.25, section: 13.5, title: 21 } as const;

type TextStyle = Omit<ContentText, 'text'>;

export const label = (words: string, style: TextStyle = {}) =>
  text(words, { fontSize: SIZE.label, color: COLORS.ink2, ...style });
export const medium = (words: string, style: TextStyle = {}) =>
  text(words, { font: 'Barlow Medium', ...style });
export const strong = (words: string, style: TextStyle = {}) =>
  text(words, { font: 'Barlow SemiBold', ...style });
export const bold = (words: string, style: TextStyle = {}) => text(words, { bold: true, ...style });
/** A source of a figure or a rule. */
export const cite = (words: string, style: TextStyle = {}) =>
  text(words, { fontSize: SIZE.label, color: COLORS.ink2, ...style });

/** A line across the column. */
export function rule(width: number, lineWidth = 1.5, margin: [number, number] = [0, 5]): Content {
  return {
    canvas: [{ type: 'line', x1: 0, y1: 0, x2: width, y2: 0, lineWidth, lineColor: COLORS.ink }],
    margin: [0, margin[0], 0, margin[1]],
  };
}

/** Hairlines between rows, a stronger line under a head, no lines between columns. */
export const rows: CustomTableLayout = {
  hLineWidth: (row, node) => (row === 0 ? 0 : row === node.table.body.length ? 0.5 : 0.5),
  vLineWidth: () => 0,
  hLineColor: () => COLORS.hair,
  paddingLeft: () => 0,
  paddingRight: (column, node) => (column === columnsOf(node.table.body) - 1 ? 0 : 8),
  paddingTop: () => 2.5,
  paddingBottom: () => 2.5,
};

/** A printed form: framed all around, lines between all cells. */
export const framed: CustomTableLayout = {
  hLineWidth: (row, node) => (row === 0 || row === node.table.body.length ? 1.5 : 0.75),
  vLineWidth: (column, node) =>
    column === 0 || column === columnsOf(node.table.body) ? 1.5 : 0.75,
  hLineColor: () => COLORS.ink,
  vLineColor: () => COLORS.ink,
  paddingLeft: () => 6,
  paddingRight: () => 6,
  paddingTop: () => 3,
  paddingBottom: () => 3.5,
};

/** The same below another one, whose last line is its first. */
export const framedBelow: CustomTableLayout = {
  ...framed,
  hLineWidth: (row, node) => (row === 0 ? 0 : row === node.table.body.length ? 1.5 : 0.75),
};

/** Figures under each other: thin frame, tight cells. */
export const matrix: CustomTableLayout = {
  ...framed,
  hLineWidth: () => 0.75,
  vLineWidth: () => 0.75,
  paddingLeft: () => 4,
  paddingRight: () => 4,
  paddingTop: () => 1,
  paddingBottom: () => 1.5,
};

function columnsOf(body: readonly (readonly unknown[])[]): number {
  return body[0]?.length ?? 0;
}

/** Room that a head keeps below itself, in pt: it never stands alone at the foot of a page. */
const KEPT = 44;

/** A head that moves to the next page unless something can follow it on this one. */
function keptWithNext(head: Content[], room = KEPT): Content {
  const spacer: Content = { canvas: [], margin: [0, room, 0, 0] };
  const back: Content = { canvas: [], margin: [0, -room, 0, 0] };
  return { stack: [{ stack: [...head, spacer], unbreakable: true }, back] };
}

/** The head of a section: a rule, its number and name, and what stands at the right. */
export function sectionHead({
  number,
  title,
  note,
  width,
  gap = 10,
  room,
}: {
  number?: number;
  title: string;
  note?: ContentText;
  width: number;
  gap?: number;
  /** What must fit below it on its page, in pt, where that is more than a line or two. */
  room?: number;
}): Content {
  const head: Content[] = [
    rule(width, 1.5, [gap, 3]),
    {
      columns: [
        ...(number === undefined
          ? []
          : [{ ...bold(String(number), { fontSize: SIZE.section }), width: 25 }]),
        { ...bold(title, { fontSize: SIZE.section }), width: '*' },
        ...(note ? [{ ...note, width: 'auto', alignment: 'right' as const }] : []),
      ],
      columnGap: 0,
      margin: [0, 0, 0, 3],
    },
  ];
  return keptWithNext(head, room);
}

/** A head inside a section. */
export function subhead(title: string): Content {
  return keptWithNext([strong(title, { margin: [0, 8, 0, 3], fontSize: 10.5 })]);
}

export const headCell = (words: string, style: TextStyle = {}): TableCell =>
  text(words, { font: 'Barlow Medium', fontSize: SIZE.label, color: COLORS.ink2, ...style });
