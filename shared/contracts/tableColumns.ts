import type { TableName, Tables } from '../engineering/input.ts';

/** The quantity of a number decides its unit in both systems (quantities.ts). */
export type Quantity =
  | 'length'
  | 'thickness'
  | 'area'
  | 'force'
  | 'moment'
  | 'concreteStrength'
  | 'steelStrength'
  | 'density'
  | 'fraction'
  | 'plain';

export interface Column<Name extends string = string> {
  readonly name: Name;
  readonly type: 'text' | 'number' | 'choice';
  readonly required: boolean;
  /** numbers only */
  readonly quantity?: Quantity;
  readonly choices?: readonly string[];
  /** inclusive or exclusive limits in the building's own units; `above` is exclusive */
  readonly min?: number;
  readonly above?: number;
  readonly max?: number;
  /** what the grid's header says */
  readonly label: string;
}

const text = <N extends string>(name: N, label: string, required = true): Column<N> => ({
  name,
  label,
  type: 'text',
  required,
});
const number = <N extends string>(
  name: N,
  label: string,
  quantity: Quantity,
  limits: { min?: number; above?: number; max?: number; required?: boolean } = {},
): Column<N> => {
  const { required = false, ...range } = limits;
  return { name, label, type: 'number', quantity, required, ...range };
};
const choice = <N extends string>(name: N, label: string, choices: readonly string[], required = false): Column<N> => ({
  name,
  label,
  type: 'choice',
  choices,
  required,
});

type ColumnsOf<T extends TableName> = readonly Column<Extract<keyof Tables[T][number], string>>[];

/** Columns of the input tables in the order of the contract; names are the CSV headers and the JSON keys. */
export const tableColumns: { readonly [T in TableName]: ColumnsOf<T> } = {
  levels: [
    text('level', 'Level'),
    number('height', 'Height', 'length', { above: 0, required: true }),
    number('elevation', 'Elevation', 'length'),
    number('x', 'Point x', 'length'),
    number('y', 'Point y', 'length'),
    number('extent_x', 'Extent x', 'length', { above: 0 }),
    number('extent_y', 'Extent y', 'length', { above: 0 }),
    number('edge_x', 'Edge x', 'length'),
    number('edge_y', 'Edge y', 'length'),
    choice('diaphragm', 'Diaphragm', ['rigid', 'flexible']),
    number('weight', 'Weight', 'force', { min: 0 }),
    number('gravity', 'Gravity', 'force', { min: 0 }),
  ],
  walls: [
    text('wall', 'Wall'),
    number('x1', 'x1', 'length', { required: true }),
    number('y1', 'y1', 'length', { required: true }),
    number('x2', 'x2', 'length', { required: true }),
    number('y2', 'y2', 'length', { required: true }),
    number('thickness', 'Thickness', 'thickness', { above: 0, required: true }),
    text('from_level', 'From level'),
    text('to_level', 'To level'),
    number('fc', 'f′c', 'concreteStrength', { above: 0 }),
    number('share_x', 'Share x', 'fraction', { min: 0, max: 1 }),
    number('share_y', 'Share y', 'fraction', { min: 0, max: 1 }),
    number('opening', 'Opening', 'fraction', { min: 0, max: 1 }),
    number('flexure_factor', 'Flexure factor', 'plain', { above: 0 }),
    number('shear_factor', 'Shear factor', 'plain', { above: 0 }),
  ],
  forces: [
    text('level', 'Level'),
    text('case', 'Case'),
    choice('kind', 'Kind', ['wind', 'seismic', 'other'], true),
    number('fx', 'Fx', 'force', { required: true }),
    number('fy', 'Fy', 'force', { required: true }),
    number('x', 'x', 'length'),
    number('y', 'y', 'length'),
    number('mz', 'Mz', 'moment'),
  ],
  gravity: [
    text('level', 'Level'),
    text('wall', 'Wall'),
    number('dead', 'Dead', 'force', { required: true }),
    number('live', 'Live', 'force'),
    number('roof_live', 'Roof live', 'force'),
    number('snow', 'Snow', 'force'),
    number('tributary_area', 'Tributary area', 'area', { min: 0 }),
    number('eccentricity', 'Eccentricity', 'length'),
    choice('live_class', 'Live class', ['reducible', 'heavy', 'garage', 'assembly', 'storage']),
  ],
  combinations: [text('name', 'Name', false), text('expression', 'Expression')],
  overrides: [
    choice('kind', 'Kind', ['transfer', 'share'], true),
    text('level', 'Level'),
    text('wall', 'Wall'),
    text('case', 'Case', false),
    number('shear', 'Shear', 'force'),
    number('axial', 'Axial', 'force'),
    number('moment', 'Moment', 'moment'),
    number('share', 'Share', 'fraction', { min: 0, max: 1 }),
    text('reason', 'Reason'),
  ],
};

/** Tables with pages and routes: all of them, in the order in which they refer to each other. */
export const editableTables = ['levels', 'walls', 'forces', 'gravity', 'combinations', 'overrides'] as const;
export type EditableTable = (typeof editableTables)[number];
