import { StyleSheet, View } from 'react-native';
import { space } from '../theme/tokens';
import { StateSymbol } from '../ui';
import type { GoodsWords } from './goodsWords';
import { TwoLines } from './TwoLines';

/** The mark of an item and its words; an item in order has the words alone, in the same place. */
export function GoodsState({ words, inLine }: { words: GoodsWords; inLine?: boolean }) {
  const { mark, first, second, over } = words;
  if (inLine === true) {
    return (
      <View style={styles.row}>
        {mark !== undefined && <StateSymbol state={mark} size={18} />}
        <TwoLines inLine first={first} second={second} over={over ? 'first' : undefined} />
      </View>
    );
  }
  return (
    <View style={styles.row}>
      <View style={styles.mark}>{mark !== undefined && <StateSymbol state={mark} />}</View>
      <View style={styles.words}>
        <TwoLines first={first} second={second} over={over ? 'first' : undefined} />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'center', gap: space.xs },
  mark: { width: 20 },
  words: { flex: 1, minWidth: 0 },
});
