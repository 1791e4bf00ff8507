import { StyleSheet, View } from 'react-native';
import { CONDUCTORS } from '@/hazard/enumerations';
import { reading } from '@/shared/format';
import type { ProofRecord } from '@/shared/record';
import type { Proof } from '@/shared/worksheet';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { rule, space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Text } from '../ui';

type Reading = NonNullable<Proof['readings']>[number];

/** The highest of the readings of one pair, in whichever order its ends were written. */
function highest(readings: readonly Reading[], from: string, to: string): number | undefined {
  const taken = readings.flatMap((each) => {
    const same = (each.from === from && each.to === to) || (each.from === to && each.to === from);
    return same && each.volts !== undefined ? [each.volts] : [];
  });
  return taken.length === 0 ? undefined : Math.max(...taken);
}

function Matrix({ point, readings }: { point: string; readings: readonly Reading[] }) {
  const { enumerations } = useMessages();
  const locale = useLocale();
  const { colors } = useTheme();
  const used = CONDUCTORS.filter((each) =>
    readings.some(({ from, to }) => from === each || to === each),
  );
  const rows = used.slice(0, -1);
  const columns = used.slice(1);
  const line = { borderColor: colors.ink };
  return (
    <View style={styles.point}>
      {point !== '' && <Text variant="strong">{point}</Text>}
      <View role="table" aria-label={point} style={[styles.frame, line]}>
        <View role="row" style={styles.row}>
          <View role="cell" style={[styles.cell, styles.side]} />
          {columns.map((column) => (
            <View key={column} role="columnheader" style={[styles.cell, styles.inner, line]}>
              <Text variant="label" weight="600">
                {enumerations.conductor[column]}
              </Text>
            </View>
          ))}
        </View>
        {rows.map((row, index) => (
          <View key={row} role="row" style={[styles.row, styles.next, line]}>
            <View role="rowheader" style={[styles.cell, styles.side]}>
              <Text variant="label" weight="600">
                {enumerations.conductor[row]}
              </Text>
            </View>
            {columns.map((column, at) => {
              const value = at < index ? undefined : highest(readings, row, column);
              return (
                <View
                  key={column}
                  role="cell"
                  style={[
                    styles.cell,
                    styles.inner,
                    line,
                    at < index && { backgroundColor: colors.tone },
                  ]}
                >
                  <Text variant="strong" weight="700" numberOfLines={1}>
                    {value === undefined ? (at < index ? '' : '–') : reading(locale, value)}
                  </Text>
                </View>
              );
            })}
          </View>
        ))}
      </View>
    </View>
  );
}

/** The readings of one proof, a table for each point of work. */
export function Readings({ proof }: { proof: ProofRecord }) {
  const readings = proof.proof.readings ?? [];
  const points = [...new Set(readings.map(({ point }) => point ?? ''))];
  return (
    <View style={styles.points}>
      {points.map((point) => (
        <Matrix
          key={point}
          point={point}
          readings={readings.filter((each) => (each.point ?? '') === point)}
        />
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  points: { gap: space.sm },
  point: { gap: space.xxs },
  frame: { borderWidth: rule.strong },
  row: { flexDirection: 'row', alignItems: 'stretch' },
  next: { borderTopWidth: 1 },
  cell: {
    flex: 1,
    minWidth: 0,
    minHeight: 40,
    justifyContent: 'center',
    alignItems: 'center',
    paddingHorizontal: 4,
  },
  side: { flex: 0, flexBasis: 86, alignItems: 'flex-start', paddingLeft: 10 },
  inner: { borderLeftWidth: 1 },
});
