import type { InputTab } from '../../app/paths.ts';

export const tabNames: Readonly<Record<InputTab, string>> = {
  levels: 'Levels',
  walls: 'Walls',
  forces: 'Forces',
  gravity: 'Gravity',
  combinations: 'Combinations',
  overrides: 'Overrides',
  settings: 'Settings',
};

/** What each table holds, in one line under the page's name. */
export const tabLines: Readonly<Record<InputTab, string>> = {
  levels: 'Levels from the top down. A story is the one below its level.',
  walls: 'Wall lines by their end points. Several rows of one wall are bands, one above the other.',
  forces: 'Forces at each level, by case. A level and case twice add up.',
  gravity: 'Tributary gravity of each wall at each level, not summed. Self-weight is added by the settings.',
  combinations: 'Combinations of your own. Without any, those of the load standard are taken.',
  overrides:
    'What you hand to a wall with a reason: transfers from walls above, or its share of a story shear. Each stands in the balance.',
  settings: 'Code, materials, stiffness and how walls are detailed. A blank field takes its default.',
};

export const rowNames: Readonly<Record<Exclude<InputTab, 'settings'>, { one: string; many: string }>> = {
  levels: { one: 'level', many: 'levels' },
  walls: { one: 'wall', many: 'rows of walls' },
  forces: { one: 'force', many: 'rows of forces' },
  gravity: { one: 'row', many: 'rows of gravity' },
  combinations: { one: 'combination', many: 'combinations' },
  overrides: { one: 'override', many: 'overrides' },
};
