import { StyleSheet, View } from 'react-native';
import { pathOf } from '@/hazard';
import { distance, list, number } from '@/shared/format';
import type { WorksheetRecord } from '@/shared/record';
import { useLocale, useUnits } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { Text } from '../ui';
import { lowerFirst } from '../signing/lowerFirst';
import { BodyCurrent } from './BodyCurrent';
import { firstName, groundedInReach, otherWays, touchOf } from './brief';

function Voltage({ record }: { record: WorksheetRecord }) {
  const words = useMessages();
  const locale = useLocale();
  const said = words.helper;
  const touch = touchOf(record.content, record.assessment);
  if (touch === null) return <Text variant="value">{said.voltsNotKnown}</Text>;
  const surfaces = groundedInReach(record.content).map((kind) =>
    lowerFirst(words.enumerations.surfaceKind[kind]),
  );
  const named = surfaces.length === 0 ? undefined : list(locale, surfaces);
  const between =
    touch.between === 'ground'
      ? named === undefined
        ? said.toGround
        : said.toGroundAt(named)
      : named === undefined
        ? said.betweenWires
        : said.betweenWiresAt(named);
  return (
    <View style={styles.voltage}>
      <Text variant="figureXl">
        {number(locale, touch.volts, 0)}
        <Text variant="figureL">{' V'}</Text>
      </Text>
      <Text variant="answer" style={styles.between}>
        {between}
      </Text>
    </View>
  );
}

/** What can hurt here: the voltage, what is still live, the current through a body. */
export function HurtBlock({ record }: { record: WorksheetRecord }) {
  const said = useMessages().helper;
  const units = useUnits();
  const { content, assessment } = record;
  const lead = firstName(record.leadName);
  const off = pathOf(content) === 'off';
  const ways = otherWays(content).map((kind) => said.ways[kind]);
  const boundary = assessment.arcFlash.arcFlashBoundary;
  return (
    <View style={styles.block}>
      <Voltage record={record} />
      <Text variant="body">
        {off ? said.off.before : said.energized.before}
        <Text weight="700">{off ? said.off.strong : said.energized.strong}</Text>
        {`${off ? said.off.after(lead) : said.energized.after} ${ways.join(' ')}`.trimEnd()}
      </Text>
      {boundary !== null && <Text>{said.arcFlash(distance(boundary, units))}</Text>}
      {assessment.touch !== null && <BodyCurrent touch={assessment.touch} />}
    </View>
  );
}

const styles = StyleSheet.create({
  block: { gap: space.sm },
  voltage: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    columnGap: space.md,
    rowGap: space.xs,
  },
  between: { flexGrow: 1, flexShrink: 1, flexBasis: 150 },
});
