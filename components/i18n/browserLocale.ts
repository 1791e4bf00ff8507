import type { Locale } from '@/shared/user';

/** The language that the device is set to, before anybody has chosen one. */
export function browserLocale(): Locale {
  const language = new Intl.DateTimeFormat().resolvedOptions().locale;
  const preferred = typeof navigator === 'undefined' ? language : (navigator.language ?? language);
  return preferred.toLowerCase().startsWith('es') ? 'es-MX' : 'en-US';
}
