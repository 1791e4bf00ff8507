import { useEffect, useRef } from 'react';
import type { View } from 'react-native';

/** Calls when what stands at `ref` comes within a screen of the window. */
export function useAtEnd(onEnd: () => void, enabled: boolean) {
  const ref = useRef<View>(null);
  useEffect(() => {
    const element = ref.current as unknown as Element | null;
    if (!enabled || element === null) return undefined;
    const observer = new IntersectionObserver(
      (entries) => {
        if (entries.some(({ isIntersecting }) => isIntersecting)) onEnd();
      },
      { rootMargin: '600px 0px' },
    );
    observer.observe(element);
    return () => observer.disconnect();
  }, [enabled, onEnd]);
  return ref;
}
