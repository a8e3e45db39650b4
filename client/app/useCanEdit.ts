import { useSession } from '../data/queries.ts';

/** Engineers edit; checkers and admins read. The server decides, this only keeps pages from offering what it will refuse. */
export function useCanEdit(): boolean {
  return useSession().data?.person.role === 'engineer';
}
