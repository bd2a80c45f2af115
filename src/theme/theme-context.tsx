import { createContext, type ReactNode, useCallback, useContext, useMemo, useState } from 'react';
import { keep, readKept } from '../kept/kept.ts';

export type ThemeChoice = 'system' | 'light' | 'lamplight';

interface Theme {
  readonly choice: ThemeChoice;
  readonly setChoice: (choice: ThemeChoice) => void;
}

const ThemeContext = createContext<Theme>({ choice: 'system', setChoice: () => undefined });

// public/theme.js applies the kept choice before the first paint; this follows it from then on.
const keptChoice = (): ThemeChoice => {
  const kept = readKept('theme');
  return kept === 'light' || kept === 'lamplight' ? kept : 'system';
};

export function ThemeProvider({ children }: { readonly children: ReactNode }) {
  const [choice, setState] = useState<ThemeChoice>(keptChoice);
  const setChoice = useCallback((next: ThemeChoice) => {
    keep('theme', next === 'system' ? null : next);
    if (next === 'system') delete document.documentElement.dataset.theme;
    else document.documentElement.dataset.theme = next;
    setState(next);
  }, []);
  const theme = useMemo(() => ({ choice, setChoice }), [choice, setChoice]);
  return <ThemeContext value={theme}>{children}</ThemeContext>;
}

export const useTheme = (): Theme => useContext(ThemeContext);

/** Whether the page is in lamplight now, by choice or by the system. */
export const isLamplight = (choice: ThemeChoice): boolean =>
  choice === 'system' ? window.matchMedia('(prefers-color-scheme: dark)').matches : choice === 'lamplight';
