import { Link } from 'expo-router';
import { useState, type ReactNode } from 'react';
import { Pressable, StyleSheet, View, type LayoutChangeEvent } from 'react-native';
import { rule, space, touch } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { useMessages } from '../i18n/useMessages';
import { Button, type ButtonProps } from './Button';
import { HeaderPlaces } from './HeaderPlaces';
import { Icon, Mark } from './Icon';
import { useShell } from './shell';
import { Text } from './Text';

export interface BackLink {
  label: string;
  href?: ButtonProps['href'];
  onPress?: () => void;
}

interface Props {
  back?: BackLink;
  /** How the record stands on this device: a `SavedState`. */
  saved?: ReactNode;
  /** At the right end, instead of the person's name. */
  end?: ReactNode;
  /** The place that is open now. */
  place?: string;
}

function Brand() {
  const { ui } = useMessages();
  const { homeHref } = useShell();
  const inside = (
    <>
      <Mark width={34} />
      <Text variant="section" style={styles.name}>
        {ui.brand}
      </Text>
    </>
  );
  if (homeHref === undefined) return <View style={styles.brand}>{inside}</View>;
  return (
    <Link href={homeHref} asChild>
      <Pressable role="link" aria-label={ui.brand} style={styles.brand}>
        {inside}
      </Pressable>
    </Link>
  );
}

function Person() {
  const { person } = useShell();
  const { isPhone } = useBreakpoint();
  if (person === undefined) return null;
  return (
    <Link href={person.href} asChild>
      <Pressable role="link" style={styles.person}>
        <Icon name="person" color="blue" size={isPhone ? 22 : 24} />
        <Text variant="strong" color="blue" style={styles.shrink}>
          {isPhone ? person.name : `${person.name}, ${person.role}`}
        </Text>
      </Pressable>
    </Link>
  );
}

/** How wide each part of the bar is by itself, as measured. */
function useWidths<Part extends string>() {
  const [widths, setWidths] = useState<Partial<Record<Part, number>>>({});
  const keep = (part: Part, width: number) =>
    setWidths((before) => (before[part] === width ? before : { ...before, [part]: width }));
  const measure =
    (part: Part) =>
    ({ nativeEvent: { layout } }: LayoutChangeEvent) =>
      keep(part, Math.ceil(layout.width));
  return { widths, keep, measure };
}

/**
 * From a tablet on. Mark, places and person stand in one line; where they do
 * not fit beside each other the places have a line of their own.
 */
function Bar({ back, saved, end, place }: Omit<Props, 'back'> & { back: ReactNode }) {
  const { isWide, margin } = useBreakpoint();
  const { colors } = useTheme();
  const { places } = useShell();
  const { widths, keep, measure } = useWidths<'bar' | 'start' | 'end' | 'places'>();
  const shown = places.length > 0 && (isWide || !back);
  const { bar = Infinity, start = 0, end: endWidth = 0, places: needed = 0 } = widths;
  const below = shown && needed > bar - 2 * margin - start - endWidth - 2 * space.xl;
  const line = shown && (
    <HeaderPlaces current={place} onWidth={(width) => keep('places', Math.ceil(width))} />
  );
  return (
    <View
      role="banner"
      onLayout={measure('bar')}
      style={[styles.banner, { borderBottomColor: colors.ink }]}
    >
      <View style={[styles.bar, below && styles.low, { paddingHorizontal: margin }]}>
        <View style={styles.part} onLayout={measure('start')}>
          <Brand />
          {back}
        </View>
        <View style={styles.grow}>{!below && line}</View>
        <View style={styles.part} onLayout={measure('end')}>
          {saved}
          {end ?? <Person />}
        </View>
      </View>
      {below && (
        <View style={[styles.below, { paddingHorizontal: margin - space.sm }]}>{line}</View>
      )}
    </View>
  );
}

/** The head of every screen: mark and name, where it came from, how it is kept, who is signed in. */
export function Header({ back, saved, end, place }: Props) {
  const { isPhone, margin } = useBreakpoint();
  const backButton = back !== undefined && (
    <Button
      kind="quiet"
      icon="left"
      label={back.label}
      href={back.href}
      onPress={back.onPress}
      style={styles.back}
    />
  );
  if (!isPhone) return <Bar back={backButton} saved={saved} end={end} place={place} />;
  return (
    <View role="banner" style={[styles.phone, { paddingHorizontal: margin }]}>
      {back !== undefined ? backButton : <Brand />}
      {end ?? saved ?? <Person />}
    </View>
  );
}

const styles = StyleSheet.create({
  phone: {
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'space-between',
    gap: space.sm,
    paddingTop: 6,
    minHeight: 54,
  },
  banner: { borderBottomWidth: rule.strong },
  bar: { flexDirection: 'row', alignItems: 'center', columnGap: space.xl, minHeight: 78 },
  low: { minHeight: 60 },
  part: { flexDirection: 'row', alignItems: 'center', columnGap: space.xl, flexShrink: 1 },
  below: { minHeight: 52 },
  grow: { flex: 1, minWidth: 0, alignSelf: 'stretch' },
  brand: { flexDirection: 'row', alignItems: 'center', gap: 10, minHeight: touch.least },
  name: { fontSize: 22, lineHeight: 28, letterSpacing: -0.11 },
  person: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: 8,
    minHeight: touch.least,
    flexShrink: 1,
  },
  shrink: { flexShrink: 1 },
  back: { alignSelf: 'center', marginLeft: -6 },
});
