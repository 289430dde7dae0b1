import type { Preferences } from '@lampwright/contracts';

export type ThemeChoice = Preferences['theme'];

/** Read by `public/theme.js` before the first paint. */
const KEY = 'lampwright.theme';

function isDark(choice: ThemeChoice): boolean {
  if (choice === 'system') return window.matchMedia('(prefers-color-scheme: dark)').matches;
  return choice === 'dark';
}

/** Shows a theme now and keeps the choice for the next start of this browser. */
export function applyTheme(choice: ThemeChoice): void {
  const name = isDark(choice) ? 'dark' : 'light';
  document.documentElement.classList.remove('light', 'dark');
  document.documentElement.classList.add(name);
  document.documentElement.style.colorScheme = name;
  try {
    localStorage.setItem(KEY, choice);
  } catch (error) {
    // With storage shut off the choice holds until the page is closed.
    if (!(error instanceof DOMException)) throw error;
  }
}
