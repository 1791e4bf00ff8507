import { cleanup } from '@testing-library/react';
import { afterEach, vi } from 'vitest';

/* The router needs a running navigator; a component only needs links that lead somewhere. */
vi.mock('expo-router', () => import('./routerFake'));

afterEach(() => cleanup());

/* jsdom has no layout: everything is as wide as a phone unless a test says otherwise. */
Object.defineProperty(window, 'matchMedia', {
  writable: true,
  value: (query: string) => ({
    matches: false,
    media: query,
    addEventListener: () => undefined,
    removeEventListener: () => undefined,
    addListener: () => undefined,
    removeListener: () => undefined,
  }),
});
window.scrollTo = () => undefined;
Element.prototype.scrollIntoView = () => undefined;
