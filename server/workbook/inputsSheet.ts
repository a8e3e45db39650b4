import type { Workbook } from 'exceljs';

import { addDataSheet } from './dataSheet.ts';
import type { ResultUnits } from './resultUnits.ts';
import { resultUnits } from './resultUnits.ts';
import type { WorkbookContent } from './WorkbookContent.ts';

interface InputRow {
  readonly group: string;
  readonly name: string;
  readonly value: string | number | boolean | null;
  readonly unit: string | null;
  readonly origin: string | null;
}

const settingUnits = (unit: ResultUnits): Readonly<Record<string, string>> => ({
  fc: unit.concreteStrength,
  fy: unit.steelStrength,
  fyt: unit.steelStrength,
  concreteWeight: unit.density,
  cover: unit.barLength,
  edge: unit.barLength,
  slabThickness: unit.barLength,
  oopEccentricity: unit.barLength,
  'stiffness.unitWeight': unit.density,
});

/** Settings with their units and whether they were typed; levels with their points, extents and forces as used. */
export function addInputsSheet(workbook: Workbook, content: WorkbookContent): void {
  addDataSheet<InputRow>(
    workbook,
    content,
    'Inputs',
    [
      { head: 'Group', width: 14, value: (row) => row.group },
      { head: 'Name', width: 34, value: (row) => row.name },
      { head: 'Value', width: 40, format: 'General', value: (row) => row.value },
      { head: 'Unit', width: 10, value: (row) => row.unit },
      { head: 'Origin', width: 12, value: (row) => row.origin },
    ],
    [...settingRows(content), ...levelRows(content)],
  );
}

function settingRows(content: WorkbookContent): InputRow[] {
  const { given, ...settings } = content.settings;
  const units = settingUnits(resultUnits[settings.units]);
  return Object.entries(settings).flatMap(([key, value]) =>
    flatten(key, value).map(([name, leaf]) => ({
      group: 'setting',
      name,
      value: leaf,
      unit: units[name] ?? null,
      origin: given.includes(key) || given.includes(name) ? 'typed' : 'default',
    })),
  );
}

function flatten(name: string, value: unknown): [string, string | number | boolean | null][] {
  if (value === null || typeof value === 'string' || typeof value === 'number' || typeof value === 'boolean') {
    return [[name, value]];
  }
  if (Array.isArray(value)) return [[name, value.map(String).join(', ')]];
  if (typeof value === 'object') {
    return Object.entries(value).flatMap(([key, inner]) => flatten(`${name}.${key}`, inner));
  }
  return [];
}

function levelRows(content: WorkbookContent): InputRow[] {
  const unit = resultUnits[content.document.units];
  return content.document.levels.flatMap((level) => {
    const row = (name: string, value: number, unitLabel: string): InputRow => ({
      group: 'level',
      name: `${level.level}: ${name}`,
      value,
      unit: unitLabel,
      origin: null,
    });
    return [
      row('elevation', level.elevation, unit.planLength),
      row('height', level.height, unit.planLength),
      row('x', level.point.x, unit.planLength),
      row('y', level.point.y, unit.planLength),
      row('extent x', level.extent.x, unit.planLength),
      row('extent y', level.extent.y, unit.planLength),
      ...Object.entries(level.force).flatMap(([name, force]) => [
        row(`${name} fx`, force.fx, unit.force),
        row(`${name} fy`, force.fy, unit.force),
        row(`${name} mz`, force.mz, unit.moment),
      ]),
    ];
  });
}
