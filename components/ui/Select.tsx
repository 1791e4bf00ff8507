import { useId, useState } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { radius, rule, touch } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { useMessages } from '../i18n/useMessages';
import type { Option } from './Choice';
import { ChoiceOption } from './ChoiceOption';
import { Field, fieldAria, type FieldProps } from './Field';
import { Icon } from './Icon';
import { Text } from './Text';
import { webProps } from './webProps';

export interface SelectProps<T> extends FieldProps {
  id?: string;
  options: readonly Option<T>[];
  value: T | undefined;
  onChange: (value: T) => void;
  onClear?: () => void;
}

/** One answer of many: a line that unfolds into a stack in its place; nothing pops up. */
export function Select<T extends string | number>({
  value,
  onChange,
  onClear,
  ...props
}: SelectProps<T>) {
  const generated = useId();
  const id = props.id ?? generated;
  const { colors } = useTheme();
  const { ui } = useMessages();
  const [open, setOpen] = useState(false);
  const chosen = props.options.find((option) => option.value === value);

  function handlePress(option: T) {
    setOpen(false);
    if (option === value && onClear) onClear();
    else onChange(option);
  }

  return (
    <Field {...props} id={id}>
      <View style={[styles.frame, { borderColor: colors.blue, backgroundColor: colors.field }]}>
        <Pressable
          id={id}
          role="button"
          {...webProps({
            ...fieldAria(id, props),
            'aria-invalid': undefined,
            'aria-labelledby': `${id}-label ${id}-value`,
            'aria-expanded': open,
          })}
          onPress={() => setOpen(!open)}
          style={styles.head}
        >
          <Text
            nativeID={`${id}-value`}
            variant="value"
            weight={chosen ? '600' : '400'}
            color={chosen ? 'ink' : 'ink2'}
            style={styles.words}
          >
            {chosen?.label ?? ui.choose}
          </Text>
          <Icon name={open ? 'up' : 'down'} color="blue" />
        </Pressable>
        {open && (
          <View role="radiogroup" {...webProps({ 'aria-labelledby': `${id}-label` })}>
            {props.options.map((option) => (
              <ChoiceOption
                key={String(option.value)}
                option={option}
                multiple={false}
                inRow={false}
                first={false}
                chosen={option.value === value}
                reachable
                onPress={() => handlePress(option.value)}
              />
            ))}
          </View>
        )}
        {!open && chosen?.note !== undefined && (
          <Text variant="label" weight="400" color="ink2" style={styles.note}>
            {chosen.note}
          </Text>
        )}
      </View>
    </Field>
  );
}

const styles = StyleSheet.create({
  frame: { borderWidth: rule.middle, borderRadius: radius.control, overflow: 'hidden' },
  head: {
    minHeight: touch.control - 3,
    flexDirection: 'row',
    alignItems: 'center',
    gap: 10,
    paddingHorizontal: 14,
    paddingVertical: 6,
  },
  words: { flex: 1 },
  note: { paddingHorizontal: 14, paddingBottom: 8 },
});
