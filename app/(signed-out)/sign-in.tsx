import { useLocalSearchParams } from 'expo-router';
import { SignInScreen } from '@/components/account/SignInScreen';

export default function SignInRoute() {
  const { to } = useLocalSearchParams<{ to?: string }>();
  return <SignInScreen to={to} />;
}
