import type { ReactElement } from 'react';

import type { Warning } from '#shared/engineering/input';

import { Section } from '../../components/ui/Section.tsx';

/** Drift is said to be missing rather than shown as zero. */
export function DriftNote({ warnings }: { warnings: readonly Warning[] }): ReactElement {
  const warning = warnings.find((one) => one.code === 'drift-not-available');
  return (
    <Section title="Drift">
      <p className="mt-2 font-medium">Drift: not available</p>
      <p className="mt-1 max-w-[68ch] text-data text-graphite">
        {warning?.message ??
          'Drift, torsion ratio and stability come only from the solution over the whole height of the building.'}
      </p>
      <p className="mt-1 max-w-[68ch] text-data text-graphite">
        Sharing each story by relative rigidity gives shares of force and no displacement.
      </p>
    </Section>
  );
}
