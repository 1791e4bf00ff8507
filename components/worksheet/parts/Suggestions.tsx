import { StyleSheet, View } from 'react-native';
import { useMessages } from '../../i18n/useMessages';
import { space } from '../../theme/tokens';
import { Button, Text } from '../../ui';

interface Props {
  /** Where they come from: "From the site", "From the last worksheet here". */
  from: string;
  values: readonly string[];
  onTake: (value: string) => void;
}

/** Answers known from elsewhere, to be taken by a person: nothing is filled in by itself. */
export function Suggestions({ from, values, onTake }: Props) {
  const words = useMessages();
  if (values.length === 0) return null;
  return (
    <View style={styles.box}>
      <Text variant="label" color="ink2">
        {from}
      </Text>
      <View style={styles.row}>
        {values.map((value) => (
          <Button
            key={value}
            label={value}
            icon="plus"
            onPress={() => onTake(value)}
            aria-label={words.worksheet.takeSuggestion(value)}
            style={styles.button}
          />
        ))}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  box: { gap: space.xs },
  // A long suggestion takes a second line rather than widening the page.
  button: { maxWidth: '100%', flexShrink: 1 },
  row: { flexDirection: 'row', flexWrap: 'wrap', gap: 10 },
});
