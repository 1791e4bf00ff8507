import { useRouter } from 'expo-router';
import { useState } from 'react';
import { View } from 'react-native';
import { useSignOut, useUser } from '../api/session';
import { useKeptDrafts } from '../home/useKeptDrafts';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { Button, describeFault, Notice, Section } from '../ui';

/** Ends the session here; with unsent work it asks first. */
export function SignOut() {
  const user = useUser();
  const messages = useMessages();
  const { account } = messages;
  const router = useRouter();
  const signOut = useSignOut();
  const kept = useKeptDrafts(user.id);
  const [asking, setAsking] = useState(false);

  const leave = () => signOut.mutate(user, { onSuccess: () => router.replace('/sign-in') });
  return (
    <Section id="sign-out" title={account.signOut}>
      {signOut.isError && (
        <Notice live>
          {signOut.error instanceof TypeError
            ? account.notReached
            : describeFault(signOut.error, messages)}
        </Notice>
      )}
      {asking ? (
        <View style={{ gap: space.sm }}>
          <Notice live icon="kept">
            {account.unsent(kept)}
          </Notice>
          <Button kind="primary" label={account.stay} onPress={() => setAsking(false)} />
          <Button label={account.signOutAnyway} onPress={leave} busy={signOut.isPending} />
        </View>
      ) : (
        <Button
          label={account.signOut}
          onPress={kept > 0 ? () => setAsking(true) : leave}
          busy={signOut.isPending}
        />
      )}
    </Section>
  );
}
