import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { calendarDate, dateText, dayText, timeText, zoneText } from '@/shared/format';
import type { WorksheetEvent } from '@/shared/record';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Button, StateSymbol, Text } from '../ui';
import { eventWords, revisionsOf } from './eventWords';
import { shortHash } from './hashGroups';

interface RowProps {
  event: WorksheetEvent;
  revision: number;
  timeZone: string;
  first: boolean;
  /** The date, where it is another day than the entry before. */
  day?: string;
  hashes: boolean;
  compact?: boolean;
}

function EventRow({ event, revision, timeZone, first, day, hashes, compact }: RowProps) {
  const words = useMessages();
  const { colors } = useTheme();
  const said = eventWords(event, words, revision);
  return (
    <View
      role="listitem"
      style={[styles.row, !first && { borderTopWidth: 1, borderTopColor: colors.hair }]}
    >
      <View style={compact === true ? styles.timeCompact : styles.time}>
        {day !== undefined && (
          <Text variant="label" weight="600">
            {day}
          </Text>
        )}
        <Text variant="note" color="ink2">
          {timeText(event.at, timeZone)}
        </Text>
      </View>
      <View style={styles.words}>
        <View style={styles.sentence}>
          {said.mark !== undefined && (
            <View style={styles.mark}>
              <StateSymbol state={said.mark} size={16} />
            </View>
          )}
          <Text variant={compact === true ? 'note' : 'answer'} style={styles.shrink}>
            {said.sentence}
          </Text>
        </View>
        {said.reason !== undefined && <Text variant="note">{said.reason}</Text>}
        {said.enteredBy !== undefined && (
          <Text variant="label" weight="400" color="ink2">
            {said.enteredBy}
          </Text>
        )}
        {hashes && (
          <Text variant="cite" color="ink2" aria-label={event.hash}>
            {`${words.trail.eventHash}: ${shortHash(event.hash)}`}
          </Text>
        )}
      </View>
    </View>
  );
}

interface Props {
  events: readonly WorksheetEvent[];
  timeZone: string;
  /** In a narrow column: no hashes. */
  compact?: boolean;
}

/** The trail in words, oldest first, on the wall clock of the site. */
export function EventList({ events, timeZone, compact }: Props) {
  const { trail } = useMessages();
  const locale = useLocale();
  const [hashes, setHashes] = useState(false);
  const revisions = revisionsOf(events);
  const last = events.at(-1);
  const dates = events.map(({ at }) => calendarDate(at, timeZone));
  const rows = events.map((event, index) => {
    const date = dates[index] ?? '';
    const day = compact === true ? dayText(locale, event.at, timeZone) : dateText(locale, date);
    return (
      <EventRow
        key={event.seq}
        event={event}
        revision={revisions[index] ?? 1}
        timeZone={timeZone}
        first={index === 0}
        day={date === dates[index - 1] ? undefined : day}
        hashes={hashes}
        compact={compact}
      />
    );
  });
  return (
    <View>
      <View role="list">{rows}</View>
      {compact !== true && last !== undefined && (
        <View style={styles.foot}>
          <Text variant="label" weight="400" color="ink2">
            {`${trail.siteTime(zoneText(last.at, timeZone))}. ${trail.chained}`}
          </Text>
          <Button
            kind="quiet"
            iconEnd={hashes ? 'up' : 'down'}
            label={trail.details}
            aria-expanded={hashes}
            onPress={() => setHashes(!hashes)}
          />
        </View>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', gap: space.sm, paddingVertical: 9 },
  time: { width: 104, flexShrink: 0 },
  timeCompact: { width: 84, flexShrink: 0 },
  words: { flex: 1, minWidth: 0, gap: 2 },
  sentence: { flexDirection: 'row', gap: space.xs },
  mark: { paddingTop: 3 },
  shrink: { flexShrink: 1 },
  foot: { gap: space.xxs, paddingTop: space.xs },
});
