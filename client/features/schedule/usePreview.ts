import { useEffect, useState } from 'react';

import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import type { BuildingInput } from '#shared/engineering/input';
import type { OwnCells } from '#shared/engineering/wall-design/designTypes';

import { canonicalText } from '../../engine/canonicalText.ts';
import { engine } from '../../engine/engine.ts';
import { pinnedWith } from '../../engine/pinnedBands.ts';

export interface Preview {
  readonly ratio: number | null;
  readonly check: string | null;
  readonly level: string | null;
  readonly ok: boolean;
}

/** The row as it would be checked with the cells typed, computed by the page's worker; null until it has answered. */
export function usePreview(
  input: BuildingInput | null,
  rows: readonly ScheduleResourceRow[],
  row: ScheduleResourceRow,
  own: OwnCells | null,
): Preview | 'not computed' | null {
  // the text stands for the cells: it stays the same while they do
  const text = own === null ? null : canonicalText(own);
  const [answer, setAnswer] = useState<{ text: string; rowId: string; preview: Preview | 'not computed' } | null>(null);
  useEffect(() => {
    const client = text === null || !input ? null : engine('preview');
    if (!client || !input || text === null) return undefined;
    let current = true;
    const typed = JSON.parse(text) as OwnCells;
    void client.run(input, { pinned: pinnedWith(rows, row.id, typed) }).then((outcome) => {
      if (!current || outcome.kind === 'superseded') return;
      if (outcome.kind !== 'computed') {
        setAnswer({ text, rowId: row.id, preview: 'not computed' });
        return;
      }
      const after = outcome.document.schedule.find(
        (one) => one.wall === row.wall && one.from === row.from && one.to === row.to,
      );
      if (!after) return;
      const { ratio, governs, ok } = after;
      const preview = { ratio, check: governs?.check ?? null, level: governs?.level ?? null, ok };
      setAnswer({ text, rowId: row.id, preview });
    });
    return () => {
      current = false;
    };
  }, [text, input, rows, row]);
  return answer !== null && answer.text === text && answer.rowId === row.id ? answer.preview : null;
}
