import type { ReactElement } from 'react';

import type { ResultDocument } from '#shared/contracts/result';
import type { TableResource } from '#shared/contracts/tables';
import { placeStackWalls } from '#shared/drawing/placeStackWalls';

import { useChoice } from '../../app/useChoice.ts';
import { levelsDown, type ResultChoice } from '../../components/drawing/resultChoice.ts';
import { Stack } from '../../components/drawing/Stack.tsx';
import type { LevelDrift } from './levelDrifts.ts';
import { stackContent, type StackQuantity } from './stackQuantity.ts';

export interface DistributionStackProps {
  document: ResultDocument;
  walls: TableResource<'walls'>;
  chosen: ResultChoice;
  wall: string | null;
  drifts: readonly LevelDrift[];
  quantity: StackQuantity;
}

/** The stack of this page, with the quantity that was chosen as its bars. */
export function DistributionStack(props: DistributionStackProps): ReactElement {
  const { document, walls, chosen, wall, drifts, quantity } = props;
  const [, choose] = useChoice();
  const levels = levelsDown(document);
  const { stories, caption, unit, limit } = stackContent(document, levels, drifts, quantity, chosen.case);
  return (
    <Stack
      stories={stories}
      walls={placeStackWalls(levels, walls.rows)}
      caption={caption}
      unit={unit}
      units={document.units}
      chosen={chosen.level.level}
      onChoose={(level) => choose({ level })}
      chosenWall={wall}
      {...(limit === undefined ? {} : { limit })}
    />
  );
}
