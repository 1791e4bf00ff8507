import { VerifyFormScreen } from '@/components/verify/VerifyFormScreen';

export default function VerifyFormRoute() {
  return <VerifyFormScreen />;
}
