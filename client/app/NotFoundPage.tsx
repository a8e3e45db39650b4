import { ApiError } from '../data/ApiError.ts';
import { ErrorState } from './ErrorState.tsx';
import { Foot } from './Foot.tsx';
import { Strip } from './Strip.tsx';
import { usePageTitle } from './usePageTitle.ts';

const notFound = new ApiError('not-found', 404, '');

export function NotFoundPage() {
  usePageTitle('Not found');
  return (
    <div className="gw-frame gw-frame-wide">
      <Strip />
      <main className="gw-sheet">
        <ErrorState error={notFound} place="Address" wholePage />
      </main>
      <Foot keys={[]} />
    </div>
  );
}
