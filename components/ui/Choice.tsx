import { useId } from 'react';
import { StyleSheet, View, type GestureResponderEvent } from 'react-native';
import { radius, rule } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { ChoiceOption } from './ChoiceOption';
import { Field, fieldAria, type FieldProps } from './Field';
import { moveFocus } from './moveFocus';
import type { IconName } from './icons';
import { webProps } from './webProps';

export interface Option<T> {
  value: T;
  label: string;
  /** What this answer means, on a second line. */
  note?: string;
  icon?: IconName;
  /** A rule refuses this answer: a red square at its right; the stop panel stands below the field. */
  refused?: boolean;
  /** Why it cannot be chosen now. */
  reason?: string;
}

export type ChoiceLayout = 'auto' | 'row' | 'stack';

interface Shared<T> extends FieldProps {
  id?: string;
  options: readonly Option<T>[];
  /** Up to three short answers lie in a row, others stack; more fit in a row on a wide screen. */
  layout?: ChoiceLayout;
  required?: boolean;
}

export interface ChoiceProps<T> extends Shared<T> {
  value: T | undefined;
  onChange: (value: T) => void;
  onClear?: () => void;
}

export interface MultiChoiceProps<T> extends Shared<T> {
  value: readonly T[];
  onChange: (value: T[]) => void;
}

function useInRow<T>(options: readonly Option<T>[], layout: ChoiceLayout): boolean {
  const { isPhone, isWide } = useBreakpoint();
  if (layout !== 'auto') return layout === 'row';
  if (options.some((option) => option.note !== undefined)) return false;
  const letters = options.reduce((sum, option) => sum + option.label.length, 0);
  if (isPhone)
    return options.length <= 3 && options.every(({ label }) => label.length <= 28 / options.length);
  return options.length <= (isWide ? 5 : 4) && letters <= (isWide ? 60 : 48);
}

interface FrameProps<T> extends Shared<T> {
  multiple: boolean;
  isChosen: (value: T) => boolean;
  onPress: (value: T) => void;
}

function ChoiceFrame<T>({ multiple, isChosen, onPress, ...props }: FrameProps<T>) {
  const generated = useId();
  const id = props.id ?? generated;
  const { colors } = useTheme();
  const inRow = useInRow(props.options, props.layout ?? 'auto');
  const anyChosen = props.options.some((option) => isChosen(option.value));

  return (
    <Field {...props} id={id}>
      <View
        id={id}
        role={multiple ? 'group' : 'radiogroup'}
        {...webProps({
          ...fieldAria(id, props),
          // `aria-invalid` and `aria-required` are for radio groups; a plain group has neither.
          'aria-invalid': multiple ? undefined : fieldAria(id, props)['aria-invalid'],
          'aria-required': multiple ? undefined : props.required,
          onKeyDown: multiple ? undefined : (event: GestureResponderEvent) => moveFocus(event),
        })}
        style={[
          styles.frame,
          { borderColor: colors.blue, backgroundColor: colors.field },
          inRow && styles.row,
        ]}
      >
        {props.options.map((option, index) => (
          <ChoiceOption
            key={String(option.value)}
            option={option}
            multiple={multiple}
            inRow={inRow}
            first={index === 0}
            chosen={isChosen(option.value)}
            reachable={multiple || isChosen(option.value) || (!anyChosen && index === 0)}
            onPress={() => onPress(option.value)}
          />
        ))}
      </View>
    </Field>
  );
}

/** One answer of several. */
export function Choice<T extends string | number | boolean>({
  value,
  onChange,
  onClear,
  ...props
}: ChoiceProps<T>) {
  return (
    <ChoiceFrame
      {...props}
      multiple={false}
      isChosen={(option) => option === value}
      onPress={(option) => (option === value && onClear ? onClear() : onChange(option))}
    />
  );
}

/** All answers that hold. */
export function MultiChoice<T extends string | number>({
  value,
  onChange,
  ...props
}: MultiChoiceProps<T>) {
  return (
    <ChoiceFrame
      {...props}
      multiple
      isChosen={(option) => value.includes(option)}
      onPress={(option) =>
        onChange(
          value.includes(option) ? value.filter((each) => each !== option) : [...value, option],
        )
      }
    />
  );
}

const styles = StyleSheet.create({
  frame: { borderWidth: rule.middle, borderRadius: radius.control, overflow: 'hidden' },
  row: { flexDirection: 'row', alignItems: 'stretch' },
});
