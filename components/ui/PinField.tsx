import { useId, useState } from 'react';
import { StyleSheet, TextInput, View } from 'react-native';
import { radius, rule } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { useMessages } from '../i18n/useMessages';
import { Field, fieldAria, type FieldProps } from './Field';
import { webProps } from './webProps';

const LENGTH = 6;

export interface PinFieldProps extends Omit<FieldProps, 'label'> {
  id?: string;
  label?: string;
  value: string;
  onChange: (value: string) => void;
  onComplete?: (value: string) => void;
}

/**
 * The signing PIN: six cells with one field over them and the device's own
 * number pad. A filled cell shows a point, never the digit, and no browser is
 * asked to keep it.
 */
export function PinField({ value, onChange, onComplete, ...props }: PinFieldProps) {
  const generated = useId();
  const id = props.id ?? generated;
  const { colors } = useTheme();
  const { ui } = useMessages();
  const [focused, setFocused] = useState(false);
  const label = props.label ?? ui.pin;

  function handleChange(text: string) {
    const digits = text.replace(/\D/g, '').slice(0, LENGTH);
    onChange(digits);
    if (digits.length === LENGTH && digits !== value) onComplete?.(digits);
  }

  return (
    <Field {...props} label={label} id={id}>
      <View style={styles.cells}>
        {Array.from({ length: LENGTH }, (_, at) => {
          const current = focused && at === Math.min(value.length, LENGTH - 1);
          return (
            <View
              key={at}
              aria-hidden
              style={[
                styles.cell,
                {
                  borderColor: colors.blue,
                  borderWidth: current ? 3 : rule.middle,
                  backgroundColor: colors.field,
                },
              ]}
            >
              {at < value.length && (
                <View style={[styles.point, { backgroundColor: colors.ink }]} />
              )}
            </View>
          );
        })}
        <TextInput
          id={id}
          {...webProps({ ...fieldAria(id, props), 'data-pin': '' })}
          value={value}
          onChangeText={handleChange}
          onFocus={() => setFocused(true)}
          onBlur={() => setFocused(false)}
          inputMode="numeric"
          autoComplete="off"
          autoCorrect={false}
          maxLength={LENGTH}
          caretHidden
          style={styles.over}
        />
      </View>
    </Field>
  );
}

const styles = StyleSheet.create({
  cells: { flexDirection: 'row', gap: 8, maxWidth: 420 },
  cell: {
    flex: 1,
    height: 60,
    borderRadius: radius.control,
    alignItems: 'center',
    justifyContent: 'center',
  },
  point: { width: 14, height: 14, borderRadius: 7 },
  // Under 16 px a phone would zoom in on the field; the text itself is never seen.
  over: { position: 'absolute', top: 0, right: 0, bottom: 0, left: 0, opacity: 0, fontSize: 16 },
});
