import { Link } from 'expo-router';
import type { ReactNode } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { rule, space, touch } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { useMessages } from '../i18n/useMessages';
import { Button, type ButtonProps } from './Button';
import { Icon, Mark } from './Icon';
import { useShell } from './shell';
import { Text } from './Text';
import { webProps } from './webProps';

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

/** The places of the header; the open one is ink with a heavy bar under it. */
function Places({ current }: { current?: string }) {
  const { places } = useShell();
  const { colors } = useTheme();
  const { ui } = useMessages();
  if (places.length === 0) return null;
  return (
    <View role="navigation" aria-label={ui.menu} style={styles.places}>
      {places.map((place) => {
        const here = place.key === current;
        return (
          <Link key={place.key} href={place.href} asChild>
            <Pressable
              role="link"
              {...webProps({ 'aria-current': here ? 'page' : undefined })}
              style={StyleSheet.flatten([
                styles.place,
                { borderBottomColor: here ? colors.ink : 'transparent' },
              ])}
            >
              <Text variant="strong" weight="500" color={here ? 'ink' : 'blue'}>
                {place.label}
              </Text>
            </Pressable>
          </Link>
        );
      })}
    </View>
  );
}

/** The head of every screen: mark and name, where it came from, how it is kept, who is signed in. */
export function Header({ back, saved, end, place }: Props) {
  const { isPhone, isWide, margin } = useBreakpoint();
  const { colors } = useTheme();
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
  if (isPhone) {
    return (
      <View role="banner" style={[styles.phone, { paddingHorizontal: margin }]}>
        {back !== undefined ? backButton : <Brand />}
        {end ?? saved ?? <Person />}
      </View>
    );
  }
  return (
    <View
      role="banner"
      style={[styles.bar, { paddingHorizontal: margin, borderBottomColor: colors.ink }]}
    >
      <Brand />
      {backButton}
      {isWide || back === undefined ? <Places current={place} /> : <View style={styles.grow} />}
      {saved}
      {end ?? <Person />}
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
  bar: {
    flexDirection: 'row',
    alignItems: 'center',
    columnGap: space.xl,
    minHeight: 78,
    borderBottomWidth: rule.strong,
  },
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
  places: {
    flex: 1,
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignSelf: 'stretch',
    alignContent: 'stretch',
    columnGap: space.xs,
  },
  place: {
    minHeight: touch.least,
    justifyContent: 'center',
    paddingHorizontal: space.sm,
    borderBottomWidth: 5,
    borderTopWidth: 5,
    borderTopColor: 'transparent',
    alignSelf: 'stretch',
  },
  grow: { flex: 1 },
});
