import { StyleSheet, View } from 'react-native';
import type { Assessment, Distance } from '@/hazard';
import { distance } from '@/shared/format';
import { useUnits } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { Text } from '../ui';
import { ZoneSwatch, type ZoneName } from '../worksheet/parts/ZoneSwatch';

interface Line {
  zone: ZoneName;
  value: Distance | 'avoid contact';
}

function linesOf({ boundaries, arcFlash, barricade }: Assessment): Line[] {
  if (boundaries === null || !boundaries.inTable) return [];
  const lines: [ZoneName, Line['value'] | null][] = [
    ['restricted', boundaries.restricted],
    ['limited', boundaries.movable ? boundaries.limitedMovable : boundaries.limitedFixed],
    ['arcFlash', arcFlash.arcFlashBoundary],
    ['barricade', barricade],
  ];
  return lines.flatMap(([zone, value]) => (value === null ? [] : [{ zone, value }]));
}

/** The distances as they are signed: swatch, figure, name. */
export function ZoneDistances({ assessment }: { assessment: Assessment }) {
  const { signing, worksheet } = useMessages();
  const units = useUnits();
  if (assessment.boundaries === null) {
    return <Text variant="answer">{worksheet.distancesNotKnown}</Text>;
  }
  if (!assessment.boundaries.inTable) return <Text variant="answer">{worksheet.notInTable}</Text>;
  return (
    <View style={styles.lines}>
      {linesOf(assessment).map(({ zone, value }) => (
        <View key={zone} style={styles.line}>
          <ZoneSwatch zone={zone} />
          <Text variant="strong" style={styles.words}>
            {value === 'avoid contact' ? worksheet.avoidContact : distance(value, units)}
            <Text color="ink2">{` ${signing.zone[zone]}`}</Text>
          </Text>
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  lines: { gap: 6 },
  line: { flexDirection: 'row', alignItems: 'center', gap: space.sm },
  words: { flexShrink: 1 },
});
