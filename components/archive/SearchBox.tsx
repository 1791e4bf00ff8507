import { useEffect, useRef, useState } from 'react';
import { Pressable, StyleSheet, TextInput, View } from 'react-native';
import { useMessages } from '../i18n/useMessages';
import { radius, rule, space, touch } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Field, fieldAria, Icon, Text, textStyle, webProps } from '../ui';

/** Long enough not to ask at every letter, short enough to feel at once. */
const PAUSE_MS = 250;
const MOST = 200;
const ID = 'archive-search';

interface Props {
  value: string;
  onChange: (value: string) => void;
  /** How many were found, at the right end. */
  count?: string;
}

/** One box for everything: number, place, panel, people, notes. */
export function SearchBox({ value, onChange, count }: Props) {
  const { archive } = useMessages();
  const { colors } = useTheme();
  const [typed, setTyped] = useState(value);
  const [seen, setSeen] = useState(value);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  // A step back in the browser changes the address under the box.
  if (value !== seen) {
    setSeen(value);
    if (value !== typed.trim()) setTyped(value);
  }
  useEffect(() => () => clearTimeout(timer.current), []);

  function handleChange(next: string) {
    setTyped(next);
    clearTimeout(timer.current);
    timer.current = setTimeout(() => onChange(next.trim()), PAUSE_MS);
  }

  return (
    <Field id={ID} label={archive.search} hint={archive.searchHint}>
      <View style={[styles.box, { borderColor: colors.blue, backgroundColor: colors.field }]}>
        <Icon name="search" color="blue" strokeWidth={2.4} />
        <TextInput
          id={ID}
          {...webProps(fieldAria(ID, { hint: archive.searchHint, error: undefined }))}
          value={typed}
          onChangeText={handleChange}
          maxLength={MOST}
          inputMode="search"
          enterKeyHint="search"
          autoCapitalize="none"
          autoCorrect={false}
          spellCheck={false}
          style={[styles.input, { color: colors.ink }]}
        />
        {count !== undefined && (
          <Text variant="label" weight="600" color="ink2" aria-live="polite">
            {count}
          </Text>
        )}
        {typed !== '' && (
          <Pressable
            role="button"
            aria-label={archive.clearSearch}
            onPress={() => {
              setTyped('');
              clearTimeout(timer.current);
              onChange('');
            }}
            style={styles.clear}
          >
            <Icon name="close" color="blue" size={22} />
          </Pressable>
        )}
      </View>
    </Field>
  );
}

const styles = StyleSheet.create({
  box: {
    minHeight: 56,
    borderWidth: rule.strong,
    borderRadius: radius.control,
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.sm,
    paddingHorizontal: space.md,
  },
  input: { ...textStyle('value'), fontSize: 20, flex: 1, minWidth: 0, minHeight: 52 },
  clear: {
    width: touch.least,
    minHeight: touch.least,
    alignItems: 'center',
    justifyContent: 'center',
    marginRight: -space.sm,
  },
});
