import type { ReactElement } from 'react';

import type { BuildingResource } from '#shared/contracts/buildings';

import { sentenceOf } from '../../app/errorSentences.ts';
import { Button } from '../../components/ui/Button.tsx';
import { usePatchBuilding } from '../../data/mutations.ts';

/** Adds the envelope to the bases of the building; not there with one basis, nor where the envelope is in use. */
export function EnvelopeButton({ building }: { building: BuildingResource }): ReactElement | null {
  const patch = usePatchBuilding(building.id);
  const { basis, version } = building;
  if (basis.includes('envelope') || basis.length < 2) return null;
  return (
    <>
      {patch.error === null ? null : (
        <span className="gw-problem max-w-[40ch] text-note" role="alert">
          {patch.error.problems[0]?.message ?? sentenceOf(patch.error)}
        </span>
      )}
      <Button
        look="primary"
        disabled={patch.isPending}
        onClick={() => patch.mutate({ version, basis: [...basis, 'envelope'] })}
      >
        Use the envelope
      </Button>
    </>
  );
}
