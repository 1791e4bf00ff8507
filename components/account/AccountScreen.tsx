import { View } from 'react-native';
import { useUser } from '../api/session';
import { dateText } from '@/shared/format';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { Screen, Text } from '../ui';
import { Appearance } from './Appearance';
import { Devices } from './Devices';
import { Security } from './Security';
import { Sessions } from './Sessions';
import { SignOut } from './SignOut';

/** The person's own account: how it looks, what it signs with, where it is open. */
export function AccountScreen() {
  const user = useUser();
  const locale = useLocale();
  const { account, home } = useMessages();
  const qualified =
    user.qualifiedThrough === null
      ? account.notQualified
      : account.qualifiedThrough(dateText(locale, user.qualifiedThrough));
  return (
    <Screen
      title={user.name}
      subtitle={`${home.role[user.role]}, ${user.email}`}
      headerEnd={<View />}
      back={{ label: account.back, href: '/' }}
    >
      <Text style={{ paddingBottom: space.lg }}>{qualified}</Text>
      <Appearance />
      <Security />
      <Devices />
      <Sessions />
      <SignOut />
    </Screen>
  );
}
