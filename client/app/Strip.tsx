import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';

import { Mark } from '../components/ui/Mark.tsx';
import { PersonMenu } from './PersonMenu.tsx';
import { paths } from './paths.ts';
import { ThemeSwitch } from './ThemeSwitch.tsx';

/** Title strip: mark and name, what the page adds, theme and person. */
export function Strip({ children }: { readonly children?: ReactNode }) {
  return (
    <header className="gw-strip">
      <Link className="gw-brand" to={paths.buildings}>
        <Mark size={22} />
        Groundward
      </Link>
      {children ?? <div className="flex-1" />}
      <ThemeSwitch />
      <PersonMenu />
    </header>
  );
}
