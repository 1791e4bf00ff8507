import { StyleSheet, View } from 'react-native';
import { useMessages } from '../i18n/useMessages';
import { layout, rule, space } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { Button, Text } from '../ui';

/** What the bar hides of the page at most: two lines of buttons and the note. */
export const BAR_COVERS = 200;

interface Props {
  onAsk: () => void;
  onRefuse: () => void;
  onUnderstand: () => void;
  /** Why it cannot be signed yet. */
  reason: string | undefined;
}

/** The two answers that hold the work, side by side. */
export function HoldButtons({ onAsk, onRefuse }: Pick<Props, 'onAsk' | 'onRefuse'>) {
  const words = useMessages().helper;
  return (
    <View style={styles.two}>
      <Button icon="question" label={words.question} onPress={onAsk} style={styles.half} />
      <Button icon="refuse" label={words.refuse} onPress={onRefuse} style={styles.half} />
    </View>
  );
}

/** The three answers, always in view. */
export function HelperBar({ onAsk, onRefuse, onUnderstand, reason }: Props) {
  const words = useMessages().helper;
  const { colors } = useTheme();
  const { margin } = useBreakpoint();
  return (
    <View
      style={[
        styles.bar,
        { borderTopColor: colors.ink, backgroundColor: colors.paper, paddingHorizontal: margin },
      ]}
    >
      <View style={styles.inside}>
        <Text variant="label" weight="400" color="ink2">
          {words.holds}
        </Text>
        <HoldButtons onAsk={onAsk} onRefuse={onRefuse} />
        <Button
          kind="primary"
          large
          icon={reason === undefined ? 'pen' : undefined}
          label={words.understand}
          reason={reason}
          onPress={onUnderstand}
        />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  bar: {
    borderTopWidth: rule.strong,
    paddingTop: 10,
    paddingBottom: space.sm,
    alignItems: 'center',
  },
  inside: { width: '100%', maxWidth: layout.helper, gap: 10 },
  two: { flexDirection: 'row', gap: 10 },
  half: { flexGrow: 1, flexShrink: 1, paddingHorizontal: 6, gap: 4 },
});
