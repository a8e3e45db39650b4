import { useEffect } from 'react';

/** W outside of a field goes to the next wall, and round. */
export function useWallKey(walls: readonly string[], chosen: string | null, onChoose: (wall: string) => void): void {
  useEffect(() => {
    const onKey = (event: KeyboardEvent): void => {
      if (event.key !== 'w' || event.ctrlKey || event.metaKey || event.altKey || event.defaultPrevented) return;
      const target = event.target;
      if (target instanceof Element && target.closest('input, select, textarea, [role=grid], [role=listbox]')) return;
      const next = walls[(walls.indexOf(chosen ?? '') + 1) % walls.length];
      if (next !== undefined) onChoose(next);
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, [walls, chosen, onChoose]);
}
