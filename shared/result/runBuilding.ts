import type { ResultAction, ResultDocument } from '../contracts/result.ts';
import type { BuildingInput, Problem, Warning } from '../engineering/input.ts';
import { checkTables } from '../engineering/model/check-tables/checkTables.ts';
import { chain } from '../engineering/stages.ts';
import type { ChainOutcome, StageName } from '../engineering/stages.ts';
import { unitFactors } from '../engineering/units.ts';
import { engineVersion } from '../engineering/version.ts';
import type { DesignRow, PinnedBand } from '../engineering/wall-design/designTypes.ts';

import {
  balanceRows,
  displacementRows,
  distributionRows,
  driftRows,
  gravityRows,
  lateralRows,
  levelRows,
  rigidityRows,
  transferredRows,
} from './analysisRows.ts';
import { collectWarnings } from './collectWarnings.ts';
import { checkRows, envelopeRows, quantityRows, scheduleRows, wallActions } from './designRows.ts';
import { driftCheckRows } from './driftChecks.ts';
import type { CombinationSet } from './readCombinations.ts';
import { readCombinations } from './readCombinations.ts';
import { unsettledRows } from './unsettledRows.ts';
import { settleWarnings, type Acknowledged } from './warningFacts.ts';

export interface RunOptions {
  /** milliseconds of any steady clock; without it `timing` reads 0 */
  readonly now?: () => number;
  /** every expanded combination in `actions`, not only those that govern */
  readonly allActions?: boolean;
  /** what was said when the files were read; it stands with the warnings */
  readonly notices?: readonly Warning[];
  /** stories that carry an engineer's own cells */
  readonly pinned?: readonly PinnedBand[];
  /** warnings that an engineer has settled; one counts while its facts stand */
  readonly acknowledged?: readonly Acknowledged[];
}

export type RunOutcome =
  | {
      readonly ok: true;
      readonly document: ResultDocument;
      /** the rows behind `document.schedule`, in the same order, with what automatic choice says beside what stands */
      readonly rows: readonly DesignRow[];
      /** every expanded combination, a wall at a time: for the streaming writer */
      readonly allActions: () => Generator<readonly ResultAction[]>;
    }
  | { readonly ok: false; readonly problems: readonly Problem[] };

/** The whole chain from what was typed to the result document: the one entry of command, server and page. */
export function runBuilding(input: BuildingInput, options: RunOptions = {}): RunOutcome {
  const now = options.now ?? (() => 0);
  const timing: Record<string, number> = {};
  const start = now();
  const checked = checkTables(input, { complete: true });
  if (checked.problems.length > 0) return { ok: false, problems: checked.problems };
  const set = readCombinations(input);
  if ('problems' in set) return { ok: false, problems: set.problems };
  timing.read = now() - start;

  const outcome = drive(input, set, options.pinned ?? [], now, timing);
  if (!outcome.ok) return outcome;
  const writing = now();
  const answer = write(input, set, outcome, [...(options.notices ?? []), ...checked.notices], options);
  timing.write = now() - writing;
  timing.total = now() - start;
  const units = unitFactors[input.settings.units];
  return {
    ok: true,
    document: { ...answer.document, timing },
    rows: answer.rows,
    allActions: function* () {
      for (const wall of outcome.walls) yield wallActions(wall, units, true);
    },
  };
}

/** Runs the stages one after the other and adds up the time of each by name. */
function drive(
  building: BuildingInput,
  set: CombinationSet,
  pinned: readonly PinnedBand[],
  now: () => number,
  timing: Record<string, number>,
): ChainOutcome {
  const stages = chain({ building, combinations: set.combinations, pinned });
  let since = now();
  let step = stages.next();
  while (step.done !== true) {
    const name: StageName = step.value;
    timing[name] = (timing[name] ?? 0) + now() - since;
    since = now();
    step = stages.next();
  }
  return step.value;
}

function write(
  building: BuildingInput,
  set: CombinationSet,
  outcome: Extract<ChainOutcome, { ok: true }>,
  notices: readonly Warning[],
  { allActions = false, acknowledged = [] }: RunOptions,
): { readonly document: ResultDocument; readonly rows: readonly DesignRow[] } {
  const { analysis, walls } = outcome;
  const { settings } = building;
  const units = unitFactors[settings.units];
  const warnings = settleWarnings(building, collectWarnings(building, analysis, walls, set, notices), acknowledged);
  const { rows, schedule } = scheduleRows(
    analysis,
    walls,
    units,
    unsettledRows(analysis.model.stories, walls, warnings),
  );
  const document: ResultDocument = {
    units: settings.units,
    code: settings.code,
    loads: settings.loads,
    basis: settings.basis,
    engine: engineVersion,
    warnings,
    timing: {},
    levels: levelRows(analysis, units),
    rigidities: rigidityRows(analysis, units),
    distribution: distributionRows(analysis, units),
    drifts: driftRows(analysis),
    displacements: displacementRows(analysis, units),
    lateral: lateralRows(analysis, units),
    gravity: gravityRows(analysis, units),
    transferred: transferredRows(analysis, units),
    actions: walls.flatMap((wall) => wallActions(wall, units, allActions)),
    checks: [
      ...checkRows(walls, settings.units, units),
      ...(settings.basis.includes('envelope') ? envelopeRows(walls, settings.units, units) : []),
      ...driftCheckRows(analysis),
    ],
    schedule,
    quantities: quantityRows(walls, units),
    balance: balanceRows(analysis, units),
  };
  return { document, rows };
}
