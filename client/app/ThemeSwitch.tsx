import { useState } from 'react';

import { chooseTheme, currentTheme, type Theme } from './theme.ts';

/** The sheet by day or by night; a cell of the strip. */
export function ThemeSwitch() {
  const [theme, setTheme] = useState<Theme>(currentTheme);
  const next: Theme = theme === 'light' ? 'night' : 'light';
  return (
    <button
      type="button"
      className="gw-cell cursor-pointer"
      role="switch"
      aria-checked={theme === 'night'}
      aria-label="Night"
      onClick={() => {
        chooseTheme(next);
        setTheme(next);
      }}
    >
      <b>Theme</b>
      <span>{theme === 'night' ? 'Night' : 'Light'}</span>
    </button>
  );
}
