import { Pressable, StyleSheet, View } from 'react-native';
import { radius, rule, space, touch } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Icon, Text, webProps } from '../ui';

export interface Half {
  key: string;
  label: string;
  done: boolean;
}

interface Props {
  label: string;
  note?: string;
  halves: readonly Half[];
  onPress: (key: string) => void;
}

/** A control: one half a position, each pressed when that position was tried; solid when done. */
export function PressHalves({ label, note, halves, onPress }: Props) {
  const { colors } = useTheme();
  return (
    <View role="group" aria-label={label} style={styles.box}>
      <View>
        <Text variant="strong">{label}</Text>
        {note !== undefined && (
          <Text variant="label" weight="400" color="ink2">
            {note}
          </Text>
        )}
      </View>
      <View style={[styles.row, { borderColor: colors.blue, backgroundColor: colors.field }]}>
        {halves.map(({ key, label: word, done }, index) => (
          <Pressable
            key={key}
            role="checkbox"
            aria-checked={done}
            {...webProps({ 'aria-label': `${label}: ${word}` })}
            onPress={() => onPress(key)}
            style={[
              styles.half,
              done && { backgroundColor: colors.blue },
              index > 0 && {
                borderLeftWidth: rule.middle,
                borderLeftColor: done && halves[index - 1]?.done ? colors.onBlue : colors.blue,
              },
            ]}
          >
            {done && <Icon name="check" size={22} color="onBlue" strokeWidth={2.4} />}
            <Text variant="strong" color={done ? 'onBlue' : 'blue'}>
              {word}
            </Text>
          </Pressable>
        ))}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  box: { gap: space.xs },
  row: {
    flexDirection: 'row',
    borderWidth: rule.middle,
    borderRadius: radius.control,
    overflow: 'hidden',
  },
  half: {
    flex: 1,
    minHeight: touch.control,
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'center',
    gap: space.xs,
    paddingHorizontal: space.xs,
  },
});
