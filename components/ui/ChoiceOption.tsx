import { Pressable, StyleSheet, View } from 'react-native';
import { radius, rule, space, touch, type ColorName } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import type { Option } from './Choice';
import { Icon } from './Icon';
import { StateSymbol } from './StateMark';
import { Text } from './Text';
import { webProps } from './webProps';

interface Props<T> {
  option: Option<T>;
  multiple: boolean;
  inRow: boolean;
  first: boolean;
  chosen: boolean;
  /** Whether Tab stops here; the arrow keys reach the others. */
  reachable: boolean;
  onPress: () => void;
}

/** The square or the ring before an answer; a chosen one holds a tick, so that it survives a grey print. */
export function ChoiceBox({
  multiple,
  chosen,
  usable,
}: {
  multiple: boolean;
  chosen: boolean;
  usable: boolean;
}) {
  const { colors } = useTheme();
  const edge = !usable ? colors.ink2 : chosen ? colors.onBlue : colors.blue;
  return (
    <View aria-hidden style={[styles.box, !multiple && styles.round, { borderColor: edge }]}>
      {chosen && <Icon name="check" size={18} color="onBlue" strokeWidth={2.4} />}
    </View>
  );
}

/** One answer of a choice. */
export function ChoiceOption<T>({
  option,
  multiple,
  inRow,
  first,
  chosen,
  reachable,
  onPress,
}: Props<T>) {
  const { colors } = useTheme();
  const usable = option.reason === undefined;
  const color: ColorName = chosen ? 'onBlue' : usable ? 'ink' : 'ink2';
  const note = option.reason ?? option.note;
  const edge = inRow
    ? { borderLeftWidth: first ? 0 : rule.middle, borderLeftColor: colors.blue }
    : { borderTopWidth: first ? 0 : rule.middle, borderTopColor: colors.blue };
  return (
    <Pressable
      role={multiple ? 'checkbox' : 'radio'}
      aria-checked={chosen}
      disabled={!usable}
      onPress={onPress}
      {...webProps({ tabIndex: reachable ? 0 : -1 })}
      style={({ pressed }) =>
        StyleSheet.flatten([
          styles.option,
          inRow && styles.inRow,
          edge,
          chosen && { backgroundColor: colors.blue },
          pressed && styles.pressed,
        ])
      }
    >
      {inRow ? (
        chosen && <Icon name="check" size={20} color="onBlue" strokeWidth={2.2} />
      ) : (
        <ChoiceBox multiple={multiple} chosen={chosen} usable={usable} />
      )}
      {option.icon !== undefined && <Icon name={option.icon} color={color} />}
      <View style={inRow ? styles.shrink : styles.words}>
        <Text
          variant="body"
          weight={chosen ? '600' : '500'}
          color={color}
          style={inRow && styles.middle}
        >
          {option.label}
        </Text>
        {note !== undefined && (
          <Text variant="label" weight="400" color={chosen ? 'onBlue' : 'ink2'}>
            {note}
          </Text>
        )}
      </View>
      {option.refused === true && chosen && <StateSymbol state="stop" size={22} />}
    </Pressable>
  );
}

const styles = StyleSheet.create({
  option: {
    minHeight: touch.control,
    paddingHorizontal: 14,
    paddingVertical: 6,
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.xs,
  },
  inRow: {
    flexGrow: 1,
    flexShrink: 1,
    flexBasis: 0,
    justifyContent: 'center',
    paddingHorizontal: space.xs,
  },
  pressed: { opacity: 0.75 },
  words: { flex: 1 },
  shrink: { flexShrink: 1 },
  middle: { textAlign: 'center' },
  box: {
    width: 26,
    height: 26,
    borderWidth: 2,
    borderRadius: radius.control,
    alignItems: 'center',
    justifyContent: 'center',
    flexShrink: 0,
  },
  round: { borderRadius: 13 },
});
