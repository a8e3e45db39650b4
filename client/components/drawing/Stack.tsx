import { useEffect, useId, useRef, useState, type KeyboardEvent, type ReactElement } from 'react';

import { drawStack } from '#shared/drawing/drawStack';
import { heightScale } from '#shared/drawing/heightScale';
import type { StackStory, StackWall } from '#shared/drawing/stackTypes';
import type { UnitSystem } from '#shared/engineering/input';

import { DrawingSvg } from './DrawingSvg.tsx';
import { storyForKey } from './stackKeys.ts';
import { useMedia } from './useMedia.ts';

export interface StackProps {
  /** from the top down */
  stories: readonly StackStory[];
  walls: readonly StackWall[];
  caption: string;
  /** of the value; for ratios `limit 1.00` stands in its place */
  unit: string;
  units?: UnitSystem;
  chosen: string | null;
  onChoose: (level: string) => void;
  chosenWall?: string | null;
  range?: readonly string[];
  limit?: number;
}

const typingPause = 800;
const columnHeight = 642;

/** The elevation at the left of every page: a figure that holds the list of stories. Choosing one chooses it for the page. */
export function Stack(props: StackProps): ReactElement {
  const { stories, walls, caption, unit, units = 'us', chosen, onChoose, chosenWall, range, limit } = props;
  const id = useId();
  const [hovered, setHovered] = useState<string | null>(null);
  const typed = useRef({ text: '', at: 0 });
  const field = useRef<HTMLDivElement>(null);
  const scale = heightScale(stories);
  const rail = useMedia('(min-width: 640px) and (max-width: 1023px)');
  const drawing = drawStack({ stories, walls, units, chosen, hovered, chosenWall, range, limit, rail });
  const box = scale.boxes.find((candidate) => candidate.level === chosen);
  const middle = box ? (box.top + box.bottom) / 2 : 0;

  useEffect(() => {
    if (field.current && field.current.scrollHeight > columnHeight) field.current.scrollTop = middle - columnHeight / 2;
  }, [middle]);

  const onKeyDown = (event: KeyboardEvent): void => {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    const letter = /^[\p{L}\p{N}]$/u.test(event.key) ? event.key : '';
    if (letter !== '') {
      const goesOn = event.timeStamp - typed.current.at < typingPause;
      typed.current = { text: (goesOn ? typed.current.text : '') + letter, at: event.timeStamp };
    }
    const levels = stories.map((story) => story.level);
    const next = storyForKey(levels, chosen, event.key, letter === '' ? '' : typed.current.text);
    if (next === null) return;
    event.preventDefault();
    event.stopPropagation();
    if (next !== chosen) onChoose(next);
  };

  const at = stories.findIndex((story) => story.level === chosen);
  return (
    <figure aria-label="Stack" className="m-0" style={{ width: drawing.width }}>
      <figcaption className="cap">
        <span>{caption}</span>
        <span>{limit === undefined ? unit : `limit ${limit.toFixed(2)}`}</span>
      </figcaption>
      <div ref={field} className="-ml-2 overflow-x-hidden overflow-y-auto pl-2" style={{ maxHeight: columnHeight }}>
        <div className="relative">
          <DrawingSvg drawing={drawing} />
          <div
            role="listbox"
            aria-label="Stories"
            tabIndex={0}
            aria-activedescendant={at < 0 ? undefined : `${id}-${at}`}
            onKeyDown={onKeyDown}
            onMouseLeave={() => setHovered(null)}
            className="absolute inset-x-0 outline-offset-2 outline-ink focus-visible:outline-2"
            style={{ top: scale.top, height: scale.bottom - scale.top }}
          >
            {stories.map((story, index) => (
              <div
                key={story.level}
                id={`${id}-${index}`}
                role="option"
                aria-selected={story.level === chosen}
                aria-label={sayStory(story, unit)}
                className="absolute inset-x-0 cursor-pointer"
                style={boxStyle(scale.boxes[index], scale.top)}
                onClick={() => onChoose(story.level)}
                onMouseEnter={() => setHovered(story.level)}
              />
            ))}
          </div>
        </div>
      </div>
    </figure>
  );
}

const sayStory = (story: StackStory, unit: string): string =>
  [`${story.level}, ${story.text}`, unit, story.over ? 'over' : ''].filter((part) => part !== '').join(' ');

const boxStyle = (box: { top: number; bottom: number } | undefined, top: number): { top: number; height: number } => ({
  top: (box?.top ?? top) - top,
  height: (box?.bottom ?? top) - (box?.top ?? top),
});
