import { useId, type KeyboardEvent, type ReactElement } from 'react';

import { drawPlan, placePlanWalls } from '#shared/drawing/drawPlan';
import { boxAround } from '#shared/drawing/labelBoxes';
import type { PlanInput } from '#shared/drawing/planTypes';
import { strip, type PlacedWall } from '#shared/drawing/planWall';

import { DrawingSvg } from './DrawingSvg.tsx';

export interface PlanProps {
  input: PlanInput;
  /** name and force of a wall in words, for its option */
  sayWall: (name: string) => string;
  onChooseWall: (name: string) => void;
}

const target = 24;

/** The plan of a story: a figure that holds the list of its walls; the same figures stand in the table beside it. */
export function Plan({ input, sayWall, onChooseWall }: PlanProps): ReactElement {
  const id = useId();
  const names = input.walls.map((wall) => wall.name);
  const at = names.indexOf(input.chosenWall ?? '');
  const { placed, width, height } = placePlanWalls(input);

  const onKeyDown = (event: KeyboardEvent): void => {
    const next = wallForKey(names, at, event.key);
    if (next === null || event.ctrlKey || event.metaKey || event.altKey) return;
    event.preventDefault();
    onChooseWall(next);
  };

  return (
    <figure aria-label="Plan" className="relative m-0" style={{ width, height }}>
      <DrawingSvg drawing={drawPlan(input)} />
      <div
        role="listbox"
        aria-label="Walls of the story"
        tabIndex={0}
        aria-activedescendant={at < 0 ? undefined : `${id}-${at}`}
        onKeyDown={onKeyDown}
        className="absolute inset-0 outline-offset-2 outline-ink focus-visible:outline-2"
      >
        {placed.map((one, index) => (
          <div
            key={one.wall.name}
            id={`${id}-${index}`}
            role="option"
            aria-selected={index === at}
            aria-label={sayWall(one.wall.name)}
            className="absolute cursor-pointer hover:outline hover:outline-1 hover:outline-line"
            style={targetStyle(one)}
            onClick={() => onChooseWall(one.wall.name)}
          />
        ))}
      </div>
    </figure>
  );
}

function wallForKey(names: readonly string[], at: number, key: string): string | null {
  const last = names.length - 1;
  const steps: Readonly<Record<string, number>> = {
    ArrowDown: at + 1,
    ArrowRight: at + 1,
    ArrowUp: at < 0 ? last : at - 1,
    ArrowLeft: at < 0 ? last : at - 1,
    Home: 0,
    End: last,
  };
  const index = steps[key];
  return index === undefined ? null : (names[Math.max(0, Math.min(last, index))] ?? null);
}

/** What can be pointed at: around the wall and its arrow, at least 24 px each way. */
function targetStyle(one: PlacedWall): { left: number; top: number; width: number; height: number } {
  const box = boxAround(strip(one.end1, one.along, one.length, one.thickness), 4);
  const width = Math.max(target, box.right - box.left);
  const height = Math.max(target, box.bottom - box.top);
  return { left: (box.left + box.right - width) / 2, top: (box.top + box.bottom - height) / 2, width, height };
}
