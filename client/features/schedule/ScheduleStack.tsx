import { useMemo, type ReactElement } from 'react';

import type { ResultDocument } from '#shared/contracts/result';
import type { TableResource } from '#shared/contracts/tables';
import { placeStackWalls } from '#shared/drawing/placeStackWalls';
import { formatRatio } from '#shared/format/ratio';

import { Stack } from '../../components/drawing/Stack.tsx';
import { storyRatios, type StoryRatio } from './storyRatios.ts';
import type { ScheduleChoice } from './useScheduleChoice.ts';

export interface ScheduleStackProps {
  document: ResultDocument;
  walls: TableResource<'walls'>;
  choice: ScheduleChoice;
}

/** Worst ratio of the wall in view, story by story, with its chosen band as a range. */
export function ScheduleStack({ document, walls, choice }: ScheduleStackProps): ReactElement {
  const { down, wall, level, range, chooseLevel } = choice;
  const ratios = useMemo(
    () => (wall === null ? [] : storyRatios(document.checks, wall, down)),
    [document.checks, wall, down],
  );
  return (
    <Stack
      stories={down.map((one, index) => ({
        level: one.level,
        elevation: one.elevation,
        height: one.height,
        ...sayRatio(ratios[index]),
      }))}
      walls={placeStackWalls(down, walls.rows)}
      caption={wall === null ? 'Worst ratio' : `Worst ratio, ${wall}`}
      unit=""
      units={document.units}
      chosen={level ?? range.at(-1) ?? null}
      onChoose={chooseLevel}
      chosenWall={wall}
      range={range}
      limit={1}
    />
  );
}

function sayRatio(story: StoryRatio | undefined): { value: number | null; text: string; over: boolean } {
  if (!story || !story.stands) return { value: null, text: '–', over: false };
  const { ratio, over } = story;
  return { value: ratio ?? (over ? 1.25 : 0), text: ratio === null ? '–' : formatRatio(ratio), over };
}
