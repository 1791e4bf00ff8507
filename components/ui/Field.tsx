import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Text } from './Text';

export interface FieldProps {
  label: string;
  /** The question is drawn larger and in ink where it is the point of the section. */
  strongLabel?: boolean;
  hint?: string;
  error?: string;
  /** Still to be answered: an ink bar at the left. */
  unanswered?: boolean;
}

/** The ids by which a control names its label, hint and error. */
export function fieldAria(id: string, { hint, error }: Pick<FieldProps, 'hint' | 'error'>) {
  const described = [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(' ');
  return {
    'aria-labelledby': `${id}-label`,
    'aria-describedby': described === '' ? undefined : described,
    'aria-invalid': error !== undefined ? true : undefined,
  };
}

/** Label, hint and error around one control: always visible, never a placeholder. */
export function Field({
  id,
  label,
  strongLabel,
  hint,
  error,
  unanswered,
  children,
}: FieldProps & { id: string; children: ReactNode }) {
  const { colors } = useTheme();
  const marked = unanswered === true || error !== undefined;
  return (
    <View
      style={[
        styles.field,
        marked && [styles.marked, { borderLeftColor: colors.ink, backgroundColor: colors.tone }],
      ]}
    >
      <View>
        <Text
          nativeID={`${id}-label`}
          variant={strongLabel === true ? 'strong' : 'label'}
          color={strongLabel === true ? 'ink' : 'ink2'}
        >
          {label}
        </Text>
        {hint !== undefined && (
          <Text
            nativeID={`${id}-hint`}
            variant="label"
            weight="400"
            color="ink2"
            style={styles.hint}
          >
            {hint}
          </Text>
        )}
      </View>
      {children}
      {error !== undefined && (
        <Text nativeID={`${id}-error`} variant="label" weight="600" aria-live="polite">
          {error}
        </Text>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  field: { gap: 6 },
  marked: {
    borderLeftWidth: 4,
    paddingLeft: space.sm,
    paddingRight: space.xs,
    paddingVertical: space.xs,
  },
  hint: { marginTop: 2 },
});
