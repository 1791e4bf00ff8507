import type { UseQueryResult } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { dayText, durationText } from '@/shared/format';
import type { WorksheetRecord, WorksheetRow } from '@/shared/record';
import { useUser } from '../api/session';
import { links } from '../home/links';
import { placeWords, taskWords } from '../home/rowWords';
import { useLocale, useUnits } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { rule, space } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { factDifferences } from '../trail/factDifferences';
import { Button, Citation, Icon, StateSymbol, Text } from '../ui';
import { ReasonForm } from '../worksheet/parts/ReasonForm';
import { placeContent, useLastAtPlace } from './boardQueries';
import { exceptionsOf, type Exception } from './exceptions';

const MOST_DEVIATIONS = 4;

/** Under this width the two columns of a wide screen leave no room for a column of numbers. */
const NUMBER_BESIDE = 1500;

function useStacked(): boolean {
  const { isPhone, isWide, width } = useBreakpoint();
  return isPhone || (isWide && width < NUMBER_BESIDE);
}

function ExceptionLine({ exception, first }: { exception: Exception; first: boolean }) {
  const { colors } = useTheme();
  const { mark, icon, title, note, citation } = exception;
  return (
    <View
      role="listitem"
      style={[styles.exception, !first && { borderTopWidth: 1, borderTopColor: colors.hair }]}
    >
      <View style={styles.mark}>
        {mark !== undefined ? (
          <StateSymbol state={mark} size={22} />
        ) : (
          icon && <Icon name={icon} size={22} />
        )}
      </View>
      <View style={styles.words}>
        <Text variant="strong">{title}</Text>
        <Text variant="note" color="ink2">
          {note}
        </Text>
        {citation !== undefined && <Citation citation={citation} confidence={false} />}
      </View>
    </View>
  );
}

/** What differs from the last worksheet for the same equipment: supply, ways it can be live, arc flash. */
function Deviations({ record }: { record: WorksheetRecord }) {
  const words = useMessages();
  const locale = useLocale();
  const units = useUnits();
  const last = useLastAtPlace(record);
  if (last === undefined) return null;
  const options = { locale, units, timeZone: record.timeZone };
  const found = factDifferences(
    placeContent(last.content),
    placeContent(record.content),
    options,
    words.trail,
  );
  if (found.length === 0) return null;
  const lines = found.slice(0, MOST_DEVIATIONS).map(({ heading, label, before, after }) => {
    const name = heading === undefined ? label : `${heading}, ${label}`;
    const nothing = words.trail.notThere;
    return words.board.deviation(name, before ?? nothing, after ?? nothing);
  });
  const rest = found.length - lines.length;
  return (
    <ExceptionLine
      first={false}
      exception={{
        key: 'deviations',
        icon: 'document',
        title: words.board.deviates(found.length, last.number),
        note: [
          ...lines.map((line) => `${line}.`),
          ...(rest > 0 ? [`${words.board.more(rest)}.`] : []),
          words.board.deviatesNote(dayText(locale, last.createdAt, last.timeZone)),
        ].join(' '),
      }}
    />
  );
}

/** Read every field, send it back, or sign; a reason is asked for in its place. */
function Acts({ record }: { record: WorksheetRecord }) {
  const { board, worksheet } = useMessages();
  const { isPhone } = useBreakpoint();
  const [asking, setAsking] = useState(false);
  if (asking) {
    return (
      <ReasonForm
        worksheetId={record.id}
        act="return"
        label={worksheet.reasonFor.return}
        submit={board.sendBack}
        onCancel={() => setAsking(false)}
      />
    );
  }
  const open = record.questions.some(({ answer }) => answer === null);
  const mayReturn = record.actions.includes('return');
  const mayCountersign = record.actions.includes('sign:countersigned');
  return (
    <View style={[styles.acts, isPhone && styles.actsPhone]}>
      <Button
        icon="document"
        label={board.everyField}
        href={links.worksheet(record.id)}
        style={[styles.act, isPhone && styles.grow]}
      />
      {mayReturn && (
        <Button
          icon="left"
          label={board.sendBack}
          onPress={() => setAsking(true)}
          style={[styles.act, isPhone && styles.grow]}
        />
      )}
      {mayCountersign && (
        <Button
          kind="primary"
          icon="pen"
          label={board.countersign}
          reason={open ? board.heldByQuestion : undefined}
          href={{
            pathname: '/worksheets/[worksheetId]/sign/[meaning]',
            params: { worksheetId: record.id, meaning: 'countersigned' },
          }}
          style={[styles.act, styles.sign, isPhone && styles.signPhone]}
        />
      )}
    </View>
  );
}

interface Props {
  row: WorksheetRow;
  record: UseQueryResult<WorksheetRecord>;
  now: string;
  open: boolean;
  onOpen: () => void;
}

function Head({ row, now, open, end }: Pick<Props, 'row' | 'now' | 'open'> & { end: ReactNode }) {
  const messages = useMessages();
  const { board } = messages;
  const stacked = useStacked();
  const since = board.since(durationText(Date.parse(now) - Date.parse(row.updatedAt)));
  const crew = row.crew.length > 0 ? row.crew.map(({ name }) => name).join(', ') : row.leadName;
  const about = [
    placeWords(row, messages),
    crew,
    row.mode === 'energized' ? board.energized : board.off,
    board.revision(row.revision),
    ...(stacked || !open ? [since] : []),
  ];
  return (
    <View style={stacked ? styles.headPhone : styles.head}>
      <Text variant="section" weight="700" style={[styles.number, !stacked && styles.numberWide]}>
        {row.number}
      </Text>
      <View style={stacked ? undefined : styles.words}>
        <Text variant="section" level={3} style={styles.title}>
          {taskWords(row, messages)}
        </Text>
        <Text variant="note" color="ink2">{`${about.join('. ')}.`}</Text>
      </View>
      {!stacked && open && (
        <Text variant="note" weight="600" style={styles.since}>
          {since}
        </Text>
      )}
      {end}
    </View>
  );
}

/** One worksheet that waits for a countersignature: its exceptions first, then the three acts. */
export function WaitingCard({ row, record, now, open, onOpen }: Props) {
  const words = useMessages();
  const locale = useLocale();
  const units = useUnits();
  const { colors } = useTheme();
  const stacked = useStacked();
  const { role } = useUser();
  const { board } = words;
  const exceptions =
    record.data === undefined ? undefined : exceptionsOf(record.data, { words, locale, units });
  const inset = stacked ? undefined : styles.inset;
  return (
    <View role="listitem" style={[styles.card, { borderTopColor: colors.ink }]}>
      <Head
        row={row}
        now={now}
        open={open}
        end={
          open ? undefined : (
            <Button
              iconEnd="right"
              label={role === 'supervisor' ? board.readAndSign : board.read}
              onPress={onOpen}
              style={styles.read}
            />
          )
        }
      />
      <View style={[styles.exceptions, inset]}>
        {exceptions === undefined ? (
          <Text variant="note" color="ink2">
            {record.isError ? board.exceptionsNotRead : board.readingExceptions}
          </Text>
        ) : (
          <View role="list" style={[styles.list, { borderTopColor: colors.hair }]}>
            {exceptions.length === 0 && (
              <Text variant="note" color="ink2" style={styles.none}>
                {board.noExceptions}
              </Text>
            )}
            {exceptions.map((exception, index) => (
              <ExceptionLine key={exception.key} exception={exception} first={index === 0} />
            ))}
            {open && record.data !== undefined && <Deviations record={record.data} />}
          </View>
        )}
      </View>
      {open && record.data !== undefined && (
        <View style={inset}>
          <Acts record={record.data} />
        </View>
      )}
      {open && record.data === undefined && record.isError && (
        <View style={inset}>
          <Button icon="document" label={board.everyField} href={links.worksheet(row.id)} />
        </View>
      )}
    </View>
  );
}

const NUMBER_COLUMN = 144;

const styles = StyleSheet.create({
  card: {
    borderTopWidth: rule.strong,
    paddingTop: space.sm,
    paddingBottom: space.md,
    gap: space.xs,
  },
  head: { flexDirection: 'row', alignItems: 'flex-start', columnGap: space.md },
  headPhone: { gap: space.xxs },
  number: { fontSize: 20, lineHeight: 28 },
  numberWide: { width: NUMBER_COLUMN - space.md, flexShrink: 0 },
  title: { fontSize: 22, lineHeight: 28 },
  since: { lineHeight: 28, textAlign: 'right' },
  read: { marginTop: 2 },
  inset: { marginLeft: NUMBER_COLUMN },
  exceptions: {},
  list: { borderTopWidth: rule.fine },
  none: { paddingTop: space.xs },
  exception: { flexDirection: 'row', gap: space.sm, paddingVertical: 7 },
  mark: { width: 24, alignItems: 'center', paddingTop: 2 },
  words: { flex: 1, minWidth: 0, gap: 1 },
  acts: { flexDirection: 'row', gap: space.sm, flexWrap: 'wrap' },
  actsPhone: { gap: 10 },
  act: { minHeight: 56 },
  grow: { flexGrow: 1 },
  sign: { flexGrow: 1 },
  signPhone: { width: '100%', minHeight: 60 },
});
