import { useEffect, useRef } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { space, touch } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { useMessages } from '../i18n/useMessages';
import { focusField } from './focusField';
import { Text } from './Text';
import { webProps } from './webProps';

export interface FieldFault {
  /** The `id` of the field it leads to. */
  id?: string;
  message: string;
}

/** What was not right in a form that was sent: it takes the focus, and each line leads to its field. */
export function ErrorSummary({ faults, title }: { faults: readonly FieldFault[]; title?: string }) {
  const { colors } = useTheme();
  const { ui } = useMessages();
  const box = useRef<View>(null);
  const key = faults.map((fault) => `${fault.id} ${fault.message}`).join('\n');
  useEffect(() => {
    if (key !== '') box.current?.focus();
  }, [key]);

  if (faults.length === 0) return null;
  // A fault of the whole form, such as a wrong password, has no field to count.
  const whole = title === undefined && faults.every((fault) => fault.id === undefined);
  return (
    <View
      ref={box}
      role="alert"
      {...webProps({ tabIndex: -1 })}
      style={[styles.box, { borderColor: colors.ink, backgroundColor: colors.tone }]}
    >
      {!whole && (
        <Text variant="signal" weight="600" level={2}>
          {title ?? ui.errorSummary(faults.length)}
        </Text>
      )}
      {faults.map(({ id, message }) =>
        id === undefined ? (
          <Text key={message} variant="strong">
            {message}
          </Text>
        ) : (
          <Pressable
            key={id + message}
            role="link"
            onPress={() => focusField(id)}
            style={styles.line}
          >
            <Text variant="strong" color="blue">
              {message}
            </Text>
          </Pressable>
        ),
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  box: { borderWidth: 2, padding: space.md, gap: space.xxs },
  line: { minHeight: touch.least, justifyContent: 'center' },
});
