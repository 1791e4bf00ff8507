import { StyleSheet, View } from 'react-native';
import { rule, space, type ColorName } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { useMessages } from '../i18n/useMessages';
import { Button, type ButtonProps } from './Button';
import { StateSymbol, type MarkState } from './StateMark';
import { Text } from './Text';

export interface VerdictBarProps {
  /** `stop` is red, `ink` the solid bar of "treat as live", `paper` everything else. */
  tone: 'stop' | 'paper' | 'ink';
  mark?: MarkState;
  /** Instead of the mark's word. */
  word?: string;
  /** "1 stop, 5 open". */
  detail?: string;
  action?: Pick<
    ButtonProps,
    'label' | 'onPress' | 'href' | 'icon' | 'iconEnd' | 'reason' | 'kind' | 'aria-label'
  >;
  /** The hand: two taps from anywhere stop the work. */
  stop?: { label: string; onPress: () => void };
}

/** The bar that stays at the foot (80 high): the verdict, and the way to the next point. */
export function VerdictBar({ tone, mark, word, detail, action, stop }: VerdictBarProps) {
  const { colors } = useTheme();
  const { ui } = useMessages();
  const { isPhone, margin } = useBreakpoint();
  const color: ColorName = tone === 'stop' ? 'onRed' : tone === 'ink' ? 'paper' : 'ink';
  const ground = tone === 'stop' ? colors.red : tone === 'ink' ? colors.ink : colors.paper;
  return (
    <View
      style={[
        styles.bar,
        {
          paddingLeft: margin,
          gap: isPhone ? space.xs : space.sm,
          backgroundColor: ground,
          borderTopColor: tone === 'paper' ? colors.ink : colors.paper,
        },
      ]}
    >
      {mark === 'stop' ? (
        <View aria-hidden style={[styles.stopMark, { backgroundColor: colors.onRed }]}>
          <View style={[styles.stopLine, { backgroundColor: colors.red }]} />
        </View>
      ) : (
        mark !== undefined && <StateSymbol state={mark} size={34} />
      )}
      <View role="status" aria-live={tone === 'stop' ? 'assertive' : 'polite'} style={styles.words}>
        <Text variant="figureM" color={color} style={isPhone && styles.tight}>
          {word ?? (mark === undefined ? '' : ui.state[mark])}
        </Text>
        {detail !== undefined && (
          <Text variant="note" weight="600" color={color} style={styles.detail}>
            {detail}
          </Text>
        )}
      </View>
      {stop !== undefined && <Button kind="stop" label={stop.label} onPress={stop.onPress} />}
      {action !== undefined && (
        <Button
          large
          kind={tone === 'paper' ? 'secondary' : 'onBar'}
          {...action}
          style={styles.action}
        />
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  bar: {
    minHeight: 80,
    flexDirection: 'row',
    alignItems: 'center',
    paddingVertical: 8,
    paddingRight: space.sm,
    borderTopWidth: rule.strong,
  },
  words: { flex: 1, minWidth: 0 },
  tight: { fontSize: 24, lineHeight: 28 },
  detail: { lineHeight: 20 },
  action: { maxWidth: '48%', paddingHorizontal: space.md },
  stopMark: { width: 32, height: 32, alignItems: 'center', justifyContent: 'center' },
  stopLine: { width: 22, height: 7 },
});
