import type { ReactNode } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { layout, rule, space, touch } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Icon } from './Icon';
import { StateMark, type MarkState } from './StateMark';
import { Text } from './Text';
import { webProps } from './webProps';
import { useMessages } from '../i18n/useMessages';

export interface SectionProps {
  /** The anchor that the section list and the verdict bar jump to. */
  id: string;
  number?: number | string;
  title: string;
  state?: MarkState;
  stateWord?: string;
  /** What follows the state's word. */
  detail?: string;
  /** Beside the state, never instead of it: "1 caution". */
  caution?: string;
  /** Without `onToggle` the section is always open and has no fold mark. */
  open?: boolean;
  onToggle?: () => void;
  /** Set type that stands for the section while it is folded. */
  folded?: ReactNode;
  children?: ReactNode;
}

function Head({ number, title, state, stateWord, detail, caution, onToggle, open }: SectionProps) {
  return (
    <>
      {number !== undefined && (
        <Text variant="section" weight="700" style={styles.number}>
          {String(number)}
        </Text>
      )}
      <View style={styles.words}>
        <Text variant="section">{title}</Text>
        {(state !== undefined || caution !== undefined) && (
          <View style={styles.states}>
            {state !== undefined && <StateMark state={state} word={stateWord} detail={detail} />}
            {caution !== undefined && <StateMark state="caution" word={caution} />}
          </View>
        )}
      </View>
      {onToggle !== undefined && (
        <View style={styles.fold}>
          <Icon name={open === true ? 'up' : 'down'} color="blue" strokeWidth={2.4} />
        </View>
      )}
    </>
  );
}

/** One numbered part of a form: a strong rule, or a heavy red one where a rule is broken. */
export function Section(props: SectionProps) {
  const { id, state, onToggle, folded, children } = props;
  const open = onToggle === undefined ? true : props.open === true;
  const { colors } = useTheme();
  const { ui } = useMessages();
  const stopped = state === 'stop';
  return (
    <View
      id={id}
      role="region"
      {...webProps({ 'aria-labelledby': `${id}-title`, tabIndex: -1 })}
      style={[
        styles.section,
        {
          borderTopWidth: stopped ? rule.heavy : rule.strong,
          borderTopColor: stopped ? colors.red : colors.ink,
        },
      ]}
    >
      <View role="heading" {...webProps({ 'aria-level': 2, id: `${id}-title` })}>
        {onToggle === undefined ? (
          <View style={styles.head}>
            <Head {...props} />
          </View>
        ) : (
          <Pressable
            role="button"
            {...webProps({
              'aria-expanded': open,
              'aria-controls': `${id}-body`,
              title: open ? ui.fold.close : ui.fold.open,
            })}
            onPress={onToggle}
            style={styles.head}
          >
            <Head {...props} open={open} />
          </Pressable>
        )}
      </View>
      <View id={`${id}-body`} style={open ? styles.body : styles.folded}>
        {open ? children : folded}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  section: { paddingBottom: space.xl },
  head: {
    flexDirection: 'row',
    alignItems: 'flex-start',
    minHeight: 68,
    paddingTop: 14,
    paddingBottom: 10,
  },
  number: { width: layout.numberColumn },
  words: { flex: 1, minWidth: 0 },
  states: { marginTop: 4, gap: 4, flexDirection: 'row', flexWrap: 'wrap', columnGap: space.md },
  fold: { width: 44, height: touch.least, alignItems: 'flex-end', justifyContent: 'center' },
  body: { gap: space.md },
  folded: { paddingLeft: layout.numberColumn, gap: 2 },
});
