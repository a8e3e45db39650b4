import { useCallback, useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';

import type { Variant } from '#shared/contracts/result';

/** What a colleague should see when the link is shared: story, wall, case, variant, basis. Null: the page takes its first. */
export interface Choice {
  readonly level: string | null;
  readonly wall: string | null;
  readonly case: string | null;
  readonly variant: Variant;
  /** as the address names it; a page shows it where it was computed */
  readonly basis: string | null;
}

const names = ['level', 'wall', 'case', 'variant', 'basis'] as const;

const toVariant = (text: string | null): Variant => (text === '+' || text === '-' ? text : '0');

/** Reads the choice from the URL and writes parts of it back; the other parameters of the page stay. */
export function useChoice(): readonly [Choice, (part: Partial<Choice>) => void] {
  const [parameters, setParameters] = useSearchParams();
  const choice = useMemo<Choice>(
    () => ({
      level: parameters.get('level'),
      wall: parameters.get('wall'),
      case: parameters.get('case'),
      variant: toVariant(parameters.get('variant')),
      basis: parameters.get('basis'),
    }),
    [parameters],
  );
  const choose = useCallback(
    (part: Partial<Choice>) => {
      setParameters(
        (before) => {
          const after = new URLSearchParams(before);
          for (const name of names) {
            const value = part[name];
            if (value === undefined) continue;
            if (value === null || (name === 'variant' && value === '0')) after.delete(name);
            else after.set(name, value);
          }
          return after;
        },
        { replace: true },
      );
    },
    [setParameters],
  );
  return [choice, choose];
}

/** The part of the query that goes with the reader from page to page. */
export function carriedSearch(search: string): string {
  const before = new URLSearchParams(search);
  const after = new URLSearchParams();
  for (const name of names) {
    const value = before.get(name);
    if (value !== null) after.set(name, value);
  }
  const text = after.toString();
  return text === '' ? '' : `?${text}`;
}
