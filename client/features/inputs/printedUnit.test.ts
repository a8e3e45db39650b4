import { expect, it } from 'vitest';

import { printedUnit } from './printedUnit.ts';

it.each([
  ['m2', 'm²'],
  ['ft2', 'ft²'],
  ['kN/m3', 'kN/m³'],
  ['kN-m', 'kN-m'],
  ['', ''],
])('prints %s as %s', (unit, printed) => {
  expect(printedUnit(unit)).toBe(printed);
});
