import { Pressable, ScrollView, StyleSheet, View } from 'react-native';
import { radius, rule, space, touch } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { Icon, Text, webProps } from '../ui';

export interface Chip {
  value: string;
  label: string;
  count: number;
}

interface Props {
  label: string;
  chips: readonly Chip[];
  value: string | undefined;
  onChange: (value: string | undefined) => void;
}

/** One line of filters with how many each would show; the chosen one is solid and takes itself off. */
export function FilterChips({ label, chips, value, onChange }: Props) {
  const { colors } = useTheme();
  const { isPhone, margin } = useBreakpoint();
  const shown = chips.filter((chip) => chip.count > 0 || chip.value === value);
  if (shown.length === 0) return null;
  const buttons = shown.map((chip) => {
    const chosen = chip.value === value;
    return (
      <Pressable
        key={chip.value}
        role="button"
        {...webProps({ 'aria-pressed': chosen })}
        onPress={() => onChange(chosen ? undefined : chip.value)}
        style={StyleSheet.flatten([
          styles.chip,
          { borderColor: colors.blue, backgroundColor: chosen ? colors.blue : colors.field },
        ])}
      >
        <Text variant="note" weight="500" color={chosen ? 'onBlue' : 'ink'}>
          {chip.label}
        </Text>
        <Text variant="note" weight="600" color={chosen ? 'onBlue' : 'ink2'}>
          {String(chip.count)}
        </Text>
        {chosen && <Icon name="close" color="onBlue" size={18} />}
      </Pressable>
    );
  });
  return (
    <View style={styles.line}>
      <Text variant="label" weight="400" color="ink2" style={styles.label}>
        {label}
      </Text>
      {isPhone ? (
        // On a phone a line of filters stays one line, and is pushed aside to see the rest.
        <ScrollView
          horizontal
          role="group"
          aria-label={label}
          showsHorizontalScrollIndicator={false}
          style={[styles.scroll, { marginRight: -margin }]}
          contentContainerStyle={[styles.scrolled, { paddingRight: margin }]}
        >
          {buttons}
        </ScrollView>
      ) : (
        <View role="group" aria-label={label} style={styles.chips}>
          {buttons}
        </View>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  line: { flexDirection: 'row', alignItems: 'flex-start', gap: space.xs },
  label: { width: 64, paddingTop: 14, flexShrink: 0 },
  chips: { flex: 1, flexDirection: 'row', flexWrap: 'wrap', gap: 10 },
  scroll: { flex: 1, minWidth: 0 },
  scrolled: { gap: 10 },
  chip: {
    minHeight: touch.least,
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.xs,
    paddingHorizontal: 14,
    borderWidth: rule.middle,
    borderRadius: radius.control,
  },
});
