import { Pressable, StyleSheet, View } from 'react-native';
import { LOCALES, type Locale } from '@/shared/user';
import { radius, rule, touch } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Text, webProps } from '../ui';

/** Each language in its own words: whoever needs it could not read the other one's. */
const NAMES: Readonly<Record<Locale, string>> = { 'en-US': 'English', 'es-MX': 'Español' };

interface Props {
  value: Locale;
  onChange: (locale: Locale) => void;
}

/** English or Spanish, on screens that a person may read before anything is known about them. */
export function LanguageSwitch({ value, onChange }: Props) {
  const { colors } = useTheme();
  return (
    <View
      role="group"
      aria-label="Language, idioma"
      style={[styles.frame, { borderColor: colors.blue, backgroundColor: colors.field }]}
    >
      {LOCALES.map((locale, index) => {
        const chosen = locale === value;
        return (
          <Pressable
            key={locale}
            role="button"
            {...webProps({ 'aria-pressed': chosen, lang: locale })}
            onPress={() => onChange(locale)}
            style={[
              styles.half,
              chosen && { backgroundColor: colors.blue },
              index > 0 && { borderLeftWidth: rule.middle, borderLeftColor: colors.blue },
            ]}
          >
            <Text variant="note" weight="600" color={chosen ? 'onBlue' : 'blue'}>
              {NAMES[locale]}
            </Text>
          </Pressable>
        );
      })}
    </View>
  );
}

const styles = StyleSheet.create({
  frame: {
    flexDirection: 'row',
    borderWidth: rule.middle,
    borderRadius: radius.control,
    overflow: 'hidden',
  },
  half: { minHeight: touch.least, justifyContent: 'center', paddingHorizontal: 14 },
});
