import type { Workbook } from 'exceljs';

import type { ResultCheck } from '#shared/contracts/result';

import type { DataColumn } from './dataSheet.ts';
import { addDataSheet } from './dataSheet.ts';
import { resultUnits } from './resultUnits.ts';
import type { WorkbookContent } from './WorkbookContent.ts';

const forceFormat = '#,##0.00;-#,##0.00';
const ratio = '0.000';

/** Distribution: every wall's share of the story's action, direct and torsional part apart. */
export function addSharesSheet(workbook: Workbook, content: WorkbookContent): void {
  const { document } = content;
  const unit = resultUnits[document.units];
  const key = (level: string, wall: string): string => JSON.stringify([level, wall]);
  const rigidities = new Map(document.rigidities.map(({ level, wall, k }) => [key(level, wall), k]));
  addDataSheet(
    workbook,
    content,
    'Shares',
    [
      { head: 'Basis', width: 12, value: (row) => row.basis },
      { head: 'Case', width: 10, value: (row) => row.case },
      { head: 'Variant', width: 8, value: (row) => row.variant },
      { head: 'Level', width: 12, value: (row) => row.level },
      { head: 'Wall', width: 10, value: (row) => row.wall },
      {
        head: `Rigidity (${unit.stiffness})`,
        width: 16,
        format: forceFormat,
        value: (row) => rigidities.get(key(row.level, row.wall)) ?? null,
      },
      { head: `Direct (${unit.force})`, width: 14, format: forceFormat, value: (row) => row.direct ?? null },
      { head: `Torsional (${unit.force})`, width: 14, format: forceFormat, value: (row) => row.torsional ?? null },
      { head: `Total (${unit.force})`, width: 14, format: forceFormat, value: (row) => row.total },
    ],
    document.distribution,
  );
}

interface TakedownRow {
  readonly effect: 'lateral' | 'gravity' | 'transferred';
  readonly basis: string | null;
  readonly case: string;
  readonly variant: string | null;
  readonly level: string;
  readonly wall: string;
  readonly axial: number | null;
  readonly shear: number | null;
  readonly moment: number;
}

/** Takedown: shear and moment by case, axial by gravity case, and what a stopped wall brings down. */
export function addTakedownSheet(workbook: Workbook, content: WorkbookContent): void {
  const { document } = content;
  const unit = resultUnits[document.units];
  const rows: TakedownRow[] = [
    ...document.lateral.map((row) => ({ effect: 'lateral' as const, axial: null, ...row })),
    ...document.gravity.map((row) => ({ effect: 'gravity' as const, basis: null, variant: null, shear: null, ...row })),
    ...document.transferred.map((row) => ({ effect: 'transferred' as const, ...row })),
  ];
  addDataSheet<TakedownRow>(
    workbook,
    content,
    'Takedown',
    [
      { head: 'Effect', width: 12, value: (row) => row.effect },
      { head: 'Basis', width: 12, value: (row) => row.basis },
      { head: 'Case', width: 10, value: (row) => row.case },
      { head: 'Variant', width: 8, value: (row) => row.variant },
      { head: 'Level', width: 12, value: (row) => row.level },
      { head: 'Wall', width: 10, value: (row) => row.wall },
      { head: `Axial, compression + (${unit.force})`, width: 24, format: forceFormat, value: (row) => row.axial },
      { head: `Shear (${unit.force})`, width: 14, format: forceFormat, value: (row) => row.shear },
      { head: `Moment at story bottom (${unit.moment})`, width: 30, format: forceFormat, value: (row) => row.moment },
    ],
    rows,
  );
}

const checkColumns: readonly DataColumn<ResultCheck>[] = [
  { head: 'Wall', width: 10, value: (row) => row.wall },
  { head: 'Level', width: 12, value: (row) => row.level },
  { head: 'Basis', width: 12, value: (row) => row.basis },
  { head: 'Check', width: 18, value: (row) => row.check },
  { head: 'Demand', width: 14, format: '#,##0.0000', value: (row) => row.demand },
  { head: 'Capacity', width: 14, format: '#,##0.0000', value: (row) => row.capacity },
  { head: 'Unit', width: 10, value: (row) => (row.unit === '' ? null : row.unit) },
  { head: 'Ratio', width: 10, format: ratio, value: (row) => row.ratio },
  { head: 'Verdict', width: 10, value: (row) => (row.ok ? 'ok' : 'over') },
  { head: 'Clause', width: 20, value: (row) => row.clause },
  { head: 'Combination', width: 52, value: (row) => row.combination },
];

/** Every check of every story section: demand, capacity, ratio, clause and combination. */
export function addChecksSheet(workbook: Workbook, content: WorkbookContent): void {
  addDataSheet(workbook, content, 'Checks', checkColumns, content.document.checks);
}

/** The balance: applied against resisted, line by line, with the largest residual of the story. */
export function addBalanceSheet(workbook: Workbook, content: WorkbookContent): void {
  const { document } = content;
  const unit = resultUnits[document.units];
  const unitOf = (line: string): string =>
    line === 'torque' || line.startsWith('overturning') ? unit.moment : unit.force;
  addDataSheet(
    workbook,
    content,
    'Balance',
    [
      { head: 'Basis', width: 12, value: (row) => row.basis },
      { head: 'Case', width: 10, value: (row) => row.case },
      { head: 'Variant', width: 8, value: (row) => row.variant },
      { head: 'Level', width: 12, value: (row) => row.level },
      { head: 'Line', width: 18, value: (row) => row.line },
      { head: 'Unit', width: 10, value: (row) => unitOf(row.line) },
      { head: 'Applied', width: 16, format: forceFormat, value: (row) => row.applied },
      { head: 'Resisted', width: 16, format: forceFormat, value: (row) => row.resisted },
      { head: 'Residual of the story (ratio)', width: 18, format: '0.0E+00', value: (row) => row.residual },
    ],
    document.balance.flatMap(({ lines, ...story }) => lines.map((line) => ({ ...story, ...line }))),
  );
}

/** Concrete, steel with laps and rate: the building, every wall, every band. */
export function addQuantitiesSheet(workbook: Workbook, content: WorkbookContent): void {
  const { quantities, units } = content.document;
  const unit = resultUnits[units];
  addDataSheet(
    workbook,
    content,
    'Quantities',
    [
      { head: 'Of', width: 12, value: (row) => row.of },
      { head: 'Wall', width: 10, value: (row) => row.wall },
      { head: 'From', width: 12, value: (row) => row.from },
      { head: 'To', width: 12, value: (row) => row.to },
      { head: `Concrete (${unit.volume})`, width: 16, format: '#,##0.00', value: (row) => row.concrete },
      { head: `Steel with laps (${unit.mass})`, width: 18, format: '#,##0', value: (row) => row.steel },
      { head: `Rate (${unit.rate})`, width: 14, format: '#,##0.0', value: (row) => row.rate },
    ],
    [
      { of: 'building', wall: null, from: null, to: null, ...quantities },
      ...quantities.walls.flatMap((wall) => [
        { of: 'wall', from: null, to: null, ...wall },
        ...wall.bands.map((band) => ({ of: 'band', wall: wall.wall, ...band })),
      ]),
    ],
  );
}

/** Named limits and notices, as the result carries them. */
export function addWarningsSheet(workbook: Workbook, content: WorkbookContent): void {
  addDataSheet(
    workbook,
    content,
    'Warnings',
    [
      { head: 'Code', width: 26, value: (row) => row.code },
      { head: 'Level', width: 12, value: (row) => row.level ?? null },
      { head: 'Wall', width: 10, value: (row) => row.wall ?? null },
      { head: 'Warning', width: 120, value: (row) => row.message },
    ],
    content.document.warnings,
  );
}
