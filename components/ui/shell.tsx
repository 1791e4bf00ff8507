import { createContext, useContext } from 'react';
import type { Href } from 'expo-router';

export interface Place {
  key: string;
  label: string;
  href: Href;
}

export interface Shell {
  /** The signed-in person as the header names them. */
  person?: { name: string; role: string; href: Href };
  /** Where this person can go, in the order of the header. */
  places: readonly Place[];
  homeHref?: Href;
}

/** What every header shows, given by the signed-in layout; a screen outside it shows the mark only. */
export const ShellContext = createContext<Shell>({ places: [] });

export function useShell(): Shell {
  return useContext(ShellContext);
}
