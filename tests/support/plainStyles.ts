import { vi } from 'vitest';

const PLAIN: Readonly<Record<string, string>> = {
  display: 'block',
  visibility: 'visible',
  'pointer-events': 'auto',
  pointerEvents: 'auto',
};

/**
 * Looking up an accessible name asks for the computed style of every node on
 * the way, and jsdom matches each against the whole style sheet: seconds on a
 * large screen. For screens that hide nothing by style.
 */
export function usePlainStyles(): void {
  const style = { ...PLAIN, getPropertyValue: (name: string) => PLAIN[name] ?? '' };
  vi.stubGlobal('getComputedStyle', () => style);
  window.getComputedStyle = () => style as unknown as CSSStyleDeclaration;
}
