import { createContext, use, useEffect, useMemo, useState, type ReactNode } from 'react';
import { themes, type Colours, type Strokes, type ThemeName } from './tokens';

export interface Theme {
  readonly name: ThemeName;
  readonly colours: Colours;
  readonly strokes: Strokes;
  readonly setTheme: (name: ThemeName) => void;
}

const STORED_AS = 'polewright.theme';

const ThemeContext = createContext<Theme | null>(null);

function storedTheme(): ThemeName {
  try {
    return globalThis.localStorage?.getItem(STORED_AS) === 'sun' ? 'sun' : 'light';
  } catch {
    // Storage may be switched off in the browser; the theme is then only for this visit.
    return 'light';
  }
}

function remembering(choose: (name: ThemeName) => void) {
  return function setTheme(next: ThemeName) {
    choose(next);
    try {
      globalThis.localStorage?.setItem(STORED_AS, next);
    } catch {
      // As above: nowhere to remember it.
    }
  };
}

/** Holds the chosen theme for everything inside it and remembers it in this browser. */
export function ThemeProvider({ children }: { children: ReactNode }) {
  const [name, setName] = useState(storedTheme);
  useEffect(() => {
    const root = globalThis.document?.documentElement;
    if (!root) return;
    const { colours } = themes[name];
    // What only a style sheet can say, focus and hover, takes its colours from here.
    root.style.setProperty('--ground', colours.ground);
    root.style.setProperty('--surface', colours.surface);
    root.style.setProperty('--hover', colours.hover);
    root.style.setProperty('--focus', colours.focus);
    root.style.backgroundColor = colours.ground;
    document.querySelector('meta[name="theme-color"]')?.setAttribute('content', colours.surface);
  }, [name]);

  const theme = useMemo(() => ({ name, ...themes[name], setTheme: remembering(setName) }), [name]);

  return <ThemeContext value={theme}>{children}</ThemeContext>;
}

/** The theme in force. Throws outside a ThemeProvider. */
export function useTheme(): Theme {
  const theme = use(ThemeContext);
  if (!theme) throw new Error('useTheme needs a ThemeProvider above it');
  return theme;
}
