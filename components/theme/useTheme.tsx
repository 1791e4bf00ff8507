import { createContext, useContext, useMemo, type ReactNode } from 'react';
import { useColorScheme } from 'react-native';
import type { ThemeChoice } from '@/shared/user';
import { themes, type Colors, type ThemeName } from './tokens';

export interface Theme {
  name: ThemeName;
  colors: Colors;
}

const ThemeContext = createContext<Theme>({ name: 'light', colors: themes.light });

/** The colours in force. Outside a provider, as in a component test: the light ones. */
export function useTheme(): Theme {
  return useContext(ThemeContext);
}

/** Draws what is inside in the chosen theme; `system` follows the device. */
export function ThemeProvider({ choice, children }: { choice: ThemeChoice; children: ReactNode }) {
  const scheme = useColorScheme();
  const name: ThemeName = choice !== 'system' ? choice : scheme === 'dark' ? 'dark' : 'light';
  const theme = useMemo(() => ({ name, colors: themes[name] }), [name]);
  return <ThemeContext value={theme}>{children}</ThemeContext>;
}
