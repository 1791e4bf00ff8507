import { useLocalSearchParams } from 'expo-router';
import { NewPasswordScreen } from '@/components/account/NewPasswordScreen';

export default function ResetRoute() {
  const { token } = useLocalSearchParams<{ token: string }>();
  return <NewPasswordScreen token={token} kind="reset" />;
}
