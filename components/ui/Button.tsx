import { Link, type Href } from 'expo-router';
import { Pressable, StyleSheet, View, type StyleProp, type ViewStyle } from 'react-native';
import { radius, rule, space, touch, type ColorName } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Icon } from './Icon';
import type { IconName } from './icons';
import { Text } from './Text';
import { webProps } from './webProps';

export type ButtonKind = 'primary' | 'secondary' | 'quiet' | 'stop' | 'onBar';

export interface ButtonProps {
  label: string;
  onPress?: () => void;
  /** Makes it a link to that place. */
  href?: Href;
  /** `stop`: the hand of the bars. `onBar`: on a red or ink bar. */
  kind?: ButtonKind;
  icon?: IconName;
  iconEnd?: IconName;
  /** 60 high: what signs, stops or jumps. */
  large?: boolean;
  /** Why it cannot be used now; shown inside it. */
  reason?: string;
  busy?: boolean;
  id?: string;
  /** What a screen reader says where the label alone is not enough. */
  'aria-label'?: string;
  'aria-expanded'?: boolean;
  'aria-pressed'?: boolean;
  'aria-controls'?: string;
  style?: StyleProp<ViewStyle>;
}

interface Look {
  text: ColorName;
  box: ViewStyle;
}

function useLook(kind: ButtonKind, usable: boolean): Look {
  const { colors } = useTheme();
  const edge = { borderWidth: rule.button, borderRadius: radius.control };
  if (!usable) return { text: 'ink2', box: { ...edge, borderColor: colors.ink2 } };
  if (kind === 'primary') {
    return {
      text: 'onBlue',
      box: { ...edge, borderColor: colors.blue, backgroundColor: colors.blue },
    };
  }
  if (kind === 'secondary') return { text: 'blue', box: { ...edge, borderColor: colors.blue } };
  if (kind === 'quiet') return { text: 'blue', box: { borderRadius: radius.control } };
  return {
    text: 'blue',
    box: { ...edge, borderColor: colors.field, backgroundColor: colors.field },
  };
}

function Inside({
  label,
  kind,
  icon,
  iconEnd,
  reason,
  color,
  large,
}: ButtonProps & { color: ColorName }) {
  if (kind === 'stop') {
    return (
      <View style={styles.upright}>
        <Icon name={icon ?? 'refuse'} color={color} />
        <Text variant="label" weight="700" color={color}>
          {label}
        </Text>
      </View>
    );
  }
  return (
    <>
      {icon !== undefined && <Icon name={icon} color={color} size={kind === 'quiet' ? 22 : 24} />}
      <View style={styles.words}>
        <Text
          variant="strong"
          weight={large ? '700' : '600'}
          color={color}
          style={[styles.label, kind === 'quiet' && styles.start]}
        >
          {label}
        </Text>
        {reason !== undefined && (
          <Text variant="label" color="ink2" style={styles.label}>
            {reason}
          </Text>
        )}
      </View>
      {iconEnd !== undefined && <Icon name={iconEnd} color={color} size={22} />}
    </>
  );
}

/** Whatever acts or leads on. It holds two lines, since Spanish runs longer. */
export function Button(props: ButtonProps) {
  const { kind = 'secondary', href, onPress, large, reason, busy, id, style } = props;
  const usable = reason === undefined && busy !== true;
  const look = useLook(kind, usable);
  const aria = webProps({
    'aria-label': props['aria-label'],
    'aria-expanded': props['aria-expanded'],
    'aria-pressed': props['aria-pressed'],
    'aria-controls': props['aria-controls'],
    'aria-busy': busy,
  });
  const box = StyleSheet.flatten([
    styles.box,
    kind === 'quiet' && styles.quiet,
    kind === 'stop' && styles.stop,
    (large === true || kind === 'onBar') && styles.large,
    look.box,
    style,
  ]);
  const inside = <Inside {...props} kind={kind} color={look.text} />;
  const named = id === undefined ? {} : { id };
  if (href !== undefined && usable) {
    // `Link` hands its child a style that is an object, never one that depends on the press.
    return (
      <Link href={href} asChild>
        <Pressable role="link" {...aria} {...named} style={box}>
          {inside}
        </Pressable>
      </Link>
    );
  }
  return (
    <Pressable
      role={href === undefined ? 'button' : 'link'}
      {...aria}
      {...named}
      disabled={!usable}
      onPress={href === undefined ? onPress : undefined}
      style={({ pressed }) => (pressed ? { ...box, ...styles.pressed } : box)}
    >
      {inside}
    </Pressable>
  );
}

const styles = StyleSheet.create({
  box: {
    minHeight: touch.control,
    paddingHorizontal: 18,
    paddingVertical: 6,
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'center',
    gap: 10,
  },
  quiet: {
    minHeight: touch.least,
    paddingHorizontal: 0,
    gap: 6,
    justifyContent: 'flex-start',
    alignSelf: 'flex-start',
  },
  stop: { minHeight: touch.act, width: touch.act, paddingHorizontal: 0, paddingVertical: 4 },
  large: { minHeight: touch.act },
  pressed: { opacity: 0.75 },
  upright: { alignItems: 'center' },
  words: { flexShrink: 1, gap: space.xxs / 2 },
  label: { textAlign: 'center' },
  start: { textAlign: 'left' },
});
