export type Theme = 'light' | 'night';

const storageKey = 'groundward-theme';
const dark = () => window.matchMedia('(prefers-color-scheme: dark)');

/** What the person chose on this machine; null: the system decides. */
function chosenTheme(): Theme | null {
  const stored = window.localStorage.getItem(storageKey);
  return stored === 'light' || stored === 'night' ? stored : null;
}

export function currentTheme(): Theme {
  return chosenTheme() ?? (dark().matches ? 'night' : 'light');
}

function show(): void {
  document.documentElement.dataset.theme = currentTheme();
}

/** Called once before the first paint; follows the system as long as nobody has chosen. */
export function startTheme(): void {
  show();
  dark().addEventListener('change', show);
}

export function chooseTheme(theme: Theme): void {
  window.localStorage.setItem(storageKey, theme);
  show();
}
