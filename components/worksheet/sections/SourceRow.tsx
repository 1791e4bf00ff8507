import { useAtom } from 'jotai';
import { Pressable, StyleSheet, View } from 'react-native';
import { sectionOf } from '@/shared/sections';
import { useMessages } from '../../i18n/useMessages';
import { rule, space, touch } from '../../theme/tokens';
import { useBreakpoint } from '../../theme/useBreakpoint';
import { useTheme } from '../../theme/useTheme';
import { Button, Icon, StateSymbol, Text, type IconName, type MarkState } from '../../ui';
import { wordOf } from '../form/fieldWords';
import { useWorksheetForm } from '../form/WorksheetFormContext';
import { FindingPanels } from '../parts/FindingPanels';
import { openSectionsAtom } from '../worksheetAtoms';
import { SourceFields } from './SourceFields';

const ICON: Readonly<Record<string, IconName>> = {
  normal: 'breaker',
  'unswitched hot': 'breaker',
  generator: 'generator',
  'battery unit': 'connector-joined',
  'central inverter': 'inverter',
  traveler: 'traveler',
  'shared neutral': 'shared-neutral',
  control: 'control',
  backfeed: 'backfeed',
};

interface Props {
  index: number;
  /** In the folded section: no fold, no fields. */
  readOnly?: boolean;
  onRemove?: () => void;
}

function useSourceRow(index: number) {
  const words = useMessages();
  const { content, assessment } = useWorksheetForm();
  const source = content.sources?.[index] ?? {};
  const prefix = `/sources/${index}`;
  const findings = assessment.findings.filter(
    ({ path, code }) =>
      (path === prefix || path.startsWith(`${prefix}/`)) && sectionOf({ path, code }) === 'sources',
  );
  const has = (severity: string) => findings.some((finding) => finding.severity === severity);
  const state: MarkState = has('stop') ? 'stop' : has('open') ? 'open' : 'complete';
  const parted = source.openedAt === 'battery connector';
  const icon: IconName =
    source.kind === 'battery unit' && parted
      ? 'connector-parted'
      : (ICON[source.kind ?? ''] ?? 'question');
  const cells = [
    {
      label: words.fields['sources.openedAt'],
      value: source.openedAt && wordOf(words, 'openedAt', source.openedAt),
    },
    {
      label: words.fields['sources.held'],
      value: source.held && wordOf(words, 'held', source.held),
    },
    { label: words.fields['sources.lockNumber'], value: source.lockNumber },
  ];
  return { words, source, findings, state, icon, cells };
}

type Row = ReturnType<typeof useSourceRow>;

function Cells({ cells, words }: Row) {
  const { colors } = useTheme();
  return (
    <View style={styles.cells}>
      {cells.map(({ label, value }, index) => (
        <View
          key={label}
          style={[
            styles.cell,
            index > 0 && {
              borderLeftWidth: 1,
              borderLeftColor: colors.hair,
              paddingLeft: space.sm,
            },
          ]}
        >
          <Text variant="label" color="ink2">
            {label}
          </Text>
          <Text variant={value ? 'strong' : 'label'} color={value ? 'ink' : 'ink2'}>
            {value ?? words.ui.notAnswered}
          </Text>
        </View>
      ))}
    </View>
  );
}

function Head({ row, index, open }: { row: Row; index: number; open: boolean | undefined }) {
  const { isWide } = useBreakpoint();
  const { words, source, state, icon } = row;
  return (
    <>
      <View style={styles.number}>
        <Text variant="strong">{`3.${index + 1}`}</Text>
        <Icon name={icon} size={24} />
      </View>
      <View style={[styles.words, isWide && styles.wide]}>
        <View style={styles.name}>
          <Text variant="value">
            {source.kind === undefined
              ? words.worksheet.newSource
              : wordOf(words, 'sourceKind', source.kind)}
          </Text>
          {source.from !== undefined && (
            <Text variant="label" color="ink2" weight="400">
              {source.from}
            </Text>
          )}
        </View>
        <View style={isWide && styles.grow}>
          <Cells {...row} />
        </View>
      </View>
      <View style={styles.marks}>
        <StateSymbol state={state} />
        {open !== undefined && <Icon name={open ? 'up' : 'down'} color="blue" />}
      </View>
    </>
  );
}

/** One way it can be live: a line of its own, with its fields and its stops below it. */
export function SourceRow({ index, readOnly, onRemove }: Props) {
  const { colors } = useTheme();
  const row = useSourceRow(index);
  const { record } = useWorksheetForm();
  const [openRows, setOpenRows] = useAtom(openSectionsAtom);
  const key = `${record.id}/source/${row.source.id ?? index}`;
  const open = openRows[key] ?? false;
  const { words, source, state } = row;
  const edge =
    state === 'stop'
      ? { borderTopWidth: rule.strong, borderTopColor: colors.red }
      : { borderTopWidth: 1, borderTopColor: colors.hair };
  const name =
    source.kind === undefined
      ? words.worksheet.newSource
      : wordOf(words, 'sourceKind', source.kind);
  if (readOnly === true) {
    return (
      <View
        style={[styles.row, edge]}
        aria-label={`3.${index + 1} ${name}, ${words.ui.state[state]}`}
      >
        <View style={styles.head}>
          <Head row={row} index={index} open={undefined} />
        </View>
      </View>
    );
  }
  return (
    <View style={[styles.row, edge]}>
      <Pressable
        role="button"
        aria-expanded={open}
        aria-label={`3.${index + 1} ${name}, ${words.ui.state[state]}`}
        onPress={() => setOpenRows((before) => ({ ...before, [key]: !open }))}
        style={styles.head}
      >
        <Head row={row} index={index} open={open} />
      </Pressable>
      {open ? (
        <View style={styles.fields}>
          <SourceFields index={index} />
          <Button
            label={words.worksheet.removeSource(name)}
            icon="close"
            kind="quiet"
            onPress={onRemove}
          />
        </View>
      ) : (
        <FindingPanels findings={row.findings.filter(({ severity }) => severity === 'stop')} />
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { gap: space.sm, paddingBottom: space.sm },
  head: {
    flexDirection: 'row',
    gap: space.sm,
    minHeight: touch.act,
    paddingTop: space.sm,
    alignItems: 'flex-start',
  },
  number: { width: 36, gap: space.xxs },
  words: { flex: 1, minWidth: 0, gap: space.xs },
  wide: { flexDirection: 'row', alignItems: 'center' },
  name: { flexBasis: 180, flexGrow: 1, flexShrink: 1 },
  grow: { flex: 2 },
  marks: { alignItems: 'center', gap: space.sm },
  cells: { flexDirection: 'row', flexWrap: 'wrap', gap: space.sm },
  cell: { flexGrow: 1, flexBasis: 84, minWidth: 0 },
  fields: { gap: space.lg, paddingLeft: 0, paddingTop: space.xs },
});
