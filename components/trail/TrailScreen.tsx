import { useQueries, useQuery, type UseQueryResult } from '@tanstack/react-query';
import { StyleSheet, View } from 'react-native';
import type { ReactNode } from 'react';
import type { WorksheetRecord } from '@/shared/record';
import { useMessages } from '../i18n/useMessages';
import { rule, space } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { Notice, Screen, Text, describeFault } from '../ui';
import { WithRecord } from '../worksheet/WithRecord';
import { Compare } from './Compare';
import { EventList } from './EventList';
import { RevisionBlock } from './RevisionBlock';
import {
  eventsQuery,
  revisionQuery,
  revisionsQuery,
  type Revision,
  type RevisionDetail,
} from './trailQueries';
import { UnalteredPanel } from './UnalteredPanel';

function Part({ title, children }: { title: string; children: ReactNode }) {
  const { colors } = useTheme();
  return (
    <View role="region" aria-label={title} style={[styles.part, { borderTopColor: colors.ink }]}>
      <Text variant="section" level={2} style={styles.partTitle}>
        {title}
      </Text>
      {children}
    </View>
  );
}

function Waiting({ error }: { error: unknown }) {
  const words = useMessages();
  if (error === null) return <Text color="ink2">{words.ui.loading}</Text>;
  return <Notice live>{describeFault(error, words)}</Notice>;
}

function Happened({ record }: { record: WorksheetRecord }) {
  const { trail } = useMessages();
  const events = useQuery(eventsQuery(record.id));
  return (
    <Part title={trail.happened}>
      {events.data === undefined ? (
        <Waiting error={events.error} />
      ) : (
        <EventList events={events.data.items} timeZone={record.timeZone} />
      )}
    </Part>
  );
}

interface RevisionsProps {
  record: WorksheetRecord;
  list: UseQueryResult<{ items: Revision[] }>;
  details: readonly UseQueryResult<RevisionDetail>[];
}

function Revisions({ record, list, details }: RevisionsProps) {
  const { trail } = useMessages();
  if (list.data === undefined) {
    return (
      <Part title={trail.revisions}>
        <Waiting error={list.error} />
      </Part>
    );
  }
  return (
    <Part title={trail.revisions}>
      <View role="list">
        {[...list.data.items].reverse().map((revision) => (
          <RevisionBlock
            key={revision.revision}
            worksheetId={record.id}
            number={record.number}
            revision={revision}
            current={revision.revision === record.revision}
            signatures={
              details.find(({ data }) => data?.revision === revision.revision)?.data?.signatures
            }
            timeZone={record.timeZone}
          />
        ))}
      </View>
    </Part>
  );
}

function Changed({ record, list, details }: RevisionsProps) {
  const { trail } = useMessages();
  const arrived = details.flatMap(({ data }) => (data === undefined ? [] : [data]));
  const complete = list.data !== undefined && arrived.length === list.data.items.length;
  return (
    <Part title={trail.differences}>
      {complete ? (
        <Compare key={arrived.length} record={record} revisions={arrived} />
      ) : (
        <Waiting error={details.find(({ error }) => error !== null)?.error ?? list.error} />
      )}
    </Part>
  );
}

function Trail({ record, stale }: { record: WorksheetRecord; stale: boolean }) {
  const words = useMessages();
  const { trail } = words;
  const { isWide } = useBreakpoint();
  const list = useQuery(revisionsQuery(record.id));
  const details = useQueries({
    queries: (list.data?.items ?? []).map(({ revision }) => revisionQuery(record.id, revision)),
  });
  const changed = <Changed record={record} list={list} details={details} />;
  return (
    <Screen
      title={trail.title}
      subtitle={trail.subtitle(record.number, record.revision)}
      width={isWide ? 'full' : 'column'}
      back={{
        label: trail.back,
        href: { pathname: '/worksheets/[worksheetId]', params: { worksheetId: record.id } },
      }}
    >
      {stale && <Notice icon="clock">{words.worksheet.asLastRead}</Notice>}
      <View style={isWide ? styles.two : undefined}>
        <View style={isWide && styles.half}>
          <View style={styles.unaltered}>
            <UnalteredPanel record={record} />
          </View>
          <Happened record={record} />
          {isWide && changed}
        </View>
        <View style={isWide && styles.half}>
          <Revisions record={record} list={list} details={details} />
          {!isWide && changed}
        </View>
      </View>
    </Screen>
  );
}

/** What happened to one worksheet, its revisions and what changed between them. */
export function TrailScreen({ worksheetId }: { worksheetId: string }) {
  const { trail } = useMessages();
  return (
    <WithRecord worksheetId={worksheetId} loading={trail.loading}>
      {(record, stale) => <Trail record={record} stale={stale} />}
    </WithRecord>
  );
}

const styles = StyleSheet.create({
  part: { borderTopWidth: rule.strong, paddingBottom: space.xl },
  partTitle: { paddingTop: space.sm, paddingBottom: space.xs },
  unaltered: { paddingBottom: space.xl },
  two: { flexDirection: 'row', alignItems: 'flex-start', gap: 48 },
  half: { flex: 1, minWidth: 0 },
});
