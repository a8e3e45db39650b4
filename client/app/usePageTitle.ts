import { useEffect } from 'react';

/** Title of the tab: what is open, then the name of the application. */
export function usePageTitle(part: string | undefined): void {
  useEffect(() => {
    document.title = part === undefined || part === '' ? 'Groundward' : `${part} · Groundward`;
  }, [part]);
}
