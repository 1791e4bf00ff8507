import { useEffect } from 'react';
import type { Locale } from '@/shared/user';
import type { ThemeName } from '../theme/tokens';

interface Look {
  theme: ThemeName;
  locale: Locale;
  /** Colour of the page behind everything, and of the browser's own bar. */
  ground: string;
}

/** Tells the page itself its theme and its language; `base.css` and screen readers follow. */
export function usePageLook({ theme, locale, ground }: Look): void {
  useEffect(() => {
    const root = document.documentElement;
    root.dataset.theme = theme;
    root.lang = locale;
    document
      .querySelectorAll('meta[name="theme-color"]')
      .forEach((meta) => meta.setAttribute('content', ground));
  }, [theme, locale, ground]);
}
