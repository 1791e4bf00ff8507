import { useEffect, useRef, useState } from 'react';
import { Dimensions, type View } from 'react-native';

const LOOK_MS = 400;

/**
 * Whether what stands at `ref` has been on screen, above the `covered` px at
 * the foot that a bar hides. Once seen it stays seen.
 */
export function useSeen(covered: number) {
  const ref = useRef<View>(null);
  const [seen, setSeen] = useState(false);
  useEffect(() => {
    if (seen) return undefined;
    const timer = setInterval(() => {
      ref.current?.measureInWindow((_x, y, _width, height) => {
        const foot = Dimensions.get('window').height - covered;
        if (height > 0 && y >= 0 && y + height <= foot) setSeen(true);
      });
    }, LOOK_MS);
    return () => clearInterval(timer);
  }, [seen, covered]);
  return { ref, seen };
}
