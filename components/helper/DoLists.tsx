import { StyleSheet, View } from 'react-native';
import type { CrewMember } from '@/hazard';
import { distance } from '@/shared/format';
import type { WorksheetRecord } from '@/shared/record';
import { useUnits } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Icon, Text, type IconName } from '../ui';
import { lowerFirst } from '../signing/lowerFirst';
import { closenessOf, firstName, groundedInReach } from './brief';

function Lines({ lines, icon }: { lines: readonly string[]; icon: IconName }) {
  const { colors } = useTheme();
  return (
    <View role="list">
      {lines.map((line, index) => (
        <View
          key={line}
          role="listitem"
          style={[styles.line, index > 0 && { borderTopWidth: 1, borderTopColor: colors.hair }]}
        >
          <Icon name={icon} strokeWidth={2.6} />
          <Text variant="answer" style={styles.words}>
            {line}
          </Text>
        </View>
      ))}
    </View>
  );
}

interface Props {
  record: WorksheetRecord;
  member: CrewMember;
}

/** What this person may not do here. */
export function DoNots({ record, member }: Props) {
  const words = useMessages();
  const units = useUnits();
  const { doNots } = words.helper;
  const closeness = closenessOf(member, record.content, record.assessment);
  const surfaces = groundedInReach(record.content);
  const first =
    closeness.kind === 'inside'
      ? doNots.bare
      : closeness.kind === 'barricade' || closeness.figure === null
        ? doNots.barricade
        : doNots.closer(distance(closeness.figure, units));
  const touch =
    surfaces.length === 0
      ? doNots.cable
      : surfaces.length === 1 && surfaces[0] === 'ceiling grid'
        ? doNots.grid
        : doNots.metal(
            surfaces.map((kind) => lowerFirst(words.enumerations.surfaceKind[kind])).join(', '),
          );
  const own = member.worksOnCircuit === true ? [] : [doNots.locks];
  const lines = [first, touch, doNots.switches, ...own];
  return (
    <Lines icon="close" lines={closeness.kind === 'inside' ? [first, ...lines.slice(2)] : lines} />
  );
}

/** What this person does. */
export function Dos({ record, member }: Props) {
  const { dos } = useMessages().helper;
  const { surroundings, job } = record.content;
  // Not answered counts as occupied and open to people.
  const people = job?.occupied !== false || surroundings?.peopleMayApproach !== false;
  const lines = [
    ...(people ? [dos.keepOut] : []),
    ...(member.worksOnCircuit === true ? [dos.lock] : [dos.watch(firstName(record.leadName))]),
    dos.stop,
  ];
  return <Lines icon="check" lines={lines} />;
}

const styles = StyleSheet.create({
  line: { flexDirection: 'row', gap: space.sm, paddingVertical: space.sm, minHeight: 48 },
  words: { flex: 1, minWidth: 0 },
});
