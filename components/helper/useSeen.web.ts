import { useEffect, useRef, useState } from 'react';
import type { View } from 'react-native';

/**
 * Whether what stands at `ref` has been on screen, above the `covered` px at
 * the foot that a bar hides. Once seen it stays seen.
 */
export function useSeen(covered: number) {
  const ref = useRef<View>(null);
  const [seen, setSeen] = useState(false);
  useEffect(() => {
    const element = ref.current as unknown as Element | null;
    if (seen || element === null) return undefined;
    const observer = new IntersectionObserver(
      (entries) => {
        if (entries.some(({ isIntersecting }) => isIntersecting)) setSeen(true);
      },
      { rootMargin: `0px 0px -${covered}px 0px` },
    );
    observer.observe(element);
    return () => observer.disconnect();
  }, [seen, covered]);
  return { ref, seen };
}
