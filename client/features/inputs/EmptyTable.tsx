import type { EditableTable } from '#shared/contracts/tableColumns';

import { Button } from '../../components/ui/Button.tsx';
import { StateNote } from '../../components/ui/StateNote.tsx';
import { tabNames } from './tabNames.ts';

export interface EmptyTableProps {
  readonly table: EditableTable;
  readonly canEdit: boolean;
  readonly onUpload: () => void;
  readonly onAdd: () => void;
  readonly onTemplate: () => void;
}

const words: Readonly<Record<EditableTable, { title: string; start: string; add: string }>> = {
  levels: {
    title: 'No levels yet',
    start: 'one row a level, from the top down. Walls, forces and gravity follow.',
    add: 'Add a level',
  },
  walls: {
    title: 'No walls yet',
    start: 'one row a wall line, or a band of it: end points, thickness, lowest and highest story.',
    add: 'Add a wall',
  },
  forces: {
    title: 'No forces yet',
    start: 'one row a level and case, with the kind of the case and its force in x and y.',
    add: 'Add a force',
  },
  gravity: {
    title: 'No gravity yet',
    start: 'one row a level and wall, with dead and live load of that floor alone.',
    add: 'Add a row',
  },
  combinations: {
    title: 'No combinations of your own',
    start: 'one expression a row. Without any, the combinations of the load standard in the settings are taken.',
    add: 'Add a combination',
  },
  overrides: {
    title: 'No overrides',
    start:
      'one row a transfer or share, with its reason. A transfer adds shear, axial or moment to a wall in a story; a share sets its part of the story shear.',
    add: 'Add an override',
  },
};

/** What to bring first, then the way. */
export function EmptyTable({ table, canEdit, onUpload, onAdd, onTemplate }: EmptyTableProps) {
  const { title, start, add } = words[table];
  return (
    <StateNote
      art="empty"
      place={`Inputs, ${tabNames[table].toLowerCase()}`}
      title={title}
      actions={
        canEdit ? (
          <>
            <Button look="primary" onClick={onUpload}>
              Upload a table
            </Button>
            <Button onClick={onAdd}>{add}</Button>
            <Button look="text" onClick={onTemplate}>
              Download the template
            </Button>
          </>
        ) : undefined
      }
    >
      <p>
        {canEdit ? (
          <>
            Start with <span className="gw-code">{table}.csv</span>: {start} You can also paste rows from a spreadsheet,
            heads included.
          </>
        ) : (
          'An engineer of the office brings this table in; it stands here from then on.'
        )}
      </p>
    </StateNote>
  );
}
