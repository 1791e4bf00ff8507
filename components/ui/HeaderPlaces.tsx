import { Link } from 'expo-router';
import { useRef } from 'react';
import { Pressable, ScrollView, StyleSheet, type LayoutChangeEvent } from 'react-native';
import { space, touch } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { useMessages } from '../i18n/useMessages';
import { useShell } from './shell';
import { Text } from './Text';
import { webProps } from './webProps';

interface Props {
  /** The place that is open now. */
  current?: string;
  /** In px, what all of them need beside each other. */
  onWidth: (width: number) => void;
}

/**
 * The places of the header in one line, never two; the open one is ink with a
 * heavy bar under it. Where the line is too short it is pushed aside, and
 * begins with the open place in view.
 */
export function HeaderPlaces({ current, onWidth }: Props) {
  const { places } = useShell();
  const { colors } = useTheme();
  const { ui } = useMessages();
  const scroll = useRef<ScrollView>(null);
  const showOpen = ({ nativeEvent: { layout } }: LayoutChangeEvent) =>
    scroll.current?.scrollTo({ x: Math.max(0, layout.x - space.xxl), animated: false });
  return (
    <ScrollView
      ref={scroll}
      horizontal
      role="navigation"
      aria-label={ui.menu}
      showsHorizontalScrollIndicator={false}
      style={styles.line}
      contentContainerStyle={styles.places}
      onContentSizeChange={onWidth}
    >
      {places.map((place) => {
        const here = place.key === current;
        return (
          <Link key={place.key} href={place.href} asChild>
            <Pressable
              role="link"
              {...webProps({ 'aria-current': here ? 'page' : undefined })}
              onLayout={here ? showOpen : undefined}
              style={StyleSheet.flatten([
                styles.place,
                { borderBottomColor: here ? colors.ink : 'transparent' },
              ])}
            >
              <Text variant="strong" weight="500" color={here ? 'ink' : 'blue'} numberOfLines={1}>
                {place.label}
              </Text>
            </Pressable>
          </Link>
        );
      })}
    </ScrollView>
  );
}

const styles = StyleSheet.create({
  line: { flexGrow: 1, flexShrink: 1, alignSelf: 'stretch' },
  places: { alignItems: 'stretch', columnGap: space.xs },
  place: {
    minHeight: touch.least,
    flexShrink: 0,
    justifyContent: 'center',
    paddingHorizontal: space.sm,
    borderBottomWidth: 5,
    borderTopWidth: 5,
    borderTopColor: 'transparent',
  },
});
