import type { ReactElement } from 'react';

import type { OrphanedOverwrite } from '#shared/contracts/schedule';
import type { OverwritableCell } from '#shared/engineering/wall-design/designTypes';
import { printLevelRange } from '#shared/format/levelRange';

import { Button } from '../../components/ui/Button.tsx';

export interface OrphanNotesProps {
  orphans: readonly OrphanedOverwrite[];
  canEdit: boolean;
  onRelease: (id: string, cells: readonly OverwritableCell[]) => void;
}

/** Overwritten cells whose stories are gone: kept until someone lets them go. */
export function OrphanNotes({ orphans, canEdit, onRelease }: OrphanNotesProps): ReactElement | null {
  if (orphans.length === 0) return null;
  return (
    <section aria-label="Overwrites without stories" className="my-2 flex flex-col gap-1 border-y border-rule py-2">
      {orphans.map((orphan) => {
        const cells = Object.keys(orphan.own) as OverwritableCell[];
        return (
          <p key={orphan.id} className="flex items-center gap-3 text-data">
            <span className="border-l-[3px] border-ochre pl-2">
              {orphan.wall}, {printLevelRange(orphan.from, orphan.to)}: these stories are gone. Overwritten{' '}
              {cells.join(', ')} {cells.length === 1 ? 'is' : 'are'} kept and in no row.
            </span>
            {canEdit ? (
              <Button look="text" onClick={() => onRelease(orphan.id, cells)}>
                Release
              </Button>
            ) : null}
          </p>
        );
      })}
    </section>
  );
}
