import type { StoryHeight } from './heightScale.ts';

export type CurveStyle = 'solid' | 'dashed' | 'dotted';

export interface HeightCurve {
  readonly name: string;
  readonly style: CurveStyle;
  /** one a story, from the top down; null where the wall does not stand */
  readonly values: readonly (number | null)[];
  /** of the chosen story, as printed */
  readonly text: string;
}

export interface HeightDiagramInput {
  /** from the top down, as the stack */
  readonly stories: readonly StoryHeight[];
  /** step: constant in a story (axial, shear); bottoms: joined from bottom to bottom of the stories (moment) */
  readonly shape: 'step' | 'bottoms';
  readonly curves: readonly HeightCurve[];
  /** least and largest of each story over bases and variants, behind the curves */
  readonly envelope?: readonly ({ readonly least: number; readonly most: number } | null)[];
  readonly chosen: string | null;
  readonly chosenNote: string;
  readonly tickText: (value: number) => string;
}

export const heightDiagramWidth = 216;
