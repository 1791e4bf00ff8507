import { useId, useState, type Ref } from 'react';
import { Pressable, StyleSheet, TextInput, View, type TextInputProps } from 'react-native';
import { radius, rule, space, touch } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { useMessages } from '../i18n/useMessages';
import { Field, fieldAria, type FieldProps } from './Field';
import { Text, textStyle } from './Text';
import { webProps } from './webProps';

export interface TextFieldProps extends FieldProps {
  id?: string;
  value: string;
  onChangeText: (value: string) => void;
  onBlur?: () => void;
  onFocus?: () => void;
  onSubmitEditing?: () => void;
  /** Printed after the value: V, ft, W. */
  unit?: string;
  multiline?: boolean;
  /** How many lines are seen at once, where more than a few are expected. */
  lines?: number;
  /** A password, with Show and Hide. */
  secure?: boolean;
  /** For tags, numbers and names: the keyboard corrects nothing. */
  exact?: boolean;
  maxLength?: number;
  inputMode?: TextInputProps['inputMode'];
  autoComplete?: TextInputProps['autoComplete'];
  autoCapitalize?: TextInputProps['autoCapitalize'];
  autoFocus?: boolean;
  required?: boolean;
  /** Why it cannot be edited now: shown as printed text. */
  reason?: string;
  ref?: Ref<TextInput>;
}

/** Height of a line of several, px. */
const LINE = 24;

/** One line, or several, of text. */
export function TextField({ ref, ...props }: TextFieldProps) {
  const { value, unit, secure, multiline, exact, reason, required } = props;
  const generated = useId();
  const id = props.id ?? generated;
  const { colors } = useTheme();
  const { ui } = useMessages();
  const [shown, setShown] = useState(false);

  const hint = reason ?? props.hint;
  const aria = fieldAria(id, { hint, error: props.error });
  return (
    <Field {...props} hint={hint} id={id}>
      <View
        style={[
          styles.box,
          {
            borderColor: reason === undefined ? colors.blue : colors.ink2,
            backgroundColor: colors.field,
          },
          multiline === true && styles.tall,
        ]}
      >
        <TextInput
          ref={ref}
          id={id}
          {...webProps({ ...aria, 'aria-required': required })}
          value={value}
          onChangeText={props.onChangeText}
          onBlur={props.onBlur}
          onFocus={props.onFocus}
          onSubmitEditing={props.onSubmitEditing}
          editable={reason === undefined}
          secureTextEntry={secure === true && !shown}
          multiline={multiline}
          maxLength={props.maxLength}
          inputMode={props.inputMode}
          autoComplete={props.autoComplete}
          autoCapitalize={props.autoCapitalize ?? (exact === true ? 'none' : 'sentences')}
          autoCorrect={exact === true ? false : undefined}
          spellCheck={exact === true ? false : undefined}
          autoFocus={props.autoFocus}
          style={[
            styles.input,
            multiline === true && styles.lines,
            props.lines !== undefined && { minHeight: props.lines * LINE },
            { color: colors.ink },
          ]}
        />
        {unit !== undefined && (
          <Text variant="label" color="ink2" style={styles.unit}>
            {unit}
          </Text>
        )}
        {secure === true && (
          <Pressable
            role="button"
            aria-pressed={shown}
            onPress={() => setShown(!shown)}
            style={styles.show}
          >
            <Text variant="strong" color="blue">
              {shown ? ui.hide : ui.show}
            </Text>
          </Pressable>
        )}
      </View>
    </Field>
  );
}

const styles = StyleSheet.create({
  box: {
    minHeight: touch.control,
    borderWidth: rule.middle,
    borderRadius: radius.control,
    flexDirection: 'row',
    alignItems: 'center',
  },
  tall: { alignItems: 'stretch' },
  input: {
    ...textStyle('value'),
    flex: 1,
    minWidth: 0,
    minHeight: 49,
    paddingHorizontal: 14,
    paddingVertical: 10,
  },
  lines: { ...textStyle('answer'), minHeight: 96, textAlignVertical: 'top' },
  unit: { paddingRight: 14 },
  show: {
    minHeight: touch.least,
    minWidth: touch.least,
    justifyContent: 'center',
    paddingHorizontal: space.md,
  },
});
