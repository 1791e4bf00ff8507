import { PasswordForgottenScreen } from '@/components/account/PasswordForgottenScreen';

export default function PasswordForgottenRoute() {
  return <PasswordForgottenScreen />;
}
