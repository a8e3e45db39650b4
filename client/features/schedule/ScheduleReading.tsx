import type { ReactElement } from 'react';

import type { ResultCheck } from '#shared/contracts/result';
import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import type { BuildingInput, UnitSystem } from '#shared/engineering/input';
import { formatSteelRatio } from '#shared/format/force';
import { formatRatio } from '#shared/format/ratio';

import { columnText, type EditedColumn } from './cellText.ts';
import { parseColumn, type BandElevations } from './parseColumn.ts';
import { distributedSteelRatio, sayCells } from './sayCells.ts';
import { sayGoverns } from './scheduleColumns.tsx';
import { usePreview } from './usePreview.ts';

export interface ScheduleReadingProps {
  column: EditedColumn;
  draft: string;
  row: ScheduleResourceRow;
  rows: readonly ScheduleResourceRow[];
  checks: readonly ResultCheck[];
  levels: readonly string[];
  units: UnitSystem;
  band: BandElevations;
  input: BuildingInput | null;
}

/** What the typed text is taken for: in words, against the least steel, the ratio before and after, the automatic choice. */
export function ScheduleReading(props: ScheduleReadingProps): ReactElement | null {
  const { column, draft, row, rows, checks, levels, units, band, input } = props;
  const parsed = parseColumn(column, draft, row, units, band);
  const own = parsed.ok ? parsed.value : null;
  const preview = usePreview(input, rows, row, own);
  if (!parsed.ok || own === null) return null;
  const curtains = own.vertical ?? own.horizontal;
  const provided = curtains ? distributedSteelRatio(curtains, row.thickness, units) : null;
  const needed = curtains
    ? leastSteel(checks, row, levels, own.vertical ? 'vertical-steel' : 'horizontal-steel')
    : null;
  return (
    <>
      <span>
        <b>reads as</b>
        {sayCells(own, units)}
      </span>
      {provided === null ? null : (
        <span>
          <b>{own.vertical ? 'ρℓ' : 'ρt'} of the whole thickness</b>
          {formatSteelRatio(provided)}
          {needed === null ? '' : ` ${provided >= needed - 1e-12 ? '≥' : '<'} ${formatSteelRatio(needed)}`}
        </span>
      )}
      <span data-preview={preview === null ? 'waiting' : 'computed'}>
        <b>{sayGoverns(row)}</b>
        {row.ratio === null ? '–' : formatRatio(row.ratio)} →{' '}
        {preview === null ? '…' : preview === 'not computed' ? preview : sayAfter(preview)}
      </span>
      <span>
        <b>auto</b>
        <span className="mono">{columnText(column, row.automatic, units)}</span>
      </span>
    </>
  );
}

function sayAfter(preview: { ratio: number | null; ok: boolean; check: string | null; level: string | null }): string {
  const place = preview.check === null ? '' : ` ${preview.check.replaceAll('-', ' ')} ${preview.level ?? ''}`;
  const ratio = preview.ratio === null ? '–' : formatRatio(preview.ratio);
  return preview.ok ? `${ratio}${place}` : `${ratio} over,${place}`;
}

/** The largest least ratio of distributed steel that the checks of the row's stories ask for. */
function leastSteel(
  checks: readonly ResultCheck[],
  row: ScheduleResourceRow,
  levels: readonly string[],
  name: 'vertical-steel' | 'horizontal-steel',
): number | null {
  const demands = checks
    .filter((check) => check.wall === row.wall && check.check === name && levels.includes(check.level))
    .map((check) => check.demand);
  return demands.length === 0 ? null : Math.max(...demands);
}
