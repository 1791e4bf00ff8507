import { useRef } from 'react';
import type { View } from 'react-native';

/** On a phone app the button at the foot loads more. */
export function useAtEnd(_onEnd: () => void, _enabled: boolean) {
  return useRef<View>(null);
}
