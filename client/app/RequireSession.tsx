import { Navigate, Outlet, useLocation } from 'react-router-dom';

import { useSession } from '../data/queries.ts';
import { ErrorState } from './ErrorState.tsx';
import { paths } from './paths.ts';

/** Pages below ask for a session; without one the way leads over sign in and back. */
export function RequireSession() {
  const session = useSession();
  const { pathname, search } = useLocation();
  if (session.data !== undefined) return <Outlet />;
  if (session.isPending) return null;
  if (session.error?.code === 'no-session') {
    const to = pathname === '/' ? '' : `?to=${encodeURIComponent(`${pathname}${search}`)}`;
    return <Navigate to={`${paths.signIn}${to}`} replace />;
  }
  return session.error === null ? null : (
    <main className="bg-sheet px-5 py-6">
      <ErrorState error={session.error} place="Groundward" onRetry={() => void session.refetch()} wholePage />
    </main>
  );
}
