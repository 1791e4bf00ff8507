import { useUser } from '../api/session';
import { dateText } from '@/shared/format';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { Facts, Screen } from '../ui';
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
      back={{ label: account.back, href: '/' }}
    >
      <Facts facts={[{ label: account.title, value: qualified }]} />
      <Appearance />
      <Security />
      <Devices />
      <Sessions />
      <SignOut />
    </Screen>
  );
}
