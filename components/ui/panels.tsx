import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { rule, space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { useMessages } from '../i18n/useMessages';
import { Icon } from './Icon';
import type { IconName } from './icons';
import { StateSymbol } from './StateMark';
import { Text } from './Text';
import { webProps } from './webProps';

interface PanelProps {
  id?: string;
  /** The sentence that says what is so. */
  title: string;
  /** What to do. */
  body?: string;
  /** A `Citation`. */
  citation?: ReactNode;
  /** Buttons that clear it, stacked. */
  actions?: ReactNode;
  /** Instead of the signal word. */
  word?: string;
  children?: ReactNode;
}

function PanelBody({ title, body, citation, actions, children }: PanelProps) {
  return (
    <View style={styles.body}>
      <View style={styles.said}>
        <Text variant="signal" weight="600" style={styles.title}>
          {title}
        </Text>
        {body !== undefined && <Text>{body}</Text>}
        {citation}
      </View>
      {children}
      {actions !== undefined && <View style={styles.actions}>{actions}</View>}
    </View>
  );
}

/** A broken rule: red head, the sentence, what undoes it. It appears at once and never blinks. */
export function StopPanel(props: PanelProps) {
  const { colors } = useTheme();
  const { ui } = useMessages();
  const word = props.word ?? ui.state.stop;
  return (
    <View
      role="region"
      aria-label={`${word}: ${props.title}`}
      {...webProps({ id: props.id, tabIndex: -1 })}
      style={{ borderWidth: 2, borderColor: colors.red, backgroundColor: colors.redTone }}
    >
      <View style={[styles.stopHead, { backgroundColor: colors.red }]}>
        <View aria-hidden style={[styles.bar, { backgroundColor: colors.onRed }]}>
          <View style={[styles.barInside, { backgroundColor: colors.red }]} />
        </View>
        <Text variant="signal" color="onRed">
          {word}
        </Text>
      </View>
      <PanelBody {...props} />
    </View>
  );
}

/** Something to know before going on; it stops nothing. */
export function CautionPanel(props: PanelProps) {
  const { colors } = useTheme();
  const { ui } = useMessages();
  const word = props.word ?? ui.state.caution;
  return (
    <View
      role="region"
      aria-label={`${word}: ${props.title}`}
      {...webProps({ id: props.id, tabIndex: -1 })}
      style={{ borderWidth: 2, borderColor: colors.ink, backgroundColor: colors.paper }}
    >
      <View
        style={[
          styles.cautionHead,
          { backgroundColor: colors.yellow, borderBottomColor: colors.ink },
        ]}
      >
        <StateSymbol state="caution" size={24} />
        <Text variant="signal" color="onYellow">
          {word}
        </Text>
      </View>
      <PanelBody {...props} />
    </View>
  );
}

export interface FirstAidRow {
  icon: IconName;
  text: string;
}

/** First aid, rescue and the AED place: the only green of the product. */
export function FirstAidPanel({
  title,
  rows,
  children,
}: {
  title?: string;
  rows: readonly FirstAidRow[];
  children?: ReactNode;
}) {
  const { colors } = useTheme();
  const { ui } = useMessages();
  const heading = title ?? ui.firstAid;
  return (
    <View role="region" aria-label={heading} style={{ borderWidth: 2, borderColor: colors.green }}>
      <View style={[styles.stopHead, { backgroundColor: colors.green }]}>
        <Icon name="aed" color="onGreen" />
        <Text variant="signal" color="onGreen">
          {heading}
        </Text>
      </View>
      <View role="list">
        {rows.map((row, index) => (
          <View
            role="listitem"
            key={row.text}
            style={[
              styles.aidRow,
              index > 0 && { borderTopWidth: rule.fine, borderTopColor: colors.hair },
            ]}
          >
            <Icon name={row.icon} />
            <Text variant="answer" style={styles.grow}>
              {row.text}
            </Text>
          </View>
        ))}
      </View>
      {children}
    </View>
  );
}

const styles = StyleSheet.create({
  stopHead: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: 10,
    minHeight: 44,
    paddingHorizontal: 14,
    paddingVertical: 8,
  },
  cautionHead: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: 10,
    minHeight: 40,
    paddingHorizontal: 14,
    paddingVertical: 6,
    borderBottomWidth: 2,
  },
  bar: { width: 20, height: 20, justifyContent: 'center', alignItems: 'center' },
  barInside: { width: 14, height: 5 },
  body: {
    padding: 14,
    gap: space.sm,
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
  },
  said: { gap: space.xs, flexGrow: 1, flexShrink: 1, flexBasis: 260 },
  title: { lineHeight: 26 },
  actions: { gap: 10, flexGrow: 1, flexShrink: 0, flexBasis: 220 },
  aidRow: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.sm,
    minHeight: 44,
    paddingHorizontal: 14,
    paddingVertical: 8,
  },
  grow: { flex: 1 },
});
