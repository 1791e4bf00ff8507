import { useId, type ReactNode } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { radius, space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Icon } from './Icon';
import { Text } from './Text';
import { webProps } from './webProps';

export interface CheckRowProps {
  label: string;
  note?: string;
  checked: boolean;
  onChange: (checked: boolean) => void;
  id?: string;
  /** Still to be done: an ink bar at the left and a toned ground. */
  unanswered?: boolean;
  /** Why it cannot be ticked now. */
  reason?: string;
  /** A switch turns something on at once; a check box records something done. */
  role?: 'checkbox' | 'switch';
  /** Below the row: a citation, a second control. */
  children?: ReactNode;
}

/** One line to tick: the box at the left, its meaning and a note beside it. */
export function CheckRow(props: CheckRowProps) {
  const { label, note, checked, onChange, unanswered, reason, role = 'checkbox', children } = props;
  const generated = useId();
  const id = props.id ?? generated;
  const { colors } = useTheme();
  const usable = reason === undefined;
  const second = reason ?? note;
  const edge = usable ? colors.blue : colors.ink2;
  return (
    <View
      style={[
        styles.row,
        { borderTopColor: colors.hair },
        unanswered === true && [
          styles.unanswered,
          { borderLeftColor: colors.ink, backgroundColor: colors.tone },
        ],
      ]}
    >
      <Pressable
        id={id}
        role={role}
        aria-checked={checked}
        {...webProps({
          'aria-labelledby': `${id}-label`,
          'aria-describedby': second && `${id}-note`,
        })}
        disabled={!usable}
        onPress={() => onChange(!checked)}
        style={styles.press}
      >
        <View
          aria-hidden
          style={[
            styles.box,
            { borderColor: edge, backgroundColor: checked ? edge : colors.field },
          ]}
        >
          {checked && <Icon name="check" size={24} color="onBlue" strokeWidth={2.4} />}
        </View>
        <View style={styles.words}>
          <Text
            nativeID={`${id}-label`}
            variant={checked ? 'strong' : 'answer'}
            color={usable ? 'ink' : 'ink2'}
          >
            {label}
          </Text>
          {second !== undefined && (
            <Text nativeID={`${id}-note`} variant="label" weight="400" color="ink2">
              {second}
            </Text>
          )}
        </View>
      </Pressable>
      {children !== undefined && <View style={styles.below}>{children}</View>}
    </View>
  );
}

/** Something that is on or off at once, such as the sunlight theme. */
export function Toggle(props: Omit<CheckRowProps, 'role' | 'unanswered'>) {
  return <CheckRow {...props} role="switch" />;
}

const styles = StyleSheet.create({
  row: { borderTopWidth: 1 },
  unanswered: { borderLeftWidth: 4, paddingLeft: 10, paddingRight: space.xs },
  press: {
    flexDirection: 'row',
    alignItems: 'flex-start',
    gap: 14,
    minHeight: 56,
    paddingVertical: 10,
  },
  box: {
    width: 32,
    height: 32,
    borderWidth: 2,
    borderRadius: radius.control,
    alignItems: 'center',
    justifyContent: 'center',
    flexShrink: 0,
  },
  words: { flex: 1, paddingTop: 4 },
  below: { paddingLeft: 46, paddingBottom: space.sm, gap: space.xs },
});
