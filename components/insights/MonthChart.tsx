import { Link, type Href } from 'expo-router';
import { Pressable, StyleSheet, View } from 'react-native';
import type { Insights } from '@/shared/insights';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { rule, space, touch } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { StateSymbol, Text } from '../ui';
import { Amount, ChartLine, EnergizedSquares, FEW } from './Bar';
import { lastDayOf, monthLabel, monthName } from './months';
import type { InsightsAddress } from './useInsightsAddress';

const HEIGHT = 136;
const UNIT = 14;

type Month = Insights['byMonth'][number];

interface ColumnProps {
  month: Month;
  label: string;
  spoken: string;
  most: number;
  href: Href | undefined;
}

/** One month: squares or a bar from the zero line, its count above, energized below. */
function Column({ month, label, spoken, most, href }: ColumnProps) {
  const { colors } = useTheme();
  const { worksheets } = month;
  const inside = (
    <>
      <View style={styles.stack}>
        {worksheets > 0 && (
          <Text variant="note" weight="700">
            {String(worksheets)}
          </Text>
        )}
        {most <= FEW ? (
          Array.from({ length: worksheets }, (_, index) => (
            <View key={index} style={[styles.unit, { backgroundColor: colors.blue }]} />
          ))
        ) : (
          <View
            style={[
              styles.bar,
              { height: (worksheets / most) * HEIGHT, backgroundColor: colors.blue },
            ]}
          />
        )}
      </View>
      <View style={[styles.foot, { borderTopColor: colors.ink }]}>
        <Text variant="label" weight="600" color={href === undefined ? 'ink2' : 'blue'}>
          {label}
        </Text>
        <EnergizedSquares count={month.energized} />
      </View>
    </>
  );
  if (href === undefined) {
    return (
      <View role="listitem" aria-label={spoken} style={styles.column}>
        {inside}
      </View>
    );
  }
  return (
    <View role="listitem" style={styles.cell}>
      <Link href={href} asChild>
        <Pressable role="link" aria-label={spoken} style={styles.column}>
          {inside}
        </Pressable>
      </Link>
    </View>
  );
}

function Line({ month, label, spoken, most, href, first }: ColumnProps & { first: boolean }) {
  return (
    <ChartLine href={href} label={spoken} first={first}>
      <Text variant="label" weight="600" style={styles.lineName}>
        {label}
      </Text>
      <View style={styles.lineAmount}>
        <Amount count={month.worksheets} most={most} leads={href !== undefined} height={18} />
      </View>
      <EnergizedSquares count={month.energized} />
      <Text variant="strong" weight="700">
        {String(month.worksheets)}
      </Text>
    </ChartLine>
  );
}

interface Props {
  byMonth: readonly Month[];
  months: readonly string[];
  address: InsightsAddress;
}

/** Worksheets month by month: columns from a tablet up, lines on a phone, where a column is no target. */
export function MonthChart({ byMonth, months, address }: Props) {
  const { insights } = useMessages();
  const locale = useLocale();
  const { colors } = useTheme();
  const { isPhone } = useBreakpoint();
  const found = new Map(byMonth.map((month) => [month.month, month]));
  const most = Math.max(0, ...byMonth.map(({ worksheets }) => worksheets));
  const energized = byMonth.reduce((sum, month) => sum + month.energized, 0);
  const asLines = isPhone || months.length > 14;
  const columns = months.map((key, index): ColumnProps => {
    const month = found.get(key) ?? { month: key, worksheets: 0, energized: 0 };
    const label = monthLabel(locale, key, asLines || index === 0 || key.endsWith('-01'));
    const spoken = insights.openMonth(monthName(locale, key), month.worksheets);
    const first = `${key}-01`;
    const last = lastDayOf(key);
    const span = {
      from: address.from !== undefined && address.from > first ? address.from : first,
      to: address.to !== undefined && address.to < last ? address.to : last,
    };
    const withEnergized =
      month.energized > 0 ? `${spoken}, ${insights.energizedIn(month.energized)}` : spoken;
    return {
      month,
      label,
      most,
      spoken: withEnergized,
      href: month.worksheets > 0 ? address.archive(span) : undefined,
    };
  });
  return (
    <View role="region" aria-label={insights.perMonth}>
      <View style={[styles.head, { borderBottomColor: colors.ink }]}>
        <Text variant="section" level={2} style={styles.title}>
          {insights.perMonth}
        </Text>
        {energized > 0 && (
          <View style={styles.key}>
            <StateSymbol state="energized" size={18} />
            <Text variant="label" weight="600">
              {insights.energizedEach(energized)}
            </Text>
          </View>
        )}
      </View>
      {asLines ? (
        <View role="list">
          {columns
            .filter(({ month }) => month.worksheets > 0)
            .map((column, index) => (
              <Line key={column.month.month} {...column} first={index === 0} />
            ))}
        </View>
      ) : (
        <View role="list" style={styles.columns}>
          {columns.map((column) => (
            <Column key={column.month.month} {...column} />
          ))}
        </View>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  head: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'baseline',
    justifyContent: 'space-between',
    columnGap: space.md,
    borderBottomWidth: rule.strong,
    paddingTop: space.lg,
    paddingBottom: 7,
  },
  title: { fontSize: 22, lineHeight: 28 },
  key: { flexDirection: 'row', alignItems: 'center', gap: space.xs },
  columns: { flexDirection: 'row', alignItems: 'stretch', paddingTop: space.sm },
  cell: { flex: 1, minWidth: 0, flexDirection: 'row' },
  column: { flex: 1, minWidth: 0, minHeight: touch.least, justifyContent: 'flex-end' },
  stack: {
    alignItems: 'center',
    justifyContent: 'flex-end',
    flexGrow: 1,
    gap: 3,
    paddingBottom: 3,
  },
  unit: { width: UNIT + 6, height: UNIT },
  bar: { width: '70%', marginBottom: -3 },
  foot: {
    alignItems: 'center',
    gap: 4,
    borderTopWidth: rule.strong,
    paddingTop: 6,
    minHeight: 52,
  },
  lineName: { width: 64 },
  lineAmount: { flex: 1, minWidth: 0 },
});
