import { StyleSheet, View } from 'react-native';
import { sectionNumber } from '@/shared/sections';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { Text } from '../ui';
import type { FactDifference } from './factDifferences';

function Side({ label, value }: { label: string; value: string | undefined }) {
  const { trail } = useMessages();
  return (
    <View style={styles.side}>
      <Text variant="label" color="ink2">
        {label}
      </Text>
      <Text
        variant={value === undefined ? 'body' : 'answer'}
        color={value === undefined ? 'ink2' : 'ink'}
      >
        {value ?? trail.notThere}
      </Text>
    </View>
  );
}

function DifferenceRow({ difference }: { difference: FactDifference }) {
  const { trail } = useMessages();
  const { colors } = useTheme();
  const { isPhone } = useBreakpoint();
  const { heading, label, before, after } = difference;
  return (
    <View role="listitem" style={[styles.row, { borderTopColor: colors.hair }]}>
      <Text variant="strong">{heading === undefined ? label : `${heading}: ${label}`}</Text>
      <View style={isPhone ? styles.stacked : styles.sides}>
        <Side label={trail.was} value={before} />
        <Side label={trail.is} value={after} />
      </View>
    </View>
  );
}

/** What two revisions do not share, under the section that it stands in. */
export function DifferenceList({ found }: { found: readonly FactDifference[] }) {
  const { common, trail } = useMessages();
  if (found.length === 0) return <Text>{trail.same}</Text>;
  const sections = [...new Set(found.map(({ section }) => section))];
  sections.sort((a, b) => sectionNumber(a) - sectionNumber(b));
  return (
    <View style={styles.list}>
      <Text color="ink2">{trail.differ(found.length)}</Text>
      {sections.map((section) => (
        <View key={section}>
          <Text variant="value" level={3}>
            {`${sectionNumber(section)} ${common.sections[section]}`}
          </Text>
          <View role="list">
            {found
              .filter((difference) => difference.section === section)
              .map((difference, index) => (
                <DifferenceRow key={`${difference.path} ${index}`} difference={difference} />
              ))}
          </View>
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  list: { gap: space.md },
  row: { borderTopWidth: 1, paddingVertical: 9, gap: space.xxs },
  sides: { flexDirection: 'row', gap: space.md },
  stacked: { gap: space.xxs },
  side: { flex: 1, minWidth: 0 },
});
