import { useLocalSearchParams } from 'expo-router';
import { NewPasswordScreen } from '@/components/account/NewPasswordScreen';

export default function InvitationRoute() {
  const { token } = useLocalSearchParams<{ token: string }>();
  return <NewPasswordScreen token={token} kind="invitation" />;
}
