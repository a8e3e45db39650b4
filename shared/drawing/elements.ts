/** Token names of the tokens file; a renderer turns them into `var(--name)` on the page and into fixed colors elsewhere. */
export type Paint =
  | 'none'
  | 'ground'
  | 'sheet'
  | 'well'
  | 'choose'
  | 'ink'
  | 'graphite'
  | 'line'
  | 'rule'
  | 'oxide'
  | 'hatch-ink'
  | 'hatch-oxide';

interface Painted {
  readonly fill?: Paint;
  readonly fillOpacity?: number;
  readonly stroke?: Paint;
  readonly strokeWidth?: number;
  readonly dash?: string;
}

export interface RectElement extends Painted {
  readonly shape: 'rect';
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

export interface LineElement extends Painted {
  readonly shape: 'line';
  readonly x1: number;
  readonly y1: number;
  readonly x2: number;
  readonly y2: number;
}

export interface PathElement extends Painted {
  readonly shape: 'path';
  readonly d: string;
}

export interface CircleElement extends Painted {
  readonly shape: 'circle';
  readonly cx: number;
  readonly cy: number;
  readonly r: number;
}

export interface TextElement {
  readonly shape: 'text';
  readonly x: number;
  readonly y: number;
  readonly text: string;
  readonly size: 11 | 12 | 13;
  readonly weight?: 400 | 500 | 600;
  readonly anchor?: 'start' | 'middle' | 'end';
  readonly fill: Paint;
  /** 4 px behind text that crosses lines */
  readonly halo?: Paint;
}

export type DrawingElement = RectElement | LineElement | PathElement | CircleElement | TextElement;

/** A drawing at its final pixel size. */
export interface Drawing {
  readonly width: number;
  readonly height: number;
  readonly elements: readonly DrawingElement[];
}
