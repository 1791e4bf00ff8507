import { StyleSheet, TextInput } from 'react-native';
import { radius, rule, touch } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { textStyle } from './Text';

export interface DateInputProps {
  kind: 'date' | 'time';
  id: string;
  value: string;
  onChange: (value: string) => void;
  min?: string;
  max?: string;
  label: string;
  labelledBy?: string;
  describedBy?: string;
  invalid?: boolean;
  disabled?: boolean;
}

/** A date as `2026-10-14` or a time as `13:30`, typed on the digits of the device's keyboard. */
export function DateInput({ kind, id, value, onChange, label, disabled }: DateInputProps) {
  const { colors } = useTheme();
  return (
    <TextInput
      id={id}
      aria-label={label}
      value={value}
      onChangeText={onChange}
      editable={disabled !== true}
      keyboardType="numbers-and-punctuation"
      autoCorrect={false}
      maxLength={kind === 'date' ? 10 : 5}
      style={[
        styles.input,
        { borderColor: colors.blue, backgroundColor: colors.field, color: colors.ink },
      ]}
    />
  );
}

const styles = StyleSheet.create({
  input: {
    ...textStyle('value'),
    minHeight: touch.control,
    paddingHorizontal: 12,
    borderWidth: rule.middle,
    borderRadius: radius.control,
  },
});
