import type { ReactElement } from 'react';

import type { Comparison } from '../../engine/useComparison.ts';

function sentence(comparison: Comparison): string {
  switch (comparison.kind) {
    case 'waiting':
      return 'computing here';
    case 'equal':
      return 'equal';
    case 'different':
      return `different in ${comparison.parts.join(', ')}. Reload the page; if it stays, tell your office admin`;
    case 'none':
      return `not compared, ${comparison.reason}`;
  }
}

/** The page computes what the server computed; a difference in any bit is said. */
export function RecomputeLine({ comparison }: { comparison: Comparison }): ReactElement {
  const differs = comparison.kind === 'different';
  return (
    <p
      className={`mt-2 text-note ${differs ? 'gw-problem font-semibold text-oxide' : 'text-graphite'}`}
      data-comparison={comparison.kind}
    >
      Computed here and on the server: {sentence(comparison)}
    </p>
  );
}
