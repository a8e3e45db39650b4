import { unitLabels } from '#shared/contracts/quantities';
import type { Quantity } from '#shared/contracts/tableColumns';

import { printedUnit } from './printedUnit.ts';

/** One field of building.json that is built; what is not built has no field. */
export interface SettingField {
  /** path of the key, parts joined by points */
  readonly path: string;
  readonly label: string;
  readonly kind: 'text' | 'number' | 'list' | 'choice' | 'switch' | 'set';
  readonly quantity?: Quantity;
  readonly choices?: readonly { readonly value: string; readonly text: string }[];
  /** a word on what it does, where the label can't say it */
  readonly note?: string;
}

export interface SettingGroup {
  readonly title: string;
  readonly fields: readonly SettingField[];
}

const number = (path: string, label: string, quantity: Quantity = 'plain', note?: string): SettingField => ({
  path,
  label,
  kind: 'number',
  quantity,
  ...(note === undefined ? {} : { note }),
});

const bars = (use: string, label: string, spacings = true): readonly SettingField[] => [
  { path: `bars.${use}.sizes`, label: `${label}, sizes`, kind: 'list' },
  ...(spacings
    ? [{ path: `bars.${use}.spacings`, label: `${label}, spacings`, kind: 'list', quantity: 'thickness' } as const]
    : []),
];

export const settingGroups: readonly SettingGroup[] = [
  {
    title: 'Building',
    fields: [
      { path: 'name', label: 'Name', kind: 'text' },
      { path: 'number', label: 'Number', kind: 'text' },
      {
        path: 'units',
        label: 'Units',
        kind: 'choice',
        choices: [
          { value: 'us', text: 'US' },
          { value: 'si', text: 'SI' },
        ],
        note: 'fixed once a table has rows',
      },
      {
        path: 'loads',
        label: 'Load standard',
        kind: 'choice',
        choices: [
          { value: 'asce7-22', text: 'ASCE/SEI 7-22' },
          { value: 'asce7-16', text: 'ASCE/SEI 7-16' },
        ],
      },
    ],
  },
  {
    title: 'Materials',
    fields: [
      number('fc', 'Concrete f′c', 'concreteStrength', 'walls may name their own'),
      number('fy', 'Reinforcement fy', 'steelStrength'),
      number('fyt', 'Ties fyt', 'steelStrength'),
      number('lambda', 'Lightweight factor λ'),
      number('concreteWeight', 'Concrete weight', 'density'),
      { path: 'selfWeight', label: 'Self-weight of walls', kind: 'switch', note: 'added to D' },
    ],
  },
  {
    title: 'Wall stiffness',
    fields: [
      number('stiffness.flexure', 'Flexure factor', 'plain', 'of the gross inertia'),
      number('stiffness.shear', 'Shear factor', 'plain', 'of the gross area'),
      {
        path: 'stiffness.end',
        label: 'Far end',
        kind: 'choice',
        choices: [
          { value: 'cantilever', text: 'Cantilever' },
          { value: 'fixed', text: 'Fixed' },
        ],
      },
      number('stiffness.unitWeight', 'Unit weight for Ec', 'density', 'blank: Ec from f′c alone'),
    ],
  },
  {
    title: 'Sharing of shears',
    fields: [
      {
        path: 'basis',
        label: 'Bases',
        kind: 'set',
        choices: [
          { value: 'rigid', text: 'Rigid' },
          { value: 'compatible', text: 'Compatible' },
          { value: 'flexible', text: 'Flexible' },
          { value: 'envelope', text: 'Envelope' },
        ],
      },
      number('accidental', 'Accidental eccentricity', 'fraction', 'of the extent'),
      { path: 'amplify', label: 'Amplify it by Ax', kind: 'switch' },
      number('orthogonal', 'Orthogonal part', 'fraction', '0 or 0.3'),
      { path: 'windCases', label: 'Four wind cases', kind: 'switch' },
    ],
  },
  {
    title: 'What the forces are',
    fields: [
      {
        path: 'forcesAre',
        label: 'Forces are',
        kind: 'choice',
        choices: [
          { value: 'level-force', text: 'Force at each level' },
          { value: 'story-shear', text: 'Story shear' },
        ],
      },
      {
        path: 'forceLevel',
        label: 'Wind and seismic forces are at',
        kind: 'choice',
        choices: [
          { value: 'strength', text: 'Strength' },
          { value: 'service', text: 'Service' },
        ],
      },
    ],
  },
  {
    title: 'Gravity',
    fields: [
      { path: 'liveReduction', label: 'Live load reduction', kind: 'switch' },
      number('kll', 'Element factor KLL'),
      number('liveFactor', 'Factor on L with W or E', 'plain', '0.5 or 1'),
      number('oopEccentricity', 'Out-of-plane eccentricity', 'thickness'),
    ],
  },
  {
    title: 'Seismic and drift',
    fields: [
      number('sds', 'SDS', 'plain', 'g'),
      number('rho', 'Redundancy ρ'),
      number('omega0', 'Overstrength Ω0'),
      number('cd', 'Deflection amplification Cd'),
      number('ie', 'Importance factor Ie'),
      {
        path: 'riskCategory',
        label: 'Risk category',
        kind: 'choice',
        choices: ['I', 'II', 'III', 'IV'].map((value) => ({ value, text: value })),
      },
      number('driftLimit', 'Story drift limit', 'plain', 'blank: by risk category'),
      number('windDriftFactor', 'Wind drift at', 'plain', 'of strength wind'),
      {
        path: 'sdc',
        label: 'Seismic design category',
        kind: 'choice',
        choices: [
          { value: '', text: 'not given' },
          ...['A', 'B', 'C', 'D', 'E', 'F'].map((value) => ({ value, text: value })),
        ],
      },
    ],
  },
  {
    title: 'Detailing',
    fields: [
      number('cover', 'Cover to the outermost bar', 'thickness'),
      number('edge', 'Wall end to the first bar', 'thickness'),
      {
        path: 'joint',
        label: 'Construction joint',
        kind: 'choice',
        choices: [
          { value: 'roughened', text: 'Roughened' },
          { value: 'plain', text: 'Plain' },
        ],
      },
      number('slabThickness', 'Slab thickness', 'thickness'),
      number('bandStories', 'Stories in a band', 'plain', 'at most'),
    ],
  },
  {
    title: 'Bars for the automatic choice',
    fields: [
      ...bars('web', 'Vertical'),
      ...bars('horizontal', 'Horizontal'),
      ...bars('ends', 'End zones', false),
      ...bars('ties', 'Ties'),
    ],
  },
];

export const fieldUnit = (field: SettingField, units: 'us' | 'si'): string =>
  field.quantity === undefined ? '' : printedUnit(unitLabels[field.quantity][units]);
