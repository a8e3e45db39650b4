import type { ResultCheck } from '../contracts/result.ts';
import type { StoryDrift } from '../engineering/drift/storyDrifts.ts';
import type { Analysis } from '../engineering/stages.ts';

/** Common practice for wind: 1/400 of the story height, and of the total height. No code value. */
const windLimit = 1 / 400;

/**
 * Drift of every story against its limit, the worst case and variant of each kind (rows of the basis `compatible`, no wall): seismic
 * Cd/Ie x elastic drift at strength level against ASCE/SEI 7 Table 12.12-1 or the typed limit, at the edges where the torsion ratio is
 * above 1.2; wind at windDriftFactor of strength against 1/400, story and total.
 */
export function driftCheckRows(analysis: Analysis): ResultCheck[] {
  const { model, drifts } = analysis;
  const { settings } = model;
  const rows: ResultCheck[] = [];
  for (let story = model.stories.length - 1; story >= 0; story -= 1) {
    const here = drifts.filter((drift) => drift.story === story);
    const seismic = worstOf(here, 'seismic', settings.strengthFactor.seismic * (settings.cd / settings.ie));
    const wind = worstOf(here, 'wind', settings.strengthFactor.wind * settings.windDriftFactor);
    const level = model.stories[story]?.level ?? '';
    if (seismic) rows.push(row(level, 'drift', 'ASCE/SEI 7 12.12.1', seismic, settings.driftLimit));
    if (wind) rows.push(row(level, 'drift-wind', 'common practice', wind, windLimit));
  }
  const total = totalWind(analysis);
  if (total)
    rows.push(
      row(
        model.stories[model.stories.length - 1]?.level ?? '',
        'drift-wind-total',
        'common practice',
        total,
        windLimit,
      ),
    );
  return rows;
}

interface Worst {
  readonly demand: number;
  readonly combination: string;
}

function worstOf(drifts: readonly StoryDrift[], kind: StoryDrift['kind'], factor: number): Worst | null {
  let worst: Worst | null = null;
  const accidental = drifts.some((drift) => drift.kind === kind && drift.variant !== '0');
  for (const drift of drifts) {
    if (drift.kind !== kind || (accidental && kind === 'seismic' && drift.variant === '0')) continue;
    const demand = factor * driftValue(drift);
    if (worst === null || demand > worst.demand) worst = { demand, combination: nameOf(drift) };
  }
  return worst;
}

const driftValue = (drift: StoryDrift): number =>
  (drift.torsionRatio ?? 0) > 1.2 ? drift.edge : Math.abs(drift.direction === 'x' ? drift.x : drift.y);

const nameOf = ({ case: name, variant }: StoryDrift): string =>
  variant === '0' ? name : `${name} at ${variant === '+' ? '+' : '−'}e`;

/** Total drift of each wind case over the height of the building. */
function totalWind({ model, drifts }: Analysis): Worst | null {
  const { settings, stories } = model;
  const height = stories.reduce((sum, story) => sum + story.heightIn, 0);
  const byCase = new Map<string, number>();
  for (const drift of drifts) {
    if (drift.kind !== 'wind') continue;
    const own = (drift.direction === 'x' ? drift.x : drift.y) * (stories[drift.story]?.heightIn ?? 0);
    byCase.set(drift.case, (byCase.get(drift.case) ?? 0) + own);
  }
  let worst: Worst | null = null;
  for (const [combination, sum] of byCase) {
    const demand = (settings.strengthFactor.wind * settings.windDriftFactor * Math.abs(sum)) / height;
    if (worst === null || demand > worst.demand) worst = { demand, combination };
  }
  return worst;
}

function row(level: string, check: string, clause: string, { demand, combination }: Worst, limit: number): ResultCheck {
  const ratio = demand / limit;
  return {
    basis: 'compatible',
    level,
    wall: '',
    check,
    demand,
    capacity: limit,
    unit: '',
    ratio,
    clause,
    combination,
    ok: ratio <= 1 + 1e-9,
  };
}
