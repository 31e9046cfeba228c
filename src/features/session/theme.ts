export type Theme = 'system' | 'light' | 'dark';

export const themes: { value: Theme; text: string }[] = [
  { value: 'system', text: "The system's theme" },
  { value: 'light', text: 'Light' },
  { value: 'dark', text: 'Dark' },
];

/** The same key as in public/theme.js, which applies it before the first paint. */
const key = 'tautline-theme';

export function chosenTheme(): Theme {
  const stored = localStorage.getItem(key);
  return stored === 'light' || stored === 'dark' ? stored : 'system';
}

export function chooseTheme(theme: Theme): Theme {
  if (theme === 'system') {
    localStorage.removeItem(key);
    delete document.documentElement.dataset.theme;
  } else {
    localStorage.setItem(key, theme);
    document.documentElement.dataset.theme = theme;
  }
  return theme;
}
