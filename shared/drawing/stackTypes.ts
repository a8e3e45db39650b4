import type { UnitSystem } from '../engineering/input.ts';
import type { StoryHeight } from './heightScale.ts';

export interface StackStory extends StoryHeight {
  readonly value: number | null;
  /** the value as printed */
  readonly text: string;
  readonly over?: boolean;
}

/** One band of a wall between two elevations. */
export interface StackWall {
  readonly name: string;
  readonly x1: number;
  readonly y1: number;
  readonly x2: number;
  readonly y2: number;
  readonly fromElevation: number;
  readonly toElevation: number;
}

export interface StackInput {
  /** from the top down */
  readonly stories: readonly StackStory[];
  readonly walls: readonly StackWall[];
  readonly units: UnitSystem;
  readonly chosen: string | null;
  readonly hovered?: string | null;
  /** levels of a band: a bracket at the left, `choose` behind all of them */
  readonly range?: readonly string[];
  readonly chosenWall?: string | null;
  /** ratios only: where the limit's dotted line stands */
  readonly limit?: number;
  /** a narrow rail of labels and bars, without elevation and values */
  readonly rail?: boolean;
}

export const stackWidth = 224;
export const railWidth = 80;

/** Where the columns of a stack stand, px from its left. */
export interface StackColumns {
  readonly width: number;
  /** the zero line of the bars */
  readonly zero: number;
  readonly barLength: number;
}

export const stackColumns = (rail: boolean): StackColumns =>
  rail ? { width: railWidth, zero: 42, barLength: 34 } : { width: stackWidth, zero: 126, barLength: 46 };
