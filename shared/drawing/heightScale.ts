import { round2 } from './round2.ts';

/** What a diagram along the height needs of a story; elevation is of its floor, height the story below it. */
export interface StoryHeight {
  readonly level: string;
  readonly elevation: number;
  readonly height: number;
}

export interface StoryBox {
  readonly level: string;
  readonly top: number;
  readonly bottom: number;
}

/** The one vertical scale that the stack and every diagram beside it share. */
export interface HeightScale {
  readonly pixelsPerLength: number;
  /** where the roof stands */
  readonly top: number;
  /** where the ground stands */
  readonly bottom: number;
  /** height of a typical cell (the median story) */
  readonly typicalCell: number;
  /** from the top down, as the stories were given */
  readonly boxes: readonly StoryBox[];
  readonly yOf: (elevation: number) => number;
}

const drawingTop = 20;
const fullHeight = 612;
const mostPerStory = 56;
const leastPerStory = 6;

/** s = min(612 / total height, 56 px a typical story), not below 6 px a typical story: then the column scrolls. */
export function heightScale(stories: readonly StoryHeight[]): HeightScale {
  const heights = stories.map((story) => story.height).sort((a, b) => a - b);
  const typical = heights[Math.floor(heights.length / 2)] ?? 1;
  const roof = Math.max(...stories.map((story) => story.elevation), Number.NEGATIVE_INFINITY);
  const base = Math.min(...stories.map((story) => story.elevation - story.height), Number.POSITIVE_INFINITY);
  const total = stories.length > 0 ? roof - base : 1;
  const pixelsPerLength = Math.max(Math.min(fullHeight / total, mostPerStory / typical), leastPerStory / typical);
  const yOf = (elevation: number): number => round2(drawingTop + (roof - elevation) * pixelsPerLength);
  return {
    pixelsPerLength,
    top: drawingTop,
    bottom: stories.length > 0 ? yOf(base) : drawingTop,
    typicalCell: typical * pixelsPerLength,
    boxes: stories.map((story) => ({
      level: story.level,
      top: yOf(story.elevation),
      bottom: yOf(story.elevation - story.height),
    })),
    yOf,
  };
}
