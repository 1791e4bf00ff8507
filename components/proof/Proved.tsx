import { router } from 'expo-router';
import { ScrollView, StyleSheet, View } from 'react-native';
import { amperes, list, number, timeText } from '@/shared/format';
import { textWidth } from '@/shared/drawing/textWidth';
import type { ProofRecord, WorksheetRecord } from '@/shared/record';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { rule, space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Button, SavedState, Screen, Text, VerdictBar } from '../ui';
import { provedTable } from './provedTable';
import { lowerFirst } from '../signing/lowerFirst';

function Panel({ at, points }: { at: string; points: readonly string[] }) {
  const said = useMessages().proof.proved;
  const locale = useLocale();
  const { colors } = useTheme();
  return (
    <View role="status" style={[styles.panel, { borderColor: colors.ink }]}>
      <View aria-hidden style={[styles.square, { backgroundColor: colors.ink }]} />
      <View style={styles.words}>
        <Text variant="figureM" level={1}>
          {said.title(at)}
        </Text>
        <Text variant="answer">{said.at(list(locale, points))}</Text>
      </View>
    </View>
  );
}

/** Wide enough for the longest word of a point's name, within reason. */
function pointColumn(names: readonly string[]): number {
  const words = names.flatMap((name) => name.split(' '));
  const longest = Math.max(...words.map((word) => textWidth(word, 17, 700)));
  return Math.min(Math.max(74, Math.ceil(longest) + 20), 180);
}

/** Every reading that counts: one row a point, one column a pair. */
function ReadingsTable({ proof, record }: { proof: ProofRecord; record: WorksheetRecord }) {
  const said = useMessages().proof.proved;
  const locale = useLocale();
  const { colors } = useTheme();
  const { columns, rows } = provedTable(proof.proof, record.content, said);
  const pointWidth = { width: pointColumn(rows.map(({ point }) => point)) };
  const line = { borderLeftWidth: rule.fine, borderLeftColor: colors.ink };
  return (
    <ScrollView horizontal contentContainerStyle={styles.scroll}>
      <View
        role="table"
        aria-label={said.readings}
        style={[styles.table, { borderColor: colors.ink }]}
      >
        <View role="row" style={styles.row}>
          <View role="columnheader" style={[styles.point, pointWidth]}>
            <Text variant="label">{said.point}</Text>
          </View>
          {columns.map((column) => (
            <View key={column} role="columnheader" style={[styles.cell, line]}>
              <Text variant="label" style={styles.middle}>
                {column}
              </Text>
            </View>
          ))}
        </View>
        {rows.map(({ point, volts }) => (
          <View
            key={point}
            role="row"
            style={[styles.row, { borderTopWidth: 1, borderTopColor: colors.ink }]}
          >
            <View role="rowheader" style={[styles.point, pointWidth]}>
              <Text variant="strong" weight="700">
                {point}
              </Text>
            </View>
            {volts.map((value, index) => (
              <View
                key={columns[index]}
                role="cell"
                style={[styles.cell, line, value === null && { backgroundColor: colors.tone }]}
              >
                {value !== null && (
                  <Text variant="strong" style={styles.middle}>
                    {Math.abs(value) < 10 ? value.toFixed(1) : number(locale, value, 1)}
                  </Text>
                )}
              </View>
            ))}
          </View>
        ))}
      </View>
    </ScrollView>
  );
}

interface Props {
  record: WorksheetRecord;
  proof: ProofRecord;
  onAgain: () => void;
}

/** Proved dead: where and when, by which readings, and what makes it live again. */
export function Proved({ record, proof, onAgain }: Props) {
  const words = useMessages();
  const locale = useLocale();
  const said = words.proof.proved;
  const { colors } = useTheme();
  const at = timeText(proof.at, record.timeZone);
  const { readings = [], neutralAmperes, storedEnergy, otherLiveParts } = proof.proof;
  const points = [...new Set(readings.flatMap(({ point }) => point ?? []))];
  const times = readings
    .flatMap((each) => each.at ?? [])
    .sort((one, other) => Date.parse(one) - Date.parse(other));
  const ends = record.content.job?.endsAt;
  const params = { worksheetId: record.id };
  const notes = [
    said.low,
    neutralAmperes === undefined ? undefined : said.neutral(amperes(locale, neutralAmperes)),
    storedEnergy === undefined
      ? undefined
      : said.stored(lowerFirst(words.enumerations.storedEnergy[storedEnergy])),
    said.by(proof.byName),
  ];
  const clock = (time: string | undefined) =>
    time === undefined ? at : timeText(time, record.timeZone);
  return (
    <Screen
      title={said.title(at)}
      hideTitle
      back={{
        label: words.proof.back,
        href: { pathname: '/worksheets/[worksheetId]', params },
      }}
      saved={<SavedState icon="sent">{words.proof.sent(at)}</SavedState>}
      bar={
        <VerdictBar
          tone="paper"
          mark="proved"
          word={words.proof.bar.proved}
          detail={words.proof.bar.provedDetail(
            at,
            ends === undefined ? '' : timeText(ends, record.timeZone),
          )}
          stop={{
            label: words.common.buttons.stop,
            onPress: () => router.push({ pathname: '/worksheets/[worksheetId]/stop', params }),
          }}
          action={{
            label: words.proof.bar.closeOut,
            href: { pathname: '/worksheets/[worksheetId]/close', params },
          }}
        />
      }
    >
      <View style={styles.body}>
        <Panel at={at} points={points} />
        <Text>
          <Text weight="700">{said.ended(at)}</Text>
          {` ${otherLiveParts === 'guarded' ? said.guarded : said.alone}`}
        </Text>
        <View style={[styles.block, { borderTopColor: colors.ink }]}>
          <View style={styles.blockHead}>
            <Text variant="section" level={2}>
              {said.readings}
            </Text>
            <Text variant="label" weight="400" color="ink2" style={styles.tester}>
              {said.tester(clock(times[0]), clock(times.at(-1)))}
            </Text>
          </View>
          <ReadingsTable proof={proof} record={record} />
          <Text variant="label" weight="400" color="ink2">
            {notes.filter(Boolean).join(' ')}
          </Text>
        </View>
        <View style={[styles.block, { borderTopColor: colors.ink }]}>
          <Text variant="section" level={2}>
            {said.againTitle}
          </Text>
          <Text variant="answer">{said.againBody}</Text>
          <Button large icon="meter" label={said.again} onPress={onAgain} />
        </View>
      </View>
    </Screen>
  );
}

const styles = StyleSheet.create({
  body: { gap: space.md, paddingTop: space.xs },
  panel: {
    flexDirection: 'row',
    alignItems: 'flex-start',
    gap: space.md,
    borderWidth: rule.strong,
    padding: space.md,
  },
  square: { width: 34, height: 34, flexShrink: 0 },
  words: { flex: 1, minWidth: 0, gap: 4 },
  block: { borderTopWidth: rule.strong, paddingTop: space.sm, gap: space.sm },
  blockHead: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'baseline',
    justifyContent: 'space-between',
    columnGap: space.md,
  },
  tester: { flexShrink: 1 },
  scroll: { flexGrow: 1 },
  table: { borderWidth: rule.strong, flexGrow: 1 },
  row: { flexDirection: 'row', alignItems: 'stretch' },
  point: { minHeight: 46, justifyContent: 'center', paddingHorizontal: space.xs },
  cell: { flexGrow: 1, flexBasis: 58, minWidth: 58, justifyContent: 'center', padding: 4 },
  middle: { textAlign: 'center' },
});
