import { Link, type Href } from 'expo-router';
import type { ReactNode } from 'react';
import { Pressable, StyleSheet, View, type ViewStyle } from 'react-native';
import { space, touch } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Icon, StateSymbol, Text } from '../ui';

/** Up to here each worksheet is a square of its own; above, a bar from a zero line. */
export const FEW = 10;
const UNIT = 14;
const GAP = 3;
/** More crossed squares than this are no longer counted by eye. */
const MOST_SQUARES = 40;

interface AmountProps {
  count: number;
  /** The largest count beside it: the full length of a bar. */
  most: number;
  /** Blue where it leads on, ink where it only shows. */
  leads: boolean;
  height?: number;
  /** Whether each is a square; else decided by the largest count. */
  squares?: boolean;
}

/** A length for a count: squares while all counts are few, else a bar. */
export function Amount({ count, most, leads, height = 22, squares = most <= FEW }: AmountProps) {
  const { colors } = useTheme();
  const backgroundColor = leads ? colors.blue : colors.ink;
  if (squares) {
    return (
      <View aria-hidden style={styles.units}>
        {Array.from({ length: count }, (_, index) => (
          <View key={index} style={[styles.unit, { backgroundColor }]} />
        ))}
      </View>
    );
  }
  return (
    <View aria-hidden style={styles.zero}>
      <View
        style={{
          width: `${(count / most) * 100}%`,
          minWidth: count > 0 ? 3 : 0,
          height,
          backgroundColor,
        }}
      />
    </View>
  );
}

/** Energized worksheets are never stacked into a bar of another scale: one crossed square each. */
export function EnergizedSquares({ count, start }: { count: number; start?: boolean }) {
  return (
    <View aria-hidden style={[styles.squares, start === true && styles.fromStart]}>
      {Array.from({ length: count }, (_, index) => (
        <StateSymbol key={index} state="energized" size={16} />
      ))}
    </View>
  );
}

interface LineProps {
  /** Where the row leads; without it nothing in it is blue. */
  href?: Href;
  /** The whole row for a screen reader. */
  label: string;
  first: boolean;
  children: ReactNode;
  style?: ViewStyle;
}

/** One row of a chart: the row itself is what is pressed. */
export function ChartLine({ href, label, first, children, style }: LineProps) {
  const { colors } = useTheme();
  const box = StyleSheet.flatten([
    styles.line,
    { borderTopWidth: first ? 0 : 1, borderTopColor: colors.hair },
    style,
  ]);
  if (href === undefined) {
    return (
      <View role="listitem" aria-label={label} style={box}>
        {children}
      </View>
    );
  }
  return (
    <View role="listitem">
      <Link href={href} asChild>
        <Pressable role="link" aria-label={label} style={box}>
          {children}
          <Icon name="right" color="blue" size={22} strokeWidth={2.4} />
        </Pressable>
      </Link>
    </View>
  );
}

/** Name, length and count of one thing that is counted. */
export function CountLine({
  name,
  note,
  count,
  most,
  href,
  label,
  first,
  energized,
}: Omit<LineProps, 'children'> & {
  name: string;
  note?: string;
  count: number;
  most: number;
  /** Drawn as crossed squares. */
  energized?: boolean;
}) {
  return (
    <ChartLine href={href} label={label} first={first}>
      <View style={styles.countName}>
        <Text variant="strong">{name}</Text>
        {note !== undefined && (
          <Text variant="label" weight="400" color="ink2">
            {note}
          </Text>
        )}
      </View>
      <View style={styles.amount}>
        <View style={styles.grow}>
          {energized === true && count <= MOST_SQUARES ? (
            <EnergizedSquares count={count} start />
          ) : (
            <Amount count={count} most={most} leads={href !== undefined} height={18} />
          )}
        </View>
        <Text variant="strong" weight="700" style={styles.figure}>
          {String(count)}
        </Text>
      </View>
    </ChartLine>
  );
}

const styles = StyleSheet.create({
  units: { flexDirection: 'row', flexWrap: 'wrap', gap: GAP },
  unit: { width: UNIT, height: UNIT },
  zero: { width: '100%' },
  squares: { flexDirection: 'row', flexWrap: 'wrap', gap: 2, justifyContent: 'center' },
  fromStart: { justifyContent: 'flex-start' },
  line: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.md,
    minHeight: touch.least + 2,
    paddingVertical: 6,
  },
  countName: { flex: 5, minWidth: 0 },
  amount: { flex: 4, minWidth: 0, flexDirection: 'row', alignItems: 'center', gap: space.xs },
  grow: { flex: 1, minWidth: 0 },
  figure: { minWidth: 28, textAlign: 'right' },
});
