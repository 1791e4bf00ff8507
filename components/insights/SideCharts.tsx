import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import type { Insights } from '@/shared/insights';
import { useMessages } from '../i18n/useMessages';
import { rule, space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Text } from '../ui';
import { Amount, ChartLine, CountLine } from './Bar';
import type { InsightsAddress } from './useInsightsAddress';

function Part({ title, note, children }: { title: string; note?: string; children: ReactNode }) {
  const { colors } = useTheme();
  return (
    <View role="region" aria-label={title} style={[styles.part, { borderTopColor: colors.ink }]}>
      <View style={styles.head}>
        <Text variant="strong" level={2} style={styles.title}>
          {title}
        </Text>
        {note !== undefined && (
          <Text variant="note" color="ink2">
            {note}
          </Text>
        )}
      </View>
      <View role="list">{children}</View>
    </View>
  );
}

interface Props {
  data: Insights;
  address: InsightsAddress;
}

const inHundred = (count: number, all: number) => (all === 0 ? 0 : Math.round((count / all) * 100));

/** A large site meets more: only the rate is compared. */
function BySite({ data, address }: Props) {
  const { insights } = useMessages();
  const { colors } = useTheme();
  if (data.bySite.length === 0) return null;
  const most = Math.max(1, ...data.bySite.map((site) => inHundred(site.withStop, site.worksheets)));
  return (
    <Part title={insights.bySite} note={insights.inHundred}>
      {data.bySite.map(({ siteId, siteName, worksheets, withStop }, index) => {
        const name = siteName ?? insights.noSite;
        const rate = inHundred(withStop, worksheets);
        const said = `${insights.ofAll(withStop, worksheets)}, ${insights.rate(rate)}`;
        const href = siteId === null ? undefined : address.archive({ siteId });
        return (
          <ChartLine
            key={siteId ?? 'none'}
            href={href}
            first={index === 0}
            label={href === undefined ? `${name}: ${said}` : insights.openSite(name, said)}
          >
            <View style={styles.site}>
              <View style={styles.siteHead}>
                <Text variant="strong" weight="500" style={styles.shrink}>
                  {name}
                </Text>
                <Text variant="note" color="ink2">
                  {`${insights.ofAll(withStop, worksheets)}, `}
                  <Text variant="note" weight="700">
                    {insights.rate(rate)}
                  </Text>
                </Text>
              </View>
              <View
                aria-hidden
                style={{
                  width: `${(rate / most) * 100}%`,
                  minWidth: 2,
                  height: 20,
                  backgroundColor: href === undefined ? colors.ink : colors.blue,
                }}
              />
            </View>
          </ChartLine>
        );
      })}
    </Part>
  );
}

function StopLine(props: {
  name: string;
  note: string;
  count: number;
  first?: boolean;
  href?: Parameters<typeof ChartLine>[0]['href'];
}) {
  const { name, note, count, href } = props;
  return (
    <ChartLine href={href} first={props.first === true} label={`${name}: ${count}, ${note}`}>
      <Text variant="strong" style={styles.stopName}>
        {name}
      </Text>
      <Text variant="strong" weight="700" style={styles.stopCount}>
        {String(count)}
      </Text>
      <Text variant="note" color="ink2" style={styles.shrinkGrow}>
        {note}
      </Text>
    </ChartLine>
  );
}

/** Whoever said stop did right: the reasons are counted, never the people. */
function Stopped({ data, address }: Props) {
  const { insights, enumerations } = useMessages();
  const words: Readonly<Record<string, string>> = enumerations.stopReason;
  const said = data.stopsByReason.reduce((sum, { stops }) => sum + stops, 0);
  const most = Math.max(0, ...data.stopsByReason.map(({ stops }) => stops));
  return (
    <Part title={insights.stopped}>
      <StopLine
        first
        name={insights.voltageAtProof}
        note={insights.voltageNote}
        count={data.voltageAtProof}
        href={
          data.voltageAtProof > 0
            ? address.archive({ finding: 'absence.voltage-present' })
            : undefined
        }
      />
      <StopLine name={insights.overTime} note={insights.overNote} count={data.notClosedInTime} />
      <StopLine name={insights.saidStop} note={said === 0 ? insights.noStops : ''} count={said} />
      {data.stopsByReason.map(({ reason, stops }) => (
        <View key={reason ?? 'own'} role="listitem" style={styles.reason}>
          <Text variant="note" style={styles.shrinkGrow}>
            {reason === null ? insights.ownWords : (words[reason] ?? reason)}
          </Text>
          <View style={styles.reasonAmount}>
            <Amount count={stops} most={most} leads={false} height={14} />
          </View>
          <Text variant="note" weight="700" style={styles.figure}>
            {String(stops)}
          </Text>
        </View>
      ))}
    </Part>
  );
}

function Modes({ data, address }: Props) {
  const { insights, enumerations } = useMessages();
  const most = Math.max(0, ...data.byMode.map(({ worksheets }) => worksheets));
  return (
    <Part title={insights.byMode}>
      {data.byMode.map(({ mode, worksheets }, index) => {
        const name = mode === null ? insights.modeNotSaid : enumerations.mode[mode];
        return (
          <CountLine
            key={mode ?? 'none'}
            first={index === 0}
            name={name}
            count={worksheets}
            most={most}
            energized={mode === 'energized'}
            href={mode === null ? undefined : address.archive({ mode })}
            label={
              mode === null
                ? `${name}: ${insights.worksheets(worksheets)}`
                : insights.openFinding(name, worksheets)
            }
          />
        );
      })}
    </Part>
  );
}

function Verdicts({ data }: Pick<Props, 'data'>) {
  const { insights } = useMessages();
  const most = Math.max(0, ...data.byVerdict.map(({ worksheets }) => worksheets));
  return (
    <Part title={insights.byVerdict}>
      {data.byVerdict.map(({ verdict, worksheets }, index) => (
        <CountLine
          key={verdict}
          first={index === 0}
          name={insights.verdict[verdict]}
          count={worksheets}
          most={most}
          label={`${insights.verdict[verdict]}: ${insights.worksheets(worksheets)}`}
        />
      ))}
    </Part>
  );
}

/** Sites with their rates, stops at work, off or energized, verdicts: beside the charts or below them. */
export function SideCharts({ data, address }: Props) {
  const { insights } = useMessages();
  const { colors } = useTheme();
  return (
    <View style={styles.all}>
      <BySite data={data} address={address} />
      <Stopped data={data} address={address} />
      <Modes data={data} address={address} />
      <Verdicts data={data} />
      <View style={[styles.foot, { borderTopColor: colors.ink }]}>
        <Text variant="label" weight="400" color="ink2">
          {insights.foot}
        </Text>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  all: { gap: space.lg },
  part: { borderTopWidth: rule.strong },
  head: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'baseline',
    justifyContent: 'space-between',
    columnGap: space.sm,
    paddingTop: 9,
    paddingBottom: 6,
  },
  title: { fontSize: 18 },
  site: { flex: 1, minWidth: 0, gap: 6 },
  siteHead: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    justifyContent: 'space-between',
    columnGap: space.sm,
  },
  shrink: { flexShrink: 1 },
  shrinkGrow: { flex: 1, minWidth: 0 },
  stopName: { width: 120 },
  stopCount: { width: 34 },
  reason: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.sm,
    paddingLeft: space.md,
    paddingVertical: 4,
  },
  reasonAmount: { width: 120 },
  figure: { minWidth: 24, textAlign: 'right' },
  foot: { borderTopWidth: rule.strong, paddingTop: space.sm },
});
