import { createContext, useContext, useInsertionEffect, useSyncExternalStore, type ReactNode } from 'react';

import { globalCss } from './global-css';
import { SettingOwner, useLocalSetting } from './local-setting';
import { palettes, type Palette } from './tokens';

export type ThemeChoice = 'system' | 'light' | 'dark';

export const THEME_CHOICES: readonly ThemeChoice[] = ['system', 'light', 'dark'];

export interface Theme {
  /** What is shown now. */
  readonly name: 'light' | 'dark';
  /** What the person asked for; 'system' follows the device. */
  readonly choice: ThemeChoice;
  readonly setChoice: (next: ThemeChoice) => void;
  /** Hex values, for what cannot take a CSS variable. Styles use `color` of tokens.ts. */
  readonly palette: Palette;
}

const ThemeContext = createContext<Theme>({
  name: 'light',
  choice: 'system',
  setChoice: () => undefined,
  palette: palettes.light,
});

/** The theme in force. Most components do not need it: `color.ink` and the like follow the theme by themselves. */
export const useTheme = (): Theme => useContext(ThemeContext);

export interface ThemeProviderProps {
  /** Whose settings hold; leave out before sign-in. */
  readonly personId?: string;
  readonly children: ReactNode;
}

/** Puts the themes into the page, follows the device, and keeps each person's own choice on this device. */
export function ThemeProvider({ personId = 'anyone', children }: ThemeProviderProps) {
  return (
    <SettingOwner.Provider value={personId}>
      <Themed>{children}</Themed>
    </SettingOwner.Provider>
  );
}

function Themed({ children }: { readonly children: ReactNode }) {
  const [choice, setChoice] = useLocalSetting('theme', THEME_CHOICES, 'system');
  const systemIsDark = useSyncExternalStore(subscribeToSystem, readSystem, () => false);
  const name = choice === 'system' ? (systemIsDark ? 'dark' : 'light') : choice;

  useInsertionEffect(addGlobalCss, []);
  useInsertionEffect(() => {
    if (choice === 'system') delete document.documentElement.dataset.theme;
    else document.documentElement.dataset.theme = choice;
  }, [choice]);

  return (
    <ThemeContext.Provider value={{ name, choice, setChoice, palette: palettes[name] }}>
      {children}
    </ThemeContext.Provider>
  );
}

const STYLE_ID = 'offsquare-global';

function addGlobalCss(): void {
  if (document.getElementById(STYLE_ID)) return;
  const style = document.createElement('style');
  style.id = STYLE_ID;
  style.textContent = globalCss();
  document.head.append(style);
}

const DARK = '(prefers-color-scheme: dark)';

function subscribeToSystem(listener: () => void): () => void {
  const query = window.matchMedia(DARK);
  query.addEventListener('change', listener);
  return () => query.removeEventListener('change', listener);
}

const readSystem = (): boolean => window.matchMedia(DARK).matches;
