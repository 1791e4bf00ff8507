import { usePathname } from 'expo-router';
import { useEffect, useRef } from 'react';

/**
 * After a step to another screen the page starts at its top and a screen
 * reader at its content. A step back keeps the place that the browser restores.
 */
export function usePageChange(): void {
  const pathname = usePathname();
  const before = useRef(pathname);
  const steppedBack = useRef(false);
  useEffect(() => {
    const handlePop = () => {
      steppedBack.current = true;
    };
    window.addEventListener('popstate', handlePop);
    return () => window.removeEventListener('popstate', handlePop);
  }, []);
  useEffect(() => {
    if (before.current === pathname) return;
    before.current = pathname;
    if (!steppedBack.current) window.scrollTo(0, 0);
    steppedBack.current = false;
    document.getElementById('content')?.focus({ preventScroll: true });
  }, [pathname]);
}
