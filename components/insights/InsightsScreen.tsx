import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import type { Insights } from '@/shared/insights';
import { FilterChip, FilterLine } from '../archive/FilterChip';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { layout, space } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import {
  Button,
  DateField,
  LoadingScreen,
  Notice,
  OfflineScreen,
  ProblemScreen,
  Screen,
  Text,
  describeFault,
} from '../ui';
import { useSites } from '../worksheet/registerQueries';
import { FindingChart } from './FindingChart';
import { insightsQuery } from './insightsQueries';
import { MonthChart } from './MonthChart';
import { chartMonths, monthLabel } from './months';
import { SideCharts } from './SideCharts';
import { SPANS, useInsightsAddress, type InsightsAddress } from './useInsightsAddress';

function Scope({ address }: { address: InsightsAddress }) {
  const { insights, archive } = useMessages();
  const { isPhone } = useBreakpoint();
  const sites = useSites();
  const { span, siteId, set } = address;
  const [own, setOwn] = useState(span === undefined);
  const names = { ...archive.span, all: insights.allTime };
  return (
    <View style={styles.scope}>
      <FilterLine label={insights.when} stacked={isPhone}>
        {SPANS.map((each) => (
          <FilterChip
            key={each}
            label={names[each]}
            chosen={span === each && !own}
            onPress={() => {
              setOwn(false);
              set({
                span: each === 'year' ? undefined : each,
                from: undefined,
                to: undefined,
              });
            }}
          />
        ))}
        <FilterChip label={insights.ownSpan} chosen={own} onPress={() => setOwn(!own)} />
      </FilterLine>
      {own && (
        <View style={styles.dates}>
          <View style={styles.date}>
            <DateField
              label={insights.from}
              value={address.from}
              onChange={(from) => set({ from, span: undefined })}
            />
          </View>
          <View style={styles.date}>
            <DateField
              label={insights.to}
              value={address.to}
              onChange={(to) => set({ to, from: address.from, span: undefined })}
            />
          </View>
        </View>
      )}
      {sites.length > 1 && (
        <FilterLine label={insights.site} stacked={isPhone}>
          {sites.map(({ id, name }) => (
            <FilterChip
              key={id}
              label={name}
              chosen={siteId === id}
              onPress={() => set({ siteId: siteId === id ? undefined : id })}
            />
          ))}
        </FilterLine>
      )}
    </View>
  );
}

function Summary({ data, months }: { data: Insights; months: readonly string[] }) {
  const { insights } = useMessages();
  const locale = useLocale();
  const findings = data.byFinding.reduce((sum, { worksheets }) => sum + worksheets, 0);
  const first = months[0];
  const last = months.at(-1);
  const parts = [insights.worksheets(data.worksheets), insights.findings(findings)];
  if (first !== undefined && last !== undefined) {
    const from = monthLabel(locale, first, true);
    parts.push(first === last ? from : insights.span(from, monthLabel(locale, last, true)));
  }
  return (
    <Text variant="note" color="ink2">
      {parts.join(', ')}
    </Text>
  );
}

/** Which hazards keep coming back: worksheets are counted, never people. */
export function InsightsScreen() {
  const words = useMessages();
  const { insights } = words;
  const { isWide } = useBreakpoint();
  const address = useInsightsAddress();
  const counts = useQuery(insightsQuery(address.query));

  if (counts.data === undefined) {
    if (counts.fetchStatus === 'paused') return <OfflineScreen what={insights.title} />;
    if (counts.isError) {
      return <ProblemScreen error={counts.error} onRetry={() => void counts.refetch()} />;
    }
    return <LoadingScreen label={insights.loading} />;
  }

  const { data } = counts;
  const months = chartMonths(
    address.from,
    address.to ?? address.today,
    data.byMonth.map(({ month }) => month),
  );
  const side = <SideCharts data={data} address={address} />;
  return (
    <Screen
      title={insights.title}
      place="insights"
      width={isWide ? 'full' : 'column'}
      titleEnd={<Summary data={data} months={months} />}
      asideWidth={layout.record}
      aside={isWide ? <View style={styles.aside}>{side}</View> : undefined}
    >
      <Scope address={address} />
      {counts.isError && <Notice live>{describeFault(counts.error, words)}</Notice>}
      {data.worksheets === 0 ? (
        <View style={styles.nothing}>
          <Text variant="value">{insights.nothing}</Text>
          {address.span !== 'all' && (
            <Button
              label={insights.allTime}
              onPress={() => address.set({ span: 'all', from: undefined, to: undefined })}
            />
          )}
        </View>
      ) : (
        <>
          <FindingChart findings={data.byFinding} months={months} address={address} />
          <MonthChart byMonth={data.byMonth} months={months} address={address} />
        </>
      )}
      {!isWide && <View style={styles.below}>{side}</View>}
    </Screen>
  );
}

const styles = StyleSheet.create({
  scope: { gap: 10 },
  dates: { flexDirection: 'row', flexWrap: 'wrap', gap: space.sm, maxWidth: 480 },
  date: { flex: 1, minWidth: 150 },
  aside: { padding: space.lg, paddingBottom: space.xxl },
  below: { paddingTop: space.xl },
  nothing: { gap: space.sm, paddingVertical: space.lg, alignItems: 'flex-start' },
});
