import type {
  ResultBalance,
  ResultDisplacement,
  ResultDistribution,
  ResultDocument,
  ResultDrift,
  ResultLateral,
  ResultLevel,
  ResultTransferred,
  Variant,
} from '../contracts/result.ts';
import type { LateralAction } from '../engineering/distribution/lateralActions.ts';
import { displacementAt } from '../engineering/drift/edgeDisplacements.ts';
import { gravityCases } from '../engineering/model/model.ts';
import type { Analysis } from '../engineering/stages.ts';
import { listed } from '../engineering/stages.ts';
import type { UnitFactors } from '../engineering/units.ts';

/** Stories from the top down, as levels are read. */
function fromTop(analysis: Analysis): number[] {
  return analysis.model.stories.map((_, index) => analysis.model.stories.length - 1 - index);
}

export function levelRows(analysis: Analysis, units: UnitFactors): ResultLevel[] {
  const { model, actions } = analysis;
  return fromTop(analysis).map((index) => {
    const story = model.stories[index];
    const center = analysis.stiffness[index];
    if (!story) throw new RangeError(`no story ${index}`);
    // maps, since a case may be named __proto__
    const force = new Map<string, { fx: number; fy: number; mz: number }>();
    const shear = new Map<string, { vx: number; vy: number; mz: number }>();
    for (const loadCase of model.cases) {
      force.set(loadCase.name, {
        fx: (loadCase.fxKip[index] ?? 0) / units.force,
        fy: (loadCase.fyKip[index] ?? 0) / units.force,
        mz: (loadCase.mzKipIn[index] ?? 0) / units.moment,
      });
    }
    for (const action of actions) {
      if (action.variant !== '0') continue;
      shear.set(action.case, {
        vx: (action.storyFxKip[index] ?? 0) / units.force,
        vy: (action.storyFyKip[index] ?? 0) / units.force,
        mz: (action.storyTorqueKipIn[index] ?? 0) / units.moment,
      });
    }
    return {
      level: story.level,
      elevation: story.elevationIn / units.planLength,
      height: story.heightIn / units.planLength,
      rigidity: center ? { x: center.centerXIn / units.planLength, y: center.centerYIn / units.planLength } : null,
      force: Object.fromEntries(force),
      shear: Object.fromEntries(shear),
      point: { x: story.xIn / units.planLength, y: story.yIn / units.planLength },
      extent: {
        x: story.extentXIn / units.planLength,
        y: story.extentYIn / units.planLength,
        edgeX: story.edgeXIn / units.planLength,
        edgeY: story.edgeYIn / units.planLength,
      },
    };
  });
}

/** Visits every standing wall and story of every action that a basis lists, from the top down. */
function visit<Row>(
  analysis: Analysis,
  flexible: boolean,
  make: (at: number, action: LateralAction, level: string, wall: string) => Row,
): Row[] {
  const { model, actions } = analysis;
  const plane = model.stories.length * model.walls.length;
  const rows: Row[] = [];
  actions.forEach((action, index) => {
    if (!listed(action, flexible)) return;
    for (const story of fromTop(analysis)) {
      model.walls.forEach((wall, wallIndex) => {
        if (story < wall.fromStory || story > wall.toStory) return;
        const at = index * plane + story * model.walls.length + wallIndex;
        rows.push(make(at, action, model.stories[story]?.level ?? '', wall.name));
      });
    }
  });
  return rows;
}

const variantOf = ({ variant }: LateralAction): Variant => (variant === 'torsion' ? '0' : variant);

export function rigidityRows(analysis: Analysis, units: UnitFactors): ResultDocument['rigidities'] {
  const { model, rigidities } = analysis;
  return fromTop(analysis).flatMap((story) =>
    model.walls.flatMap((wall, wallIndex) =>
      story < wall.fromStory || story > wall.toStory
        ? []
        : [
            {
              level: model.stories[story]?.level ?? '',
              wall: wall.name,
              k: (rigidities[story * model.walls.length + wallIndex] ?? 0) / units.stiffness,
            },
          ],
    ),
  );
}

export function distributionRows(analysis: Analysis, units: UnitFactors): ResultDistribution[] {
  return analysis.bases.flatMap(({ basis, shares, along }) =>
    visit(analysis, along !== null, (at, action, level, wall) => ({
      basis,
      case: action.case,
      variant: variantOf(action),
      level,
      wall,
      ...(shares.directKip && shares.torsionalKip
        ? {
            direct: (shares.directKip[at] ?? 0) / units.force,
            torsional: (shares.torsionalKip[at] ?? 0) / units.force,
          }
        : {}),
      total: (shares.totalKip[at] ?? 0) / units.force,
    })),
  );
}

export function lateralRows(analysis: Analysis, units: UnitFactors): ResultLateral[] {
  return analysis.bases.flatMap(({ basis, shearKip, momentKipIn, along }) =>
    visit(analysis, along !== null, (at, action, level, wall) => ({
      basis,
      case: action.case,
      variant: variantOf(action),
      level,
      wall,
      shear: (shearKip[at] ?? 0) / units.force,
      moment: (momentKipIn[at] ?? 0) / units.moment,
    })),
  );
}

/** Drift of every listed action; blank values where the whole-height solution can't be made. */
export function driftRows(analysis: Analysis): ResultDrift[] {
  const known = new Map(
    analysis.drifts.map((drift) => [`${drift.case}\n${drift.variant}\n${String(drift.story)}`, drift]),
  );
  return analysis.actions
    .filter((action) => listed(action, false))
    .flatMap((action) =>
      fromTop(analysis).map((story) => {
        const drift = known.get(`${action.case}\n${action.variant}\n${String(story)}`);
        return {
          case: action.case,
          variant: variantOf(action),
          level: analysis.model.stories[story]?.level ?? '',
          x: drift?.x ?? null,
          y: drift?.y ?? null,
          edge: drift?.edge ?? null,
          torsionRatio: drift?.torsionRatio ?? null,
          ax: drift?.ax ?? null,
          theta: drift?.theta ?? null,
        };
      }),
    );
}

/** Floor displacements at each level's own point: what the displaced outline of the plan is drawn from. */
export function displacementRows(analysis: Analysis, units: UnitFactors): ResultDisplacement[] {
  const { displacements, actions, model } = analysis;
  if (!displacements) return [];
  return actions.flatMap((action, index) => {
    const solution = displacements.solutions[index];
    if (!solution || !listed(action, false)) return [];
    return fromTop(analysis).map((story) => {
      const level = model.stories[story];
      const at = displacementAt(displacements.whole, solution, story, level?.xIn ?? 0, level?.yIn ?? 0);
      return {
        case: action.case,
        variant: variantOf(action),
        level: level?.level ?? '',
        x: at.x / units.barLength,
        y: at.y / units.barLength,
        rotation: solution.rotation[story] ?? 0,
      };
    });
  });
}

export function gravityRows(analysis: Analysis, units: UnitFactors): ResultDocument['gravity'] {
  const { model, gravity } = analysis;
  return fromTop(analysis).flatMap((story) =>
    model.walls.flatMap((wall, wallIndex) =>
      story < wall.fromStory || story > wall.toStory
        ? []
        : gravityCases.map((name) => ({
            level: model.stories[story]?.level ?? '',
            wall: wall.name,
            case: name,
            axial: (gravity.axialKip[name][story * model.walls.length + wallIndex] ?? 0) / units.force,
            moment: (gravity.momentKipIn[name][story * model.walls.length + wallIndex] ?? 0) / units.moment,
          })),
    ),
  );
}

/** What walls that start above the base bring down onto the floor on which they stand, per basis, case and variant. */
export function transferredRows(analysis: Analysis, units: UnitFactors): ResultTransferred[] {
  const { model, actions, bases, gravity, transfers } = analysis;
  const plane = model.stories.length * model.walls.length;
  return bases.flatMap(({ basis, shearKip, momentKipIn, axialKip, along }) =>
    transfers.flatMap(({ wallIndex, fromStory, level }) => {
      const at = fromStory * model.walls.length + wallIndex;
      const wall = model.walls[wallIndex]?.name ?? '';
      return [
        ...actions.flatMap((action, index) =>
          !listed(action, along !== null)
            ? []
            : [
                {
                  basis,
                  case: action.case,
                  variant: variantOf(action),
                  level,
                  wall,
                  axial: (axialKip?.[index * plane + at] ?? 0) / units.force,
                  shear: (shearKip[index * plane + at] ?? 0) / units.force,
                  moment: (momentKipIn[index * plane + at] ?? 0) / units.moment,
                },
              ],
        ),
        ...gravityCases.map((name) => ({
          basis,
          case: name,
          variant: '0' as const,
          level,
          wall,
          axial: (gravity.axialKip[name][at] ?? 0) / units.force,
          shear: 0,
          moment: (gravity.momentKipIn[name][at] ?? 0) / units.moment,
        })),
      ];
    }),
  );
}

const forceLines = new Set([
  'force x',
  'force y',
  'vertical',
  'transfers x',
  'transfers y',
  'sideways x',
  'sideways y',
]);

export function balanceRows(analysis: Analysis, units: UnitFactors): ResultBalance[] {
  return analysis.bases.flatMap(({ basis }, index) =>
    (analysis.balance[index] ?? []).map((entry) => ({
      basis,
      case: entry.case,
      variant: entry.variant,
      level: analysis.model.stories[entry.story]?.level ?? '',
      residual: entry.lines.reduce((worst, line) => Math.max(worst, line.residual), 0),
      lines: entry.lines.map(({ line, applied, resisted }) => {
        const factor = forceLines.has(line) ? units.force : units.moment;
        return { line, applied: applied / factor, resisted: resisted / factor };
      }),
    })),
  );
}
