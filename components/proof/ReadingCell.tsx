import { useState } from 'react';
import { StyleSheet, TextInput, View } from 'react-native';
import { rule } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { StateSymbol, Text, textStyle, webProps } from '../ui';
import { STRAY_ABOVE_VOLTS, governingEntry, voltsOf, type Entry } from './proofForm';

interface Props {
  id: string;
  label: string;
  entries: readonly Entry[];
  lowImpedance: boolean;
  stamp: () => string;
  onChange: (entries: Entry[]) => void;
}

const isStray = (entry: Entry | undefined) =>
  entry !== undefined && Math.abs(voltsOf(entry) ?? 0) > STRAY_ABOVE_VOLTS;

/** What typing makes of a cell: the open reading goes on, a kept one stands and another begins. */
function typed(
  entries: readonly Entry[],
  text: string,
  { lowImpedance, at }: Pick<Entry, 'lowImpedance' | 'at'>,
): Entry[] {
  const last = entries.at(-1);
  const next = { text, lowImpedance, at, kept: false };
  if (last === undefined || last.kept) return [...entries, next];
  // Another input of the meter is another reading; the one before stays as it was.
  if (last.lowImpedance !== lowImpedance && voltsOf(last) !== undefined) {
    return [...entries.slice(0, -1), { ...last, kept: true }, next];
  }
  return [...entries.slice(0, -1), next];
}

/** One reading of the matrix: the figure large, its unit small; a dash where nothing was read. */
export function ReadingCell({ id, label, entries, lowImpedance, stamp, onChange }: Props) {
  const { colors } = useTheme();
  const [focused, setFocused] = useState(false);
  const last = entries.at(-1);
  const open = last !== undefined && !last.kept ? last : undefined;
  const governing = governingEntry(entries);
  const fresh = open === undefined || open.lowImpedance !== lowImpedance;
  const text = focused ? (fresh ? '' : open.text) : (governing?.text ?? open?.text ?? '');
  const stray = isStray(governing);

  function handleBlur() {
    setFocused(false);
    if (open === undefined) return;
    if (open.text.trim() === '') onChange(entries.slice(0, -1));
    else if (isStray(open)) onChange([...entries.slice(0, -1), { ...open, kept: true }]);
  }

  return (
    <View
      style={[
        styles.cell,
        { backgroundColor: colors.field, borderBottomColor: colors.blue },
        focused && [styles.focused, { borderColor: colors.blue }],
      ]}
    >
      {text === '' && !focused && (
        <Text aria-hidden variant="section" color="ink2" style={styles.dash}>
          {'—'}
        </Text>
      )}
      <TextInput
        id={id}
        {...webProps({
          'aria-label': label,
          'aria-invalid': stray || undefined,
          dataSet: { cell: '' },
        })}
        value={text}
        onChangeText={(next) => onChange(typed(entries, next, { lowImpedance, at: stamp() }))}
        onFocus={() => setFocused(true)}
        onBlur={handleBlur}
        inputMode="decimal"
        autoCorrect={false}
        autoComplete="off"
        maxLength={8}
        style={[styles.input, { color: colors.ink }]}
      />
      <Text aria-hidden variant="label" weight="500" style={styles.unit}>
        {text === '' && !focused ? '' : 'V'}
      </Text>
      {stray && (
        <View style={styles.mark}>
          <StateSymbol state="stop" size={14} />
        </View>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  cell: {
    flex: 1,
    minHeight: 58,
    flexDirection: 'row',
    alignItems: 'center',
    borderBottomWidth: 3,
    borderWidth: 0,
  },
  focused: { borderWidth: 3 },
  input: {
    ...textStyle('section', '700'),
    flex: 1,
    minWidth: 0,
    width: '100%',
    minHeight: 52,
    paddingLeft: rule.strong,
    paddingRight: 4,
    textAlign: 'right',
  },
  unit: { width: '30%', maxWidth: 44, flexShrink: 0 },
  dash: { position: 'absolute', left: 0, right: 0, textAlign: 'center' },
  mark: { position: 'absolute', top: 4, right: 4 },
});
