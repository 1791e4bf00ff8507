import Svg, { Circle, Path, Rect } from 'react-native-svg';
import { useTheme } from '../theme/useTheme';
import type { BoardRow } from './boardRows';
import { minuteOf, xOf, type Ruler } from './dayRuler';

export const BAR_HEIGHT = 32;
/** An overrun of a minute must still be seen. */
const LEAST_RED = 7;
const INSET = 1;

export interface BarSpan {
  start: number;
  /** Planned end. */
  end: number;
  /** Where the drawn bar ends: the present where it is over time. */
  last: number;
}

/** Where a row's bar lies on a track so wide, px; undefined where no window is planned. */
export function spanOf({ row, kind }: BoardRow, ruler: Ruler, width: number, now: string) {
  if (row.startsAt === null || row.endsAt === null) return undefined;
  const x = (at: string) => xOf(minuteOf(at, now, row.timeZone), ruler, width);
  const start = x(row.startsAt);
  const end = Math.max(start + 2, x(row.endsAt));
  if (kind === 'over') return { start, end, last: Math.max(end + LEAST_RED, x(now)) };
  if (kind === 'stopped') {
    const stopped = Math.max(start + LEAST_RED, x(row.updatedAt));
    return { start, end: stopped, last: stopped };
  }
  return { start, end, last: end };
}

/** Crossed diagonals inside a box, as one path. */
function crossed(x: number, width: number, height: number): string {
  const pitch = 6;
  const lines: string[] = [];
  for (let at = -height; at < width; at += pitch) {
    const from = Math.max(0, at);
    const to = Math.min(width, at + height);
    if (to > from) {
      lines.push(`M${x + from} ${from - at}L${x + to} ${to - at}`);
      lines.push(`M${x + from} ${height - (from - at)}L${x + to} ${height - (to - at)}`);
    }
  }
  return lines.join('');
}

function points(x: number, width: number): number[] {
  const pitch = 12;
  const count = Math.max(1, Math.floor(width / pitch));
  const first = x + (width - (count - 1) * pitch) / 2;
  return Array.from({ length: count }, (_, index) => first + index * pitch);
}

interface Props {
  board: BoardRow;
  span: BarSpan;
  nowX: number;
  width: number;
}

/** One window of work: elapsed and still to come, by pattern as well as by colour. */
export function DayBar({ board, span, nowX, width }: Props) {
  const { colors } = useTheme();
  const { start, end, last } = span;
  const { kind } = board;
  const elapsed = Math.max(0, Math.min(nowX, end) - start);
  const outline = (
    <Rect
      x={start + INSET}
      y={INSET}
      width={Math.max(1, end - start - 2 * INSET)}
      height={BAR_HEIGHT - 2 * INSET}
      fill="none"
      stroke={colors.ink}
      strokeWidth={2}
      strokeDasharray={kind === 'waits' ? '6 5' : undefined}
    />
  );
  const solid = (from: number, to: number, fill: string) => (
    <Rect x={from} y={0} width={Math.max(0, to - from)} height={BAR_HEIGHT} fill={fill} />
  );
  return (
    <Svg width={width} height={BAR_HEIGHT} viewBox={`0 0 ${width} ${BAR_HEIGHT}`} fill="none">
      {kind !== 'stopped' && solid(start, end, colors.paper)}
      {kind === 'stopped' && solid(start, last, colors.red)}
      {kind === 'over' && solid(start, end, colors.ink)}
      {kind === 'over' && solid(end, last, colors.red)}
      {kind === 'proved' && solid(start, start + elapsed, colors.ink)}
      {kind === 'energized' && elapsed > 0 && (
        <Path d={crossed(start, elapsed, BAR_HEIGHT)} stroke={colors.zRed} strokeWidth={1.5} />
      )}
      {kind === 'not-proved' &&
        elapsed > 4 &&
        points(start, elapsed).map((x) => (
          <Circle key={x} cx={x} cy={BAR_HEIGHT / 2} r={3} fill={colors.ink} />
        ))}
      {kind !== 'stopped' && kind !== 'over' && outline}
      {(kind === 'energized' || kind === 'not-proved') && elapsed > 0 && elapsed < end - start && (
        <Rect x={start + elapsed - 1} y={0} width={2} height={BAR_HEIGHT} fill={colors.ink} />
      )}
    </Svg>
  );
}
