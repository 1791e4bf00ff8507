import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { space } from '../theme/tokens';
import { useMessages } from '../i18n/useMessages';
import { Button, Text } from '../ui';

/** The hash in groups of four, as people read it out. */
function groups(hash: string): string[] {
  return hash.match(/.{1,4}/g) ?? [];
}

/** The SHA-256 of what is signed: three groups and two, all sixteen on demand. */
export function HashLine({ hash }: { hash: string }) {
  const words = useMessages().signing;
  const [whole, setWhole] = useState(false);
  const all = groups(hash);
  const short = `${all.slice(0, 3).join(' ')} … ${all.slice(-2).join(' ')}`;
  return (
    <View style={styles.box}>
      <Text variant="label" color="ink2">
        {words.content}
      </Text>
      <View style={styles.row}>
        <Text variant="note" weight="500" style={styles.hash}>
          {whole ? all.join(' ') : short}
        </Text>
        <Button
          kind="quiet"
          iconEnd={whole ? 'up' : 'down'}
          label={whole ? words.lessOfIt : words.allOfIt}
          aria-expanded={whole}
          onPress={() => setWhole(!whole)}
        />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  box: { gap: 2 },
  row: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    justifyContent: 'space-between',
    columnGap: space.md,
  },
  hash: { flexShrink: 1, letterSpacing: 0.3 },
});
