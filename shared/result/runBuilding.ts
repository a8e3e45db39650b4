import type { ResultDocument } from '../contracts/result.ts';
import type { BuildingInput, Problem, Warning } from '../engineering/input.ts';
import { checkTables } from '../engineering/model/check-tables/checkTables.ts';
import { chain } from '../engineering/stages.ts';
import type { Analysis, ChainOutcome, StageName } from '../engineering/stages.ts';
import { unitFactors } from '../engineering/units.ts';
import { engineVersion } from '../engineering/version.ts';
import { baseShearWarnings, combinationWarnings, criteriaWarnings } from '../engineering/warnings/inputWarnings.ts';
import { methodWarnings, unsettles } from '../engineering/warnings/methodWarnings.ts';
import { basisWarnings } from '../engineering/warnings/basisWarnings.ts';
import { driftWarnings } from '../engineering/warnings/driftWarnings.ts';
import { planWarnings } from '../engineering/warnings/planWarnings.ts';
import { materialNotices } from '../engineering/wall-design/materialNotices.ts';
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
import { actionRows, checkRows, envelopeRows, quantityRows, scheduleRows } from './designRows.ts';
import { driftCheckRows } from './driftChecks.ts';
import type { CombinationSet } from './readCombinations.ts';
import { readCombinations } from './readCombinations.ts';

export interface RunOptions {
  /** milliseconds of any steady clock; without it `timing` reads 0 */
  readonly now?: () => number;
  /** every expanded combination in `actions`, not only those that govern */
  readonly allActions?: boolean;
  /** what was said when the files were read; it stands with the warnings */
  readonly notices?: readonly Warning[];
  /** stories that carry an engineer's own cells */
  readonly pinned?: readonly PinnedBand[];
}

export type RunOutcome =
  | {
      readonly ok: true;
      readonly document: ResultDocument;
      /** the rows behind `document.schedule`, in the same order, with what automatic choice says beside what stands */
      readonly rows: readonly DesignRow[];
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
  const answer = write(
    input,
    set,
    outcome,
    [...(options.notices ?? []), ...checked.notices],
    options.allActions ?? false,
  );
  timing.write = now() - writing;
  timing.total = now() - start;
  return { ok: true, document: { ...answer.document, timing }, rows: answer.rows };
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
  allActions: boolean,
): { readonly document: ResultDocument; readonly rows: readonly DesignRow[] } {
  const { analysis, walls } = outcome;
  const { settings } = building;
  const units = unitFactors[settings.units];
  const warnings = collectWarnings(building, analysis, set, notices);
  const waiting = warnings.map((warning) => unsettles(warning, analysis)).filter((rule) => rule !== null);
  const { rows, schedule } = scheduleRows(analysis, walls, units, (wall, story) =>
    waiting.some((rule) => rule(wall, story)),
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
    actions: actionRows(walls, units, allActions),
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

function collectWarnings(
  building: BuildingInput,
  analysis: Analysis,
  set: CombinationSet,
  notices: readonly Warning[],
): Warning[] {
  return [
    ...criteriaWarnings(building, analysis),
    ...planWarnings(building, analysis),
    ...combinationWarnings(analysis, set.combinations, set.zeroLoads),
    ...baseShearWarnings(building, analysis),
    ...analysis.warnings,
    ...methodWarnings(building, analysis),
    ...basisWarnings(analysis),
    ...driftWarnings(analysis),
    ...materialNotices(
      analysis.model.settings,
      analysis.model.walls.flatMap((wall) => wall.segments.map(({ fcPsi }) => fcPsi)),
    ),
    ...notices,
  ];
}
