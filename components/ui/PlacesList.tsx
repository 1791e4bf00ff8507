import { Link } from 'expo-router';
import { Pressable, StyleSheet, View } from 'react-native';
import { touch } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { useMessages } from '../i18n/useMessages';
import { Icon } from './Icon';
import { useShell } from './shell';
import { Text } from './Text';

/** On a phone the places that the header has no room for stand below the page as lines. */
export function PlacesList({ hidden }: { hidden: readonly string[] }) {
  const { places } = useShell();
  const { isPhone } = useBreakpoint();
  const { colors } = useTheme();
  const { ui } = useMessages();
  const shown = places.filter((place) => !hidden.includes(place.key));
  if (!isPhone || shown.length === 0) return null;
  return (
    <View role="navigation" aria-label={ui.menu}>
      {shown.map((place) => (
        <Link key={place.key} href={place.href} asChild>
          <Pressable
            role="link"
            style={StyleSheet.flatten([styles.row, { borderTopColor: colors.hair }])}
          >
            <Text variant="strong" color="blue">
              {place.label}
            </Text>
            <Icon name="right" color="blue" size={22} />
          </Pressable>
        </Link>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  row: {
    minHeight: touch.control,
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'space-between',
    borderTopWidth: 1,
  },
});
