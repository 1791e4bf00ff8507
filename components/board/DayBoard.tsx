import { Link } from 'expo-router';
import { useState } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import Svg, { Path } from 'react-native-svg';
import { textWidth } from '@/shared/drawing/textWidth';
import { timeText } from '@/shared/format';
import { links } from '../home/links';
import { inSentence, taskWords } from '../home/rowWords';
import { useMessages } from '../i18n/useMessages';
import { rule, space, touch } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { StateSymbol, Text } from '../ui';
import type { BoardRow } from './boardRows';
import { BAR_HEIGHT, DayBar, spanOf, type BarSpan } from './DayBar';
import { clockText, hoursOf, ticksOf, xOf, type Ruler } from './dayRuler';

const RULER_HEIGHT = 40;
const LABEL_GAP = 12;
const LABEL_SIZE = 16;

interface Track {
  ruler: Ruler;
  width: number;
  now: string;
}

/** Hours above, a tick every quarter of an hour, the present through all rows. */
function RulerHead({ ruler, width }: Track) {
  const { colors } = useTheme();
  const hours = hoursOf(ruler, width);
  const ticks = ticksOf(ruler, width)
    .map(({ minute, height }) => `M${xOf(minute, ruler, width)} ${RULER_HEIGHT}v-${height}`)
    .join('');
  return (
    <View style={styles.ruler}>
      {hours.map((minute) => {
        const x = xOf(minute, ruler, width);
        const last = minute === ruler.to;
        const align = minute === ruler.from ? styles.start : last ? styles.end : styles.middle;
        const left = minute === ruler.from ? x : last ? x - 60 : x - 30;
        return (
          <Text key={minute} variant="label" weight="400" style={[styles.hour, { left }, align]}>
            {clockText(minute)}
          </Text>
        );
      })}
      <View style={styles.overlay}>
        <Svg width={width} height={RULER_HEIGHT}>
          <Path d={ticks} stroke={colors.ink} strokeWidth={1.5} />
        </Svg>
      </View>
    </View>
  );
}

/** Hairlines of the hours and the line for now, from the top of the row to its foot. */
function Grid({ ruler, width, nowFrom = 0 }: Track & { nowFrom?: number }) {
  const { colors } = useTheme();
  const hours = hoursOf(ruler, width);
  return (
    <>
      {hours.map((minute) => (
        <View
          key={minute}
          style={[
            styles.line,
            { left: Math.min(xOf(minute, ruler, width), width - 1), backgroundColor: colors.hair },
          ]}
        />
      ))}
      <View
        style={[
          styles.now,
          { top: nowFrom, left: xOf(ruler.now, ruler, width) - 1, backgroundColor: colors.ink },
        ]}
      />
    </>
  );
}

/** Where the words of a row fit on its track: after the bar, before it, or not at all. */
function labelPlace(
  text: string,
  span: BarSpan | undefined,
  { ruler, width }: Track,
): { left: number } | undefined {
  const needed = textWidth(text, LABEL_SIZE, 600) + 4;
  const nowX = xOf(ruler.now, ruler, width);
  if (span === undefined) return needed < width ? { left: 0 } : undefined;
  let left = span.last + LABEL_GAP;
  if (nowX > left - LABEL_GAP && nowX < left + needed) left = nowX + LABEL_GAP;
  if (left + needed <= width) return { left };
  const before = span.start - LABEL_GAP - needed;
  const crossesNow = nowX > before - 4 && nowX < before + needed + 4;
  return before >= 0 && !crossesNow ? { left: before } : undefined;
}

function Name({ board, words, phone }: { board: BoardRow; words?: string; phone: boolean }) {
  const messages = useMessages();
  const { board: said } = messages;
  const { row } = board;
  const others = Math.max(0, row.crew.length - 1);
  const place = row.siteName ?? messages.home.noPlace;
  return (
    <Link href={links.worksheet(row.id)} asChild>
      <Pressable role="link" style={StyleSheet.flatten([styles.name, !phone && styles.nameWide])}>
        <View style={styles.mark}>
          <StateSymbol state={board.mark} size={18} />
        </View>
        <View style={styles.nameWords}>
          <Text variant="strong" color="blue" style={styles.title}>
            {`${row.number}, ${inSentence(taskWords(row, messages))}`}
          </Text>
          <Text variant="label" weight="400" color="ink2">
            {`${place}. ${said.crew(row.leadName, others)}`}
          </Text>
          {words !== undefined && (
            <Text variant="label" weight="600" color={board.mark === 'stop' ? 'redText' : 'ink'}>
              {words}
            </Text>
          )}
        </View>
      </Pressable>
    </Link>
  );
}

function Row({ board, track, phone }: { board: BoardRow; track: Track; phone: boolean }) {
  const { board: said } = useMessages();
  const { colors } = useTheme();
  const { row } = board;
  const { width, ruler, now } = track;
  const span = width > 0 ? spanOf(board, ruler, width, now) : undefined;
  const place = phone || width === 0 ? undefined : labelPlace(board.words, span, track);
  const planned =
    row.startsAt !== null && row.endsAt !== null
      ? said.window(timeText(row.startsAt, row.timeZone), timeText(row.endsAt, row.timeZone))
      : undefined;
  const label = [board.words, planned].filter((part) => part !== undefined).join(', ');
  return (
    <View
      role="listitem"
      style={[phone ? styles.rowPhone : styles.row, { borderTopColor: colors.hair }]}
    >
      <Name board={board} phone={phone} words={place === undefined ? board.words : undefined} />
      <View role="img" aria-label={label} style={phone ? styles.trackPhone : styles.track}>
        {width > 0 && (
          <>
            <Grid {...track} />
            {span !== undefined && (
              <View style={styles.bar}>
                <DayBar
                  board={board}
                  span={span}
                  width={width}
                  nowX={xOf(ruler.now, ruler, width)}
                />
              </View>
            )}
            {place !== undefined && (
              <Text
                variant="note"
                weight="600"
                color={board.mark === 'stop' ? 'redText' : 'ink'}
                numberOfLines={1}
                style={[styles.label, place, { backgroundColor: colors.paper }]}
              >
                {board.words}
              </Text>
            )}
            <View
              style={[
                styles.now,
                { left: xOf(ruler.now, ruler, width) - 1, backgroundColor: colors.ink },
              ]}
            />
          </>
        )}
      </View>
    </View>
  );
}

/** What is in force on the ruler of the day, with one line for now. */
export function DayBoard({
  rows,
  ruler,
  now,
}: {
  rows: readonly BoardRow[];
  ruler: Ruler;
  now: string;
}) {
  const { isPhone } = useBreakpoint();
  const { colors } = useTheme();
  const [width, setWidth] = useState(0);
  const track: Track = { ruler, width, now };
  return (
    <View>
      <View style={[styles.head, { borderBottomColor: colors.ink }]}>
        {!isPhone && <View style={styles.gap} />}
        <View
          style={styles.headTrack}
          onLayout={({ nativeEvent }) => setWidth(Math.round(nativeEvent.layout.width))}
        >
          {width > 0 && (
            <>
              <RulerHead {...track} />
              <View
                style={[
                  styles.now,
                  styles.nowHead,
                  { left: xOf(ruler.now, ruler, width) - 1, backgroundColor: colors.ink },
                ]}
              />
            </>
          )}
        </View>
      </View>
      <View role="list">
        {rows.map((board) => (
          <Row key={board.row.id} board={board} track={track} phone={isPhone} />
        ))}
      </View>
    </View>
  );
}

const NAME_WIDTH = 300;
const absolute = { position: 'absolute' } as const;

const styles = StyleSheet.create({
  head: { flexDirection: 'row', borderBottomWidth: rule.strong },
  gap: { width: NAME_WIDTH },
  headTrack: { flex: 1, minWidth: 0, height: RULER_HEIGHT },
  ruler: { height: RULER_HEIGHT },
  overlay: { ...absolute, left: 0, top: 0 },
  hour: { ...absolute, top: 2, width: 60 },
  start: { textAlign: 'left' },
  middle: { textAlign: 'center' },
  end: { textAlign: 'right' },
  row: { flexDirection: 'row', borderTopWidth: rule.fine, minHeight: 58 },
  rowPhone: { borderTopWidth: rule.fine, paddingTop: space.xs },
  name: {
    flexDirection: 'row',
    gap: space.xs,
    minHeight: touch.least,
    paddingVertical: 6,
    paddingRight: space.sm,
  },
  nameWide: { width: NAME_WIDTH, flexShrink: 0, paddingVertical: 8 },
  mark: { paddingTop: 2 },
  nameWords: { flex: 1, minWidth: 0 },
  title: { lineHeight: 22 },
  track: { flex: 1, minWidth: 0, justifyContent: 'center' },
  trackPhone: { height: BAR_HEIGHT + 2 * space.sm, justifyContent: 'center' },
  bar: { height: BAR_HEIGHT },
  line: { ...absolute, top: 0, bottom: 0, width: 1 },
  now: { ...absolute, top: 0, bottom: 0, width: 2 },
  nowHead: { top: 22 },
  label: { ...absolute, paddingHorizontal: 2 },
});
