import { useQuery } from '@tanstack/react-query';
import { View } from 'react-native';
import { dateTimeText } from '@/shared/format';
import { deviceZone } from '../home/clock';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { Button, describeFault, Section, Text } from '../ui';
import { ownSessionsQuery, useEndSession } from './accountQueries';
import { deviceName } from './deviceName';
import { LineWithAction } from './LineWithAction';

/** Every place where this person is signed in. */
export function Sessions() {
  const messages = useMessages();
  const { account, ui } = messages;
  const locale = useLocale();
  const sessions = useQuery(ownSessionsQuery());
  const end = useEndSession();
  const items = sessions.data?.items ?? [];
  const others = items.filter((session) => !session.current);
  return (
    <Section id="sessions" title={account.sessions}>
      {sessions.data === undefined && (
        <Text color="ink2">
          {sessions.isError ? describeFault(sessions.error, messages) : ui.loading}
        </Text>
      )}
      {end.isError && <Text variant="strong">{describeFault(end.error, messages)}</Text>}
      <View role="list">
        {items.map((session) => {
          const device = deviceName(session.userAgent, account);
          return (
            <LineWithAction
              key={session.id}
              title={device}
              note={
                session.current
                  ? account.thisSession
                  : account.lastSeen(dateTimeText(locale, session.lastSeenAt, deviceZone()))
              }
              action={
                session.current
                  ? undefined
                  : {
                      label: account.endSession,
                      'aria-label': account.endSessionOf(device),
                      onPress: () => end.mutate(session.id),
                    }
              }
            />
          );
        })}
      </View>
      {sessions.data !== undefined && others.length === 0 && (
        <Text color="ink2">{account.onlyThis}</Text>
      )}
      {others.length > 1 && (
        <Button
          label={account.endOthers}
          onPress={() => end.mutate(undefined)}
          busy={end.isPending}
        />
      )}
    </Section>
  );
}
