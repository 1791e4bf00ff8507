import { StyleSheet, View } from 'react-native';
import Svg, { Circle, Path, Rect } from 'react-native-svg';
import { space, type Colors } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { useMessages } from '../i18n/useMessages';
import { Text } from './Text';

export const MARK_STATES = [
  'complete',
  'open',
  'waits',
  'stop',
  'caution',
  'ready',
  'in-force',
  'not-proved',
  'proved',
  'energized',
] as const;
export type MarkState = (typeof MARK_STATES)[number];

const TICK = 'M5.5 10.3l3.2 3.2 6-6.5';

function drawing(state: MarkState, c: Colors) {
  switch (state) {
    case 'complete':
      return (
        <>
          <Circle cx={10} cy={10} r={9} fill={c.ink} />
          <Path d={TICK} stroke={c.paper} strokeWidth={2.2} />
        </>
      );
    case 'open':
      return <Path d="M10 2a8 8 0 1 0 8 8" stroke={c.ink} strokeWidth={2.6} />;
    case 'waits':
      return (
        <Circle cx={10} cy={10} r={8} stroke={c.ink2} strokeWidth={2} strokeDasharray="3.2 3.08" />
      );
    case 'stop':
      return (
        <>
          <Rect x={1} y={1} width={18} height={18} fill={c.red} />
          <Rect x={4} y={8} width={12} height={4} fill={c.onRed} />
        </>
      );
    case 'caution':
      return (
        <>
          <Path d="M10 1.5L19 18H1z" fill={c.yellow} stroke={c.onYellow} strokeWidth={1.4} />
          <Path d="M10 7v5.5M10 14.6v1.4" stroke={c.onYellow} strokeWidth={2} />
        </>
      );
    case 'ready':
      return (
        <>
          <Circle cx={10} cy={10} r={8.5} stroke={c.ink} strokeWidth={2} />
          <Path d={TICK} stroke={c.ink} strokeWidth={2.2} />
        </>
      );
    case 'not-proved':
      return (
        <>
          <Rect x={2} y={2} width={16} height={16} stroke={c.ink} strokeWidth={2} />
          <Circle cx={10} cy={10} r={3.2} fill={c.ink} />
        </>
      );
    case 'in-force':
    case 'proved':
      return <Rect x={1} y={1} width={18} height={18} fill={c.ink} />;
    case 'energized':
      return (
        <>
          <Rect
            x={1.75}
            y={1.75}
            width={16.5}
            height={16.5}
            fill={c.paper}
            stroke={c.ink}
            strokeWidth={1.5}
          />
          <Path
            d="M2.5 7.5l5-5M2.5 12.5l10-10M2.5 17.5l15-15M7.5 17.5l10-10M12.5 17.5l5-5M2.5 12.5l5 5M2.5 7.5l10 10M2.5 2.5l15 15M7.5 2.5l10 10M12.5 2.5l5 5"
            stroke={c.zRed}
            strokeWidth={1.3}
          />
        </>
      );
  }
}

/** The mark alone, hidden from screen readers: use it only where its word stands beside it. */
export function StateSymbol({ state, size = 20 }: { state: MarkState; size?: number }) {
  const { colors } = useTheme();
  return (
    <View aria-hidden style={{ width: size, height: size, flexShrink: 0 }}>
      <Svg width={size} height={size} viewBox="0 0 20 20" fill="none">
        {drawing(state, colors)}
      </Svg>
    </View>
  );
}

interface Props {
  state: MarkState;
  /** Instead of the state's own word. */
  word?: string;
  /** What follows the word: "3 of 4 open and held". */
  detail?: string;
  size?: number;
}

/** A mark and its word. A mark is never alone. */
export function StateMark({ state, word, detail, size = 18 }: Props) {
  const { ui } = useMessages();
  return (
    <View style={styles.row}>
      <View style={styles.symbol}>
        <StateSymbol state={state} size={size} />
      </View>
      <Text
        variant="note"
        weight="600"
        color={state === 'stop' ? 'redText' : 'ink'}
        style={styles.word}
      >
        {word ?? ui.state[state]}
        {detail !== undefined && (
          <Text variant="note" color="ink2">
            {`  ${detail}`}
          </Text>
        )}
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'flex-start', gap: space.xs },
  symbol: { paddingTop: 2 },
  word: { flexShrink: 1 },
});
