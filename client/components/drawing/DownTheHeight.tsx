import { useId, type KeyboardEvent, type ReactElement } from 'react';

import { drawHeightDiagram } from '#shared/drawing/heightDiagram';
import type { HeightDiagramInput } from '#shared/drawing/heightDiagramTypes';
import { heightScale } from '#shared/drawing/heightScale';

import { DrawingSvg } from './DrawingSvg.tsx';
import { storyForKey } from './stackKeys.ts';

export interface DownTheHeightProps {
  diagrams: readonly { title: string; unit: string; input: HeightDiagramInput }[];
  chosen: string;
  /** values of a story in words, for its option */
  sayStory: (level: string) => string;
  onChoose: (level: string) => void;
  /** the story under the pointer; null where it left */
  onHover: (level: string | null) => void;
}

const captionHeight = 32;

/** Axial, shear and moment of a wall side by side on the vertical scale of the stack: a figure that holds the list of its stories. */
export function DownTheHeight({ diagrams, chosen, sayStory, onChoose, onHover }: DownTheHeightProps): ReactElement {
  const id = useId();
  const stories = diagrams[0]?.input.stories ?? [];
  const levels = stories.map((story) => story.level);
  const scale = heightScale(stories);
  const at = levels.indexOf(chosen);

  const onKeyDown = (event: KeyboardEvent): void => {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    const next = storyForKey(levels, chosen, event.key, '');
    if (next === null) return;
    event.preventDefault();
    event.stopPropagation();
    if (next !== chosen) onChoose(next);
  };

  return (
    <figure aria-label="Down the height" className="relative m-0 flex w-fit gap-[28px]">
      {diagrams.map(({ title, unit, input }) => (
        <div key={title} className="w-[216px]">
          <div className="cap">
            <span>{title}</span>
            <span>{unit}</span>
          </div>
          <DrawingSvg drawing={drawHeightDiagram(input)} />
        </div>
      ))}
      <div
        role="listbox"
        aria-label="Down the wall"
        tabIndex={0}
        aria-activedescendant={at < 0 ? undefined : `${id}-${at}`}
        onKeyDown={onKeyDown}
        onMouseLeave={() => onHover(null)}
        className="absolute inset-x-0 outline-offset-2 outline-ink focus-visible:outline-2"
        style={{ top: captionHeight + scale.top, height: scale.bottom - scale.top }}
      >
        {scale.boxes.map((box, index) => (
          <div
            key={box.level}
            id={`${id}-${index}`}
            role="option"
            aria-selected={box.level === chosen}
            aria-label={sayStory(box.level)}
            className="absolute inset-x-0 cursor-pointer"
            style={{ top: box.top - scale.top, height: box.bottom - box.top }}
            onClick={() => onChoose(box.level)}
            onMouseEnter={() => onHover(box.level)}
          />
        ))}
      </div>
    </figure>
  );
}
