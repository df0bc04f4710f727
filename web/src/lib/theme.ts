import { useState } from 'react';

export type Theme = 'system' | 'light' | 'dark';
const key = 'tubeplate.theme';

function remembered(): Theme {
  const chosen = document.documentElement.dataset['theme'];
  return chosen === 'light' || chosen === 'dark' ? chosen : 'system';
}

/** The chosen theme; the system's own unless one was picked. */
export function useTheme(): [Theme, (next: Theme) => void] {
  const [theme, setTheme] = useState<Theme>(remembered);
  return [
    theme,
    (next) => {
      setTheme(next);
      if (next === 'system') delete document.documentElement.dataset['theme'];
      else document.documentElement.dataset['theme'] = next;
      try {
        if (next === 'system') localStorage.removeItem(key);
        else localStorage.setItem(key, next);
      } catch {
        // Not remembered; the choice holds for this visit.
      }
    },
  ];
}
