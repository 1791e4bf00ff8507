import { StyleSheet, View } from 'react-native';
import { useTheme } from '../theme/useTheme';
import { Text } from '../ui';
import type { BarParts, Timeline } from './timeline';

const BAR = 22;
const ROW = 44;
/** The lines of the ruler run on through the padding of a row to the next one. */
const OVER = 9;

const box = ([left, width]: [number, number]) => ({ left, width });

/** The months above the bars, a label at each quarter. */
export function TimeRuler({ line }: { line: Timeline }) {
  const { colors } = useTheme();
  return (
    <View aria-hidden style={[styles.ruler, { width: line.width }]}>
      {line.ticks.map(({ at, label }) => (
        <View
          key={at}
          style={[
            styles.tick,
            { left: at, height: label === undefined ? 6 : 12, backgroundColor: colors.ink },
          ]}
        />
      ))}
      {line.ticks.map(
        ({ at, label }) =>
          label !== undefined &&
          at + 30 <= line.width && (
            <Text key={label + String(at)} variant="cite" style={[styles.month, { left: at }]}>
              {label}
            </Text>
          ),
      )}
    </View>
  );
}

interface Props {
  line: Timeline;
  parts: BarParts | undefined;
  /** Under the words of a row, not beside them: the ruler's lines end with the bar. */
  alone?: boolean;
}

/** One interval: elapsed solid, rest hollow, over red, not begun dashed; the line is today. */
export function TimeBar({ line, parts, alone }: Props) {
  const { colors } = useTheme();
  const reach = alone === true ? styles.within : styles.through;
  const { elapsed, rest, overdue, waiting, runsOn } = parts ?? {};
  return (
    <View aria-hidden style={[styles.row, alone !== true && styles.fill, { width: line.width }]}>
      {line.ticks.map(({ at }) => (
        <View key={at} style={[styles.line, reach, { left: at, backgroundColor: colors.hair }]} />
      ))}
      {waiting !== undefined && (
        <View
          style={[
            styles.bar,
            styles.dashed,
            runsOn && styles.openEnd,
            { borderColor: colors.ink },
            box(waiting),
          ]}
        />
      )}
      {rest !== undefined && rest[1] > 0 && (
        <View
          style={[
            styles.bar,
            styles.hollow,
            runsOn && styles.openEnd,
            { borderColor: colors.ink, backgroundColor: colors.paper },
            box(rest),
          ]}
        />
      )}
      {elapsed !== undefined && (
        <View style={[styles.bar, { backgroundColor: colors.ink }, box(elapsed)]} />
      )}
      {overdue !== undefined && (
        <View style={[styles.bar, { backgroundColor: colors.zRed }, box(overdue)]} />
      )}
      <View
        style={[
          styles.line,
          reach,
          styles.today,
          { left: line.today, backgroundColor: colors.ink },
        ]}
      />
    </View>
  );
}

const styles = StyleSheet.create({
  ruler: { height: 34 },
  tick: { position: 'absolute', bottom: -6, width: 1 },
  month: { position: 'absolute', top: 0 },
  row: { height: ROW },
  fill: { height: undefined, minHeight: ROW, flexGrow: 1 },
  line: { position: 'absolute', width: 1 },
  through: { top: -OVER, bottom: -OVER },
  within: { top: 4, bottom: 4 },
  today: { width: 2, marginLeft: -1 },
  bar: { position: 'absolute', top: '50%', marginTop: -BAR / 2, height: BAR },
  hollow: { borderWidth: 2 },
  openEnd: { borderRightWidth: 0 },
  dashed: { borderWidth: 2, borderStyle: 'dashed' },
});
