import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { calendarDate, dateText, reading } from '@/shared/format';
import type { WorksheetRecord } from '@/shared/record';
import { openUrl } from '../api/openUrl';
import { apiUrl } from '../api/request';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { placeText } from '../signing/SigningFacts';
import { rule, space, touch } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { EventList } from '../trail/EventList';
import { eventsQuery } from '../trail/trailQueries';
import { UnalteredPanel } from '../trail/UnalteredPanel';
import { Button, Icon, ListRow, Notice, StateMark, Text, describeFault } from '../ui';
import { NotProvedPanel } from '../worksheet/parts/NotProvedPanel';
import { worksheetQuery } from '../worksheet/worksheetQueries';
import { findingTitle } from './findingTitles';
import { Readings } from './Readings';

function Part({ title, note, children }: { title: string; note?: string; children: ReactNode }) {
  const { colors } = useTheme();
  return (
    <View role="region" aria-label={title} style={[styles.part, { borderTopColor: colors.ink }]}>
      <View style={styles.partHead}>
        <Text variant="strong" level={3} style={styles.partTitle}>
          {title}
        </Text>
        {note !== undefined && (
          <Text variant="label" weight="400" color="ink2">
            {note}
          </Text>
        )}
      </View>
      {children}
    </View>
  );
}

function Happened({ record }: { record: WorksheetRecord }) {
  const words = useMessages();
  const events = useQuery(eventsQuery(record.id));
  return (
    <Part title={words.archive.happened} note={record.assessment.edition}>
      {events.data === undefined ? (
        <Text variant="note" color="ink2">
          {events.isError ? describeFault(events.error, words) : words.ui.loading}
        </Text>
      ) : (
        <EventList compact events={events.data.items} timeZone={record.timeZone} />
      )}
    </Part>
  );
}

function LatestProof({ record }: { record: WorksheetRecord }) {
  const { archive } = useMessages();
  const locale = useLocale();
  const last = record.proofs.at(-1);
  const volts = (last?.proof.readings ?? []).flatMap(({ volts: read }) => read ?? []);
  if (last === undefined || volts.length === 0) return null;
  return (
    <Part
      title={archive.readings}
      note={archive.highest(reading(locale, Math.max(...volts)), volts.length)}
    >
      <Readings proof={last} />
    </Part>
  );
}

/** What this record met: each leads to the others that met the same. */
function FoundHere({ record }: { record: WorksheetRecord }) {
  const words = useMessages();
  const standing = record.assessment.findings
    .filter(({ severity }) => severity === 'stop')
    .map(({ code }) => code);
  const codes = [...new Set([...record.clearedStops.map(({ code }) => code), ...standing])];
  if (codes.length === 0) return null;
  return (
    <Part title={words.archive.foundHere}>
      <View role="list">
        {codes.map((code, index) => (
          <View role="listitem" key={code}>
            <ListRow
              first={index === 0}
              mark="stop"
              title={findingTitle(words, code)}
              action={words.archive.findOthers}
              href={{ pathname: '/archive', params: { finding: code } }}
            />
          </View>
        ))}
      </View>
    </Part>
  );
}

function Head({ record, onClose }: { record: WorksheetRecord; onClose?: () => void }) {
  const words = useMessages();
  const locale = useLocale();
  const { archive, enumerations } = words;
  const { task, description } = record.content.job ?? {};
  const at = record.content.job?.startsAt ?? record.createdAt;
  const day = dateText(locale, calendarDate(at, record.timeZone));
  return (
    <View style={styles.head}>
      <View style={styles.words}>
        <Text variant="note" weight="600" color="ink2">
          {archive.head(
            record.number,
            record.revision,
            enumerations.state[record.state].toLocaleLowerCase(locale),
          )}
        </Text>
        <Text variant="figureM" level={2}>
          {task === undefined ? words.home.noTask : enumerations.task[task]}
        </Text>
        <Text>{`${placeText(record, words)}. ${day}`}</Text>
        {description !== undefined && (
          <Text variant="note" color="ink2">
            {description}
          </Text>
        )}
      </View>
      {onClose !== undefined && (
        <Pressable
          role="button"
          aria-label={archive.closeRecord}
          onPress={onClose}
          style={styles.close}
        >
          <Icon name="close" color="blue" />
        </Pressable>
      )}
    </View>
  );
}

function Shown({ record, onClose }: { record: WorksheetRecord } & Omit<Props, 'id'>) {
  const words = useMessages();
  const locale = useLocale();
  const { archive } = words;
  const language = locale === 'es-MX' ? 'es' : 'en';
  const params = { worksheetId: record.id };
  return (
    <View style={styles.panel}>
      <Head record={record} onClose={onClose} />
      {record.state === 'in-force' && <NotProvedPanel record={record} />}
      {record.state === 'stopped' && record.reason !== null && (
        <StateMark
          state="stop"
          word={words.enumerations.state.stopped}
          detail={record.reason.byName}
        />
      )}
      <UnalteredPanel record={record} />
      <View style={styles.buttons}>
        <Button
          kind="primary"
          icon="document"
          label={archive.pdf}
          onPress={() => openUrl(apiUrl(`/worksheets/${record.id}/pdf?language=${language}`))}
          style={styles.grow}
        />
        <View style={styles.grow}>
          <Button
            label={archive.openInFull}
            href={{ pathname: '/worksheets/[worksheetId]', params }}
          />
        </View>
        <View style={styles.whole}>
          <Button
            icon="clock"
            label={archive.trail}
            href={{ pathname: '/worksheets/[worksheetId]/trail', params }}
          />
        </View>
      </View>
      <Happened record={record} />
      <LatestProof record={record} />
      <FoundHere record={record} />
    </View>
  );
}

interface Props {
  id: string;
  /** Beside the list: a cross at its head. */
  onClose?: () => void;
}

/** One record of the archive: whether it is unaltered, its PDF, what happened, what was read and met. */
export function RecordPanel({ id, ...rest }: Props) {
  const words = useMessages();
  const worksheet = useQuery(worksheetQuery(id));
  if (worksheet.data === undefined) {
    return (
      <View style={styles.panel}>
        {worksheet.isError ? (
          <Notice live>{describeFault(worksheet.error, words)}</Notice>
        ) : (
          <Text color="ink2">{words.archive.loadingRecord}</Text>
        )}
      </View>
    );
  }
  return <Shown record={worksheet.data} {...rest} />;
}

const styles = StyleSheet.create({
  panel: { gap: space.md },
  head: { flexDirection: 'row', gap: space.sm },
  words: { flex: 1, minWidth: 0, gap: 2 },
  close: {
    width: touch.least,
    height: touch.least,
    alignItems: 'center',
    justifyContent: 'center',
    marginTop: -space.xs,
    marginRight: -space.sm,
  },
  buttons: { flexDirection: 'row', flexWrap: 'wrap', gap: 10 },
  grow: { flexGrow: 1 },
  whole: { width: '100%' },
  part: { borderTopWidth: rule.strong },
  partHead: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    justifyContent: 'space-between',
    alignItems: 'baseline',
    columnGap: space.sm,
    paddingTop: 9,
    paddingBottom: 6,
  },
  partTitle: { fontSize: 18 },
});
