import { useQueries, useQuery } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { dayText, timeText, zoneText } from '@/shared/format';
import type { WorksheetRow } from '@/shared/record';
import { useUser } from '../api/session';
import { deviceZone, useNow } from '../home/clock';
import { useLocale, useUnits } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { rule, space } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { LoadingScreen, Notice, OfflineScreen, ProblemScreen, Screen, Text } from '../ui';
import { worksheetQuery } from '../worksheet/worksheetQueries';
import { boardRowsQuery } from './boardQueries';
import { boardRows, waitsForPerson, type BoardRow } from './boardRows';
import { DayBoard } from './DayBoard';
import { rulerOf } from './dayRuler';
import { exceptionsOf } from './exceptions';
import { WaitingCard } from './WaitingCard';

interface PartProps {
  title: string;
  count?: string;
  level: 1 | 2;
  children: ReactNode;
}

function Part({ title, count, level, children }: PartProps) {
  return (
    <View role="region" aria-label={title}>
      <View style={styles.head}>
        <Text variant="title" level={level}>
          {title}
        </Text>
        {count !== undefined && <Text variant="answer">{count}</Text>}
      </View>
      {children}
    </View>
  );
}

function Waits({ rows, now }: { rows: readonly WorksheetRow[]; now: string }) {
  const words = useMessages();
  const locale = useLocale();
  const units = useUnits();
  const { role } = useUser();
  const { colors } = useTheme();
  const { board } = words;
  const records = useQueries({ queries: rows.map(({ id }) => worksheetQuery(id)) });
  const [chosen, setChosen] = useState<string>();
  const open = rows.some(({ id }) => id === chosen) ? chosen : rows[0]?.id;
  const counts = records.map(({ data }) =>
    data === undefined ? undefined : exceptionsOf(data, { words, locale, units }).length,
  );
  const total = counts.every((count) => count !== undefined)
    ? counts.reduce<number>((sum, count) => sum + count, 0)
    : undefined;
  const isSupervisor = role === 'supervisor';
  const title = isSupervisor ? board.waits : board.waitsForSupervisor;
  if (rows.length === 0) {
    return (
      <Part level={1} title={title}>
        <View style={[styles.nothing, { borderTopColor: colors.ink }]}>
          <Text color="ink2">
            {isSupervisor ? board.nothingWaits : board.nothingWaitsForSupervisor}
          </Text>
        </View>
      </Part>
    );
  }
  return (
    <Part level={1} title={title} count={board.waiting(rows.length, total)}>
      <View role="list">
        {rows.map((row, index) => {
          const record = records[index];
          return (
            record !== undefined && (
              <WaitingCard
                key={row.id}
                row={row}
                record={record}
                now={now}
                open={row.id === open}
                onOpen={() => setChosen(row.id)}
              />
            )
          );
        })}
      </View>
    </Part>
  );
}

/** One ruler a time zone: a line for now holds only on one wall clock. */
function byZone(rows: readonly BoardRow[]): [string, BoardRow[]][] {
  const zones = new Map<string, BoardRow[]>();
  for (const each of rows) {
    const { timeZone } = each.row;
    zones.set(timeZone, [...(zones.get(timeZone) ?? []), each]);
  }
  return [...zones.entries()];
}

function InForce({ rows, now }: { rows: readonly BoardRow[]; now: string }) {
  const locale = useLocale();
  const { board } = useMessages();
  const { colors } = useTheme();
  const of = (...kinds: BoardRow['kind'][]) =>
    rows.filter(({ kind }) => kinds.includes(kind)).length;
  const counts = board.counts(of('energized', 'not-proved', 'proved'), of('over'), of('stopped'));
  if (rows.length === 0) {
    return (
      <Part level={2} title={board.inForce}>
        <View style={[styles.nothing, { borderTopColor: colors.ink }]}>
          <Text color="ink2">{board.nothingInForce}</Text>
        </View>
      </Part>
    );
  }
  const zones = byZone(rows);
  return (
    <Part level={2} title={board.inForce} count={counts}>
      {zones.map(([timeZone, ofZone]) => (
        <View key={timeZone} style={styles.zone}>
          <Text
            variant="note"
            weight="500"
            color="ink2"
          >{`${dayText(locale, now, timeZone)}. ${board.zone(zoneText(now, timeZone))}. ${board.now(timeText(now, timeZone))}`}</Text>
          <DayBoard rows={ofZone} ruler={rulerOf(ofZone, now, timeZone)} now={now} />
        </View>
      ))}
    </Part>
  );
}

/** The supervisor's tablet: what waits for a signature, then what is in force right now. */
export function BoardScreen() {
  const user = useUser();
  const words = useMessages();
  const now = useNow();
  const { isWide } = useBreakpoint();
  const list = useQuery(boardRowsQuery());
  const { board } = words;

  if (list.data === undefined) {
    if (list.fetchStatus === 'paused') return <OfflineScreen what={board.title} />;
    if (list.isError)
      return <ProblemScreen error={list.error} onRetry={() => void list.refetch()} />;
    return <LoadingScreen label={board.loading} />;
  }

  const { items } = list.data;
  const zone = items[0]?.timeZone ?? deviceZone();
  const readAt = new Date(list.dataUpdatedAt).toISOString();
  const isSupervisor = user.role === 'supervisor';
  const waiting = items
    .filter((row) => (isSupervisor ? waitsForPerson(row, user) : row.state === 'countersign'))
    .sort((a, b) => a.updatedAt.localeCompare(b.updatedAt));
  const rows = boardRows(items, board, { user, now });
  return (
    <Screen title={board.title} place="board" width={isWide ? 'full' : 'column'} hideTitle>
      {list.isError && (
        <Notice icon="clock" live>
          {words.home.asLastSeen(timeText(readAt, zone))}
        </Notice>
      )}
      <View style={isWide ? styles.two : styles.one}>
        <View style={isWide && styles.waits}>
          <Waits rows={waiting} now={now} />
        </View>
        <View style={isWide && styles.force}>
          <InForce rows={rows} now={now} />
        </View>
      </View>
    </Screen>
  );
}

const styles = StyleSheet.create({
  head: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'baseline',
    justifyContent: 'space-between',
    columnGap: space.md,
    paddingTop: 14,
    paddingBottom: 10,
  },
  nothing: { borderTopWidth: rule.strong, paddingVertical: space.md },
  zone: { gap: space.xs, paddingBottom: space.md },
  one: {},
  two: { flexDirection: 'row', alignItems: 'flex-start', gap: 40 },
  waits: { flex: 5, minWidth: 0 },
  force: { flex: 6, minWidth: 0 },
});
