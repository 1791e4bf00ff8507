import { Slot } from 'expo-router';
import { SignedIn } from '@/components/shell/SignedIn';

export default function SignedInLayout() {
  return (
    <SignedIn>
      <Slot />
    </SignedIn>
  );
}
