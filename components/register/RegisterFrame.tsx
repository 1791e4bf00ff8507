import { usePathname } from 'expo-router';
import type { ReactNode } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { useListPlace, useTopOf } from '../shell/listPlace';
import { layout, space, touch } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useMessages } from '../i18n/useMessages';
import { Icon, Notice, Screen, Text, webProps } from '../ui';

export interface RecordHead {
  title: string;
  /** Above the title: class, role. */
  over?: string;
  /** Below it: the place. */
  under?: string;
}

interface Props {
  /** The place in the header that is open. */
  place: 'people' | 'sites' | 'rubberGoods';
  title: string;
  /** The button that adds a record. */
  primary?: ReactNode;
  /** Buttons for the list as a file; on a phone they stand below it. */
  others?: ReactNode;
  stale: boolean;
  list: ReactNode;
  record?: { head: RecordHead; body: ReactNode };
  onClose: () => void;
}

function Words({ over, title, under, level }: RecordHead & { level?: 2 }) {
  return (
    <View style={styles.words}>
      {over !== undefined && (
        <Text variant="strong" color="ink2">
          {over}
        </Text>
      )}
      {level !== undefined && (
        <Text variant="title" level={level}>
          {title}
        </Text>
      )}
      {under !== undefined && <Text>{under}</Text>}
    </View>
  );
}

/** A record in place of the list, from its top. */
function RecordOver({
  head,
  body,
  back,
}: NonNullable<Props['record']> & { back: { label: string; onPress: () => void } }) {
  useTopOf(head.title);
  return (
    <Screen title={head.title} back={back} head={<Words {...head} />}>
      <View style={styles.body}>{body}</View>
    </Screen>
  );
}

/** A list with the open record beside it; where there is no room beside, the record covers the list. */
export function RegisterFrame({
  place,
  title,
  primary,
  others,
  stale,
  list,
  record,
  onClose,
}: Props) {
  const { register } = useMessages();
  const { isWide, isPhone } = useBreakpoint();
  const isCovered = record !== undefined && !isWide;
  useListPlace(usePathname(), !isCovered);
  if (isCovered) {
    return <RecordOver {...record} back={{ label: title, onPress: onClose }} />;
  }
  return (
    <Screen
      title={title}
      place={place}
      width={isWide ? 'full' : 'column'}
      titleEnd={
        primary === undefined ? undefined : (
          <View style={styles.buttons}>
            {!isPhone && others}
            {primary}
          </View>
        )
      }
      asideWidth={layout.record}
      aside={
        record && (
          <View style={styles.panel}>
            <View style={styles.head}>
              <Words {...record.head} level={2} />
              <Pressable
                role="button"
                {...webProps({ 'aria-label': register.closeRecord })}
                onPress={onClose}
                style={styles.close}
              >
                <Icon name="close" color="blue" />
              </Pressable>
            </View>
            {record.body}
          </View>
        )
      }
    >
      <View style={styles.list}>
        {stale && <Notice icon="clock">{register.asLastRead}</Notice>}
        {list}
        {isPhone && others !== undefined && <View style={styles.buttons}>{others}</View>}
      </View>
    </Screen>
  );
}

const styles = StyleSheet.create({
  words: { flex: 1, gap: 2 },
  buttons: { flexDirection: 'row', flexWrap: 'wrap', gap: 10 },
  list: { gap: space.md, paddingBottom: space.lg },
  panel: { padding: space.xl, gap: space.md },
  head: { flexDirection: 'row', alignItems: 'flex-start', gap: space.xs },
  close: {
    width: touch.least,
    height: touch.least,
    alignItems: 'center',
    justifyContent: 'center',
    marginRight: -space.sm,
  },
  body: { gap: space.md, paddingTop: space.md },
});
