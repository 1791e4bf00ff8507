import type { ReactNode } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { radius, rule, space, touch } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Icon, Text, webProps } from '../ui';

interface ChipProps {
  label: string;
  chosen: boolean;
  onPress: () => void;
  'aria-label'?: string;
}

/** A filter that is on or off; a chosen one carries a cross, so that it survives a grey print. */
export function FilterChip({ label, chosen, onPress, ...rest }: ChipProps) {
  const { colors } = useTheme();
  return (
    <Pressable
      role="button"
      {...webProps({ 'aria-pressed': chosen, 'aria-label': rest['aria-label'] })}
      onPress={onPress}
      style={[
        styles.chip,
        { borderColor: colors.blue, backgroundColor: chosen ? colors.blue : colors.field },
      ]}
    >
      <Text
        variant="note"
        weight={chosen ? '600' : '500'}
        color={chosen ? 'onBlue' : 'ink'}
        style={styles.word}
      >
        {label}
      </Text>
      {chosen && <Icon name="close" size={16} color="onBlue" strokeWidth={2.6} />}
    </Pressable>
  );
}

/** A line of filters of one kind, its name before it; `inline` beside another on the same line. */
export function FilterLine({
  label,
  inline,
  stacked,
  children,
}: {
  label: string;
  inline?: boolean;
  /** The name above the chips: on a phone. */
  stacked?: boolean;
  children: ReactNode;
}) {
  return (
    <View
      role="group"
      aria-label={label}
      style={stacked === true ? styles.stacked : [styles.line, inline === true && styles.inline]}
    >
      <Text
        variant="label"
        color="ink2"
        style={stacked !== true && inline !== true && styles.label}
      >
        {label}
      </Text>
      <View style={styles.chips}>{children}</View>
    </View>
  );
}

const styles = StyleSheet.create({
  chip: {
    minHeight: touch.least,
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.xs,
    paddingHorizontal: space.sm,
    paddingVertical: 4,
    borderWidth: rule.middle,
    borderRadius: radius.control,
    flexShrink: 1,
  },
  word: { flexShrink: 1 },
  line: { flexDirection: 'row', alignItems: 'center', gap: space.xs, flexShrink: 1 },
  inline: { columnGap: space.sm },
  stacked: { gap: 6 },
  label: { width: 56, flexShrink: 0 },
  chips: { flexDirection: 'row', flexWrap: 'wrap', gap: space.xs, flexShrink: 1 },
});
