import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import type { Insights } from '@/shared/insights';
import { findingTitle } from '../archive/findingTitles';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { rule, space } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { Button, StateSymbol, Text } from '../ui';
import { Amount, ChartLine, FEW } from './Bar';
import { monthLabel } from './months';
import type { InsightsAddress } from './useInsightsAddress';

const SHOWN = 10;
const MONTHS_WIDTH = 208;
const STACK = 3;

type Finding = Insights['byFinding'][number];

/** One small square a worksheet, month by month; a column that is too high says its number. */
function MonthSquares({ finding, months }: { finding: Finding; months: readonly string[] }) {
  const { colors } = useTheme();
  const count = new Map(finding.byMonth.map(({ month, worksheets }) => [month, worksheets]));
  const wide = Math.max(4, Math.min(12, MONTHS_WIDTH / Math.max(1, months.length) - 5));
  return (
    <View aria-hidden style={[styles.months, { borderBottomColor: colors.ink }]}>
      {months.map((month) => {
        const all = count.get(month) ?? 0;
        return (
          <View key={month} style={styles.month}>
            {all > STACK ? (
              <Text variant="cite" weight="600">
                {String(all)}
              </Text>
            ) : (
              Array.from({ length: all }, (_, index) => (
                <View
                  key={index}
                  style={[styles.square, { width: wide, backgroundColor: colors.ink }]}
                />
              ))
            )}
          </View>
        );
      })}
    </View>
  );
}

interface Props {
  findings: readonly Finding[];
  months: readonly string[];
  address: InsightsAddress;
}

/** Which hazards keep coming back, the most frequent first; every row leads to its worksheets. */
export function FindingChart({ findings, months, address }: Props) {
  const words = useMessages();
  const locale = useLocale();
  const { insights } = words;
  const { colors } = useTheme();
  const { isPhone } = useBreakpoint();
  const [all, setAll] = useState(false);
  const shown = all ? findings : findings.slice(0, SHOWN);
  const most = findings[0]?.worksheets ?? 0;
  const [firstMonth, lastMonth] = [months[0], months.at(-1)];
  const withMonths = !isPhone && months.length > 1;
  return (
    <View role="region" aria-label={insights.byFinding}>
      <View style={[styles.head, { borderBottomColor: colors.ink }]}>
        <Text variant="section" level={2} style={styles.title}>
          {insights.byFinding}
        </Text>
        {withMonths && firstMonth !== undefined && lastMonth !== undefined && (
          <Text variant="label" weight="600" style={styles.monthsHead}>
            {insights.byMonth(
              monthLabel(locale, firstMonth, true),
              monthLabel(locale, lastMonth, true),
            )}
          </Text>
        )}
      </View>
      {findings.length === 0 && <Text color="ink2">{insights.noFindings}</Text>}
      <View role="list">
        {shown.map((finding, index) => {
          const title = findingTitle(words, finding.code);
          const name = (
            <View style={styles.name}>
              <StateSymbol state={finding.severity} size={18} />
              <Text variant="strong" style={styles.shrink}>
                {title}
              </Text>
            </View>
          );
          const amount = (
            <View style={styles.amount}>
              <View
                style={
                  most <= FEW
                    ? styles.shrink
                    : [styles.length, { maxWidth: `${(finding.worksheets / most) * 86}%` }]
                }
              >
                <Amount
                  count={finding.worksheets}
                  most={most <= FEW ? FEW : finding.worksheets}
                  squares={most <= FEW}
                  leads
                />
              </View>
              <Text variant="strong" weight="700">
                {String(finding.worksheets)}
              </Text>
            </View>
          );
          return (
            <ChartLine
              key={finding.code}
              first={index === 0}
              href={address.archive({ finding: finding.code })}
              label={insights.openFinding(title, finding.worksheets)}
            >
              {isPhone ? (
                <View style={styles.stacked}>
                  {name}
                  <View style={styles.under}>{amount}</View>
                </View>
              ) : (
                <>
                  <View style={styles.nameColumn}>{name}</View>
                  <View style={styles.amountColumn}>{amount}</View>
                  {withMonths && <MonthSquares finding={finding} months={months} />}
                </>
              )}
            </ChartLine>
          );
        })}
      </View>
      {findings.length > SHOWN && (
        <Button
          kind="quiet"
          iconEnd={all ? 'up' : 'down'}
          label={all ? insights.fewerFindings : insights.moreFindings(findings.length - SHOWN)}
          aria-expanded={all}
          onPress={() => setAll(!all)}
        />
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
  monthsHead: { width: MONTHS_WIDTH + 22 + space.md },
  name: { flexDirection: 'row', gap: 10, alignItems: 'center' },
  nameColumn: { flex: 5, minWidth: 0 },
  amountColumn: { flex: 4, minWidth: 0 },
  shrink: { flexShrink: 1 },
  amount: { flexDirection: 'row', alignItems: 'center', gap: space.xs },
  length: { flexShrink: 1, flexGrow: 1, minWidth: 0 },
  stacked: { flex: 1, minWidth: 0, gap: 6 },
  under: { paddingLeft: 28 },
  months: {
    width: MONTHS_WIDTH,
    height: 34,
    flexDirection: 'row',
    alignItems: 'flex-end',
    borderBottomWidth: 1.5,
    paddingBottom: 2,
  },
  month: { flex: 1, alignItems: 'center', gap: 2 },
  square: { height: 8 },
});
