import type { Preferences } from '@lampwright/contracts';

export type ThemeChoice = Preferences['theme'];

/** Read by `public/theme.js` before the first paint. */
const KEY = 'lampwright.theme';

const deviceIsDark = () => window.matchMedia('(prefers-color-scheme: dark)');

/** Shows a theme now and keeps the choice for the next start of this browser. */
function applyTheme(choice: ThemeChoice): void {
  const dark = choice === 'system' ? deviceIsDark().matches : choice === 'dark';
  const name = dark ? 'dark' : 'light';
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

/** Applies a choice, and again whenever the device turns dark or light; answers how to stop. */
export function followTheme(choice: ThemeChoice): () => void {
  const apply = () => applyTheme(choice);
  const device = deviceIsDark();
  apply();
  device.addEventListener('change', apply);
  return () => device.removeEventListener('change', apply);
}
