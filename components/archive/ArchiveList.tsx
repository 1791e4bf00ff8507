import { StyleSheet, View } from 'react-native';
import { calendarDate, dateText, volts } from '@/shared/format';
import type { Messages } from '@/shared/messages';
import type { WorksheetRow } from '@/shared/record';
import type { Locale } from '@/shared/user';
import { placeWords, rowMark, taskWords } from '../home/rowWords';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { ListRow, StateSymbol, Table, Text, type Column } from '../ui';
import { findingTitle } from './findingTitles';
import type { ArchiveAddress } from './useArchiveAddress';

/** Under this width the circuit has no column of its own. */
const WITH_CIRCUIT = 860;

function dayOf(row: WorksheetRow, locale: Locale): string {
  return dateText(locale, calendarDate(row.startsAt ?? row.createdAt, row.timeZone));
}

/** What was met on the way to the signature: the first by name, what was searched for before the others, the rest by number. */
function foundWords(
  row: WorksheetRow,
  asked: readonly string[],
  words: Messages,
): string | undefined {
  const met = row.metCodes ?? [];
  const [first, ...rest] = [
    ...met.filter((code) => asked.includes(code)),
    ...met.filter((code) => !asked.includes(code)),
  ];
  if (first === undefined) return undefined;
  const title = findingTitle(words, first);
  return rest.length === 0 ? title : `${title}, ${words.archive.andMore(rest.length)}`;
}

function Found({ row, asked }: { row: WorksheetRow; asked: readonly string[] }) {
  const words = useMessages();
  const found = foundWords(row, asked, words);
  if (found === undefined) {
    return (
      <Text variant="note" color="ink2">
        {words.archive.nothingFound}
      </Text>
    );
  }
  return (
    <View style={styles.marked}>
      <View style={styles.mark}>
        <StateSymbol state="stop" size={16} />
      </View>
      <Text variant="note" style={styles.shrink}>
        {found}
      </Text>
    </View>
  );
}

function State({ row }: { row: WorksheetRow }) {
  const { enumerations } = useMessages();
  return (
    <View style={styles.marked}>
      <View style={styles.mark}>
        <StateSymbol state={rowMark(row)} size={16} />
      </View>
      <Text variant="note" style={styles.shrink}>
        {enumerations.state[row.state]}
      </Text>
    </View>
  );
}

function TaskAndPlace({ row }: { row: WorksheetRow }) {
  const words = useMessages();
  return (
    <View>
      <Text variant="note" weight="600">
        {taskWords(row, words)}
      </Text>
      <Text variant="label" weight="400" color="ink2">
        {`${placeWords(row, words)}. ${row.leadName}`}
      </Text>
    </View>
  );
}

interface Props {
  rows: readonly WorksheetRow[];
  address: ArchiveAddress;
  /** px that the list has. */
  width: number;
  onOpen: (row: WorksheetRow) => void;
}

function useColumns({ address, width }: Pick<Props, 'address' | 'width'>): Column<WorksheetRow>[] {
  const { archive } = useMessages();
  const locale = useLocale();
  const { filters, set } = address;
  const { sort } = filters;
  const direction = (key: 'createdAt' | 'number') =>
    sort === key ? 'ascending' : sort === `-${key}` ? 'descending' : undefined;
  const turn = (key: 'createdAt' | 'number') => () =>
    set({ sort: sort === `-${key}` ? key : `-${key}` });
  const circuit: Column<WorksheetRow> = {
    key: 'circuit',
    label: archive.columns.circuit,
    width: 60,
    cell: (row) => (row.circuitVolts === null ? '' : volts(locale, row.circuitVolts)),
  };
  return [
    {
      key: 'number',
      label: archive.columns.number,
      width: 106,
      cell: (row) => row.number,
      onSort: turn('number'),
      sorted: direction('number'),
    },
    {
      key: 'day',
      label: archive.columns.day,
      width: 92,
      cell: (row) => dayOf(row, locale),
      onSort: turn('createdAt'),
      sorted: direction('createdAt'),
    },
    {
      key: 'task',
      label: archive.columns.task,
      share: 1.6,
      cell: (row) => <TaskAndPlace row={row} />,
    },
    ...(width >= WITH_CIRCUIT ? [circuit] : []),
    {
      key: 'found',
      label: archive.columns.found,
      share: 1,
      cell: (row) => <Found row={row} asked={filters.finding} />,
    },
    { key: 'state', label: archive.columns.state, width: 128, cell: (row) => <State row={row} /> },
  ];
}

function PhoneList({
  rows,
  asked,
  onOpen,
}: Pick<Props, 'rows' | 'onOpen'> & { asked: readonly string[] }) {
  const words = useMessages();
  const locale = useLocale();
  return (
    <View role="list" aria-label={words.archive.list}>
      {rows.map((row, index) => (
        <View role="listitem" key={row.id}>
          <ListRow
            first={index === 0}
            mark={rowMark(row)}
            title={`${row.number}, ${dayOf(row, locale)}`}
            note={[
              taskWords(row, words),
              `${placeWords(row, words)}, ${row.leadName}`,
              words.enumerations.state[row.state],
              foundWords(row, asked, words),
            ]
              .filter((part) => part !== undefined)
              .join('. ')}
            onPress={() => onOpen(row)}
          />
        </View>
      ))}
    </View>
  );
}

/** What was found: a table from a tablet up, lines on a phone. */
export function ArchiveList({ rows, address, width, onOpen }: Props) {
  const { archive } = useMessages();
  const { isPhone } = useBreakpoint();
  const columns = useColumns({ address, width });
  if (isPhone) {
    return <PhoneList rows={rows} asked={address.filters.finding} onOpen={onOpen} />;
  }
  return (
    <View style={styles.table}>
      <Table
        label={archive.list}
        columns={columns}
        rows={rows}
        rowKey={(row) => row.id}
        selected={address.record}
        onOpen={onOpen}
      />
    </View>
  );
}

const styles = StyleSheet.create({
  table: { paddingLeft: space.sm },
  marked: { flexDirection: 'row', gap: space.xs },
  mark: { paddingTop: 3 },
  shrink: { flexShrink: 1 },
});
