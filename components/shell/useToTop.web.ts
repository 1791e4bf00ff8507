import { useEffect, useRef } from 'react';

/** When a screen shows something else without another address, it starts at its top, as a new page does. */
export function useToTop(shown: string): void {
  const before = useRef(shown);
  useEffect(() => {
    if (before.current === shown) return;
    before.current = shown;
    window.scrollTo(0, 0);
    document.getElementById('content')?.focus({ preventScroll: true });
  }, [shown]);
}
