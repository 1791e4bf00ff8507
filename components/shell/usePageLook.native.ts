import type { Locale } from '@/shared/user';
import type { ThemeName } from '../theme/tokens';

interface Look {
  theme: ThemeName;
  locale: Locale;
  ground: string;
}

/** A phone app has no page around it. */
export function usePageLook(_look: Look): void {}
