import { useQuery } from '@tanstack/react-query';
import { StyleSheet, View } from 'react-native';
import { timeText } from '@/shared/format';
import { useUser } from '../api/session';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { rule, space } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import {
  Button,
  LoadingScreen,
  Notice,
  OfflineScreen,
  ProblemScreen,
  SavedState,
  Screen,
  Text,
} from '../ui';
import { deviceZone, todayTitle, useNow } from './clock';
import { homeGroups, type HomeGroups } from './groups';
import { HomeSection, RowList, WaitingList } from './HomeList';
import { homeRowsQuery } from './homeQueries';
import { links } from './links';
import { useKeptDrafts } from './useKeptDrafts';
import { waitsFor, type Waiting } from './waiting';

/** What a lead or a supervisor begins with; at the foot on a phone, where the thumb reaches. */
function Begin() {
  const { home } = useMessages();
  const { colors } = useTheme();
  const { isPhone, margin } = useBreakpoint();
  return (
    <View
      style={[
        styles.begin,
        isPhone
          ? [styles.beginPhone, { paddingHorizontal: margin, borderTopColor: colors.ink }]
          : styles.beginWide,
      ]}
    >
      <Button
        kind="primary"
        large={isPhone}
        icon="plus"
        label={home.create}
        href={links.newWorksheet}
        style={!isPhone && styles.grow}
      />
      <Button
        icon="document"
        large={isPhone}
        label={home.copy}
        href={links.archive}
        style={!isPhone && styles.grow}
      />
    </View>
  );
}

function Waits({ items }: { items: readonly Waiting[] }) {
  const { home } = useMessages();
  const { role } = useUser();
  return (
    <HomeSection title={home.waits} count={items.length > 0 ? String(items.length) : undefined}>
      {items.length > 0 ? (
        <WaitingList items={items} />
      ) : (
        <Text color="ink2">
          {role === 'helper'
            ? `${home.nothingWaits} ${home.nothingWaitsHelper}`
            : home.nothingWaits}
        </Text>
      )}
    </HomeSection>
  );
}

function Days({ groups }: { groups: HomeGroups }) {
  const { home } = useMessages();
  return (
    <>
      <HomeSection title={home.today} count={home.worksheets(groups.today.length)}>
        {groups.today.length > 0 ? (
          <RowList rows={groups.today} />
        ) : (
          <Text color="ink2">{home.nothingToday}</Text>
        )}
      </HomeSection>
      {groups.later.length > 0 && (
        <HomeSection title={home.later} count={home.worksheets(groups.later.length)}>
          <RowList rows={groups.later} />
        </HomeSection>
      )}
      {groups.earlier.length > 0 && (
        <HomeSection title={home.earlier} count={home.worksheets(groups.earlier.length)}>
          <RowList rows={groups.earlier} />
        </HomeSection>
      )}
      <Button kind="quiet" icon="search" label={home.find} href={links.archive} />
    </>
  );
}

/** The start page: what waits for the person, then the day. */
export function HomeScreen() {
  const user = useUser();
  const messages = useMessages();
  const locale = useLocale();
  const { home } = messages;
  const { isPhone, isWide } = useBreakpoint();
  const now = useNow();
  const kept = useKeptDrafts(user.id);
  const list = useQuery(homeRowsQuery());

  if (list.data === undefined) {
    if (list.fetchStatus === 'paused') return <OfflineScreen what={home.places.home} />;
    if (list.isError)
      return <ProblemScreen error={list.error} onRetry={() => void list.refetch()} />;
    return <LoadingScreen />;
  }

  const rows = list.data.items;
  const zone = rows[0]?.timeZone ?? deviceZone();
  const readAt = timeText(new Date(list.dataUpdatedAt).toISOString(), deviceZone());
  const waits = <Waits items={waitsFor(user, rows, messages)} />;
  const days = <Days groups={homeGroups(rows, now)} />;
  const mayBegin = user.role === 'lead' || user.role === 'supervisor';
  return (
    <Screen
      title={todayTitle(now, zone, locale, home.title)}
      place="home"
      width={isWide ? 'full' : 'column'}
      bar={isPhone && mayBegin ? <Begin /> : undefined}
      titleEnd={!isPhone && mayBegin ? <Begin /> : undefined}
      head={
        <View style={styles.kept}>
          <SavedState icon={kept > 0 ? 'kept' : 'sent'}>
            {`${kept > 0 ? home.keptHere(kept) : home.allSent}. ${home.asOf(readAt)}`}
          </SavedState>
          {list.isError && <Notice icon="clock">{home.asLastSeen(readAt)}</Notice>}
        </View>
      }
    >
      {isWide ? (
        <View style={styles.two}>
          <View style={styles.half}>{waits}</View>
          <View style={styles.half}>{days}</View>
        </View>
      ) : (
        <>
          {waits}
          {days}
        </>
      )}
    </Screen>
  );
}

const styles = StyleSheet.create({
  begin: { gap: 10 },
  beginPhone: { borderTopWidth: rule.strong, paddingVertical: space.sm },
  beginWide: { flexDirection: 'row', flexWrap: 'wrap' },
  grow: { flexGrow: 1 },
  kept: { gap: space.xs, paddingBottom: space.xs, marginTop: -space.xs },
  two: { flexDirection: 'row', alignItems: 'flex-start', gap: 48 },
  half: { flex: 1, minWidth: 0 },
});
