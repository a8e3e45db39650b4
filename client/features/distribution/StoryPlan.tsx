import type { ReactElement } from 'react';

import { unitLabels } from '#shared/contracts/quantities';
import type { ResultDocument } from '#shared/contracts/result';
import { exaggeration } from '#shared/drawing/planDisplaced';
import { planScale } from '#shared/drawing/planScale';
import type { PlanInput } from '#shared/drawing/planTypes';
import { formatDrift } from '#shared/format/drift';
import { formatForce, formatShare } from '#shared/format/force';
import { formatAsListed } from '#shared/format/number';

import { Plan } from '../../components/drawing/Plan.tsx';
import type { ResultChoice } from '../../components/drawing/resultChoice.ts';
import type { LevelDrift } from './levelDrifts.ts';
import type { StoryShares } from './storyShares.ts';

export interface StoryPlanProps {
  document: ResultDocument;
  /** px, as wide as the page has room */
  width: number;
  chosen: ResultChoice;
  shares: StoryShares;
  drift: LevelDrift | undefined;
  massName: string;
  wall: string | null;
  onChooseWall: (wall: string) => void;
}

/** The plan of the story with what each wall takes, and the slab as the case moves it. */
export function StoryPlan(props: StoryPlanProps): ReactElement {
  const { document, width, chosen, shares, drift, massName, wall, onChooseWall } = props;
  const { units } = document;
  const { level } = chosen;
  const force = unitLabels.force[units];
  const perThickness = units === 'us' ? 1 / 12 : 1 / 1000;
  const moved = document.displacements.find(
    (one) => one.case === chosen.case && one.variant === chosen.variant && one.level === level.level,
  );
  const input: PlanInput = {
    units,
    width,
    extent: level.extent,
    walls: shares.walls.map((one) => ({
      ...one.geometry,
      name: one.wall,
      thickness: one.geometry.thickness * perThickness,
      direct: one.direct,
      torsional: one.torsional,
      total: one.total,
      share: one.share,
    })),
    mass: level.point,
    massName,
    rigidity: level.rigidity,
    force: {
      x: shares.vx,
      y: shares.vy,
      text: `${formatForce(shares.size)} ${force}`,
      note: `story shear, ${chosen.case}`,
    },
    chosenWall: wall,
    ...(moved ? { displaced: { x: moved.x * perThickness, y: moved.y * perThickness, rotation: moved.rotation } } : {}),
  };
  const sayWall = (name: string): string => {
    const share = shares.walls.find((one) => one.wall === name);
    if (!share) return name;
    return `${name}, ${formatForce(share.total)} ${force}${share.share === null ? '' : `, ${formatShare(share.share)}`}`;
  };
  return (
    <>
      <Plan input={input} sayWall={sayWall} onChooseWall={onChooseWall} />
      {moved && input.displaced ? (
        <p className="note mt-1 max-w-[690px]">
          {sayDisplaced(
            chosen,
            exaggeration(level.extent, level.point, input.displaced, planScale(input).pixelsPerLength),
          )}{' '}
          {sayMoved(moved, units)}
          {drift === undefined || drift.x === null || drift.y === null
            ? ''
            : ` Drift of the story ${formatDrift(drift.x)} in x, ${formatDrift(drift.y)} in y.`}
        </p>
      ) : null}
    </>
  );
}

const sayDisplaced = ({ level, case: name }: ResultChoice, times: number): string =>
  times === 0
    ? `${name} moves ${level.level} nowhere.`
    : `Dashed: the slab of ${level.level} as ${name} moves it, drawn ${formatAsListed(times, 4)} times as large.`;

function sayMoved(moved: { x: number; y: number }, units: 'us' | 'si'): string {
  const print = (value: number): string => formatAsListed(value, units === 'us' ? 3 : 2);
  return `At its point ${print(moved.x)} in x, ${print(moved.y)} in y, ${units === 'us' ? 'inches' : 'mm'}.`;
}
