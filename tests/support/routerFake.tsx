import {
  cloneElement,
  createElement,
  isValidElement,
  type ReactElement,
  type ReactNode,
} from 'react';
import { vi } from 'vitest';

export type Href = string | { pathname: string; params?: Record<string, string> };

const address = (href: Href) => (typeof href === 'string' ? href : href.pathname);

export function Link({
  href,
  asChild,
  children,
}: {
  href: Href;
  asChild?: boolean;
  children: ReactNode;
}) {
  if (asChild === true && isValidElement(children)) {
    return cloneElement(children as ReactElement<{ href: string }>, { href: address(href) });
  }
  return createElement('a', { href: address(href) }, children);
}

export const redirected = vi.fn<(href: Href) => void>();
export function Redirect({ href }: { href: Href }) {
  redirected(href);
  return null;
}

export const router = {
  push: vi.fn(),
  replace: vi.fn(),
  back: vi.fn(),
  setParams: vi.fn(),
  canGoBack: () => false,
};
export const useRouter = () => router;
export const usePathname = () => '/';
export const useLocalSearchParams = () => ({});
export const useGlobalSearchParams = () => ({});
export const useFocusEffect = () => undefined;
export const Slot = ({ children }: { children?: ReactNode }) => children ?? null;
export const Stack = Object.assign(Slot, { Screen: () => null });
