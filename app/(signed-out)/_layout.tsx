import { Slot } from 'expo-router';

export default function SignedOutLayout() {
  return <Slot />;
}
