import { describe, expect, it } from 'vitest';

import { readUnit } from './unitConversion.ts';

import type { Quantity } from '../contracts/tableColumns.ts';
import type { UnitSystem } from '../engineering/input.ts';

function converted(value: number, unit: string, quantity: Quantity, units: UnitSystem): number {
  const reading = readUnit(unit, quantity, units);
  if (!reading.ok) throw new Error(reading.message);
  return reading.convert ? reading.convert(value) : value;
}

describe('readUnit', () => {
  // by hand: 1 ft = 12 in = 304.8 mm, 1 kip = 1000 lb = 4.4482216152605 kN, 1 ksi = 6.894757293168361 MPa
  it('converts without a trace of rounding where the ratio is whole', () => {
    expect(converted(138, 'in', 'length', 'us')).toBe(11.5);
    expect(converted(1, 'ft', 'thickness', 'us')).toBe(12);
    expect(converted(235, 'mm', 'length', 'si')).toBe(0.235);
    expect(converted(0.3, 'm', 'thickness', 'si')).toBe(300);
    expect(converted(25, 'cm', 'thickness', 'si')).toBe(250);
    expect(converted(5, 'ksi', 'concreteStrength', 'us')).toBe(5000);
    expect(converted(1250, 'lb', 'force', 'us')).toBe(1.25);
    expect(converted(1.2, 'MN', 'force', 'si')).toBe(1200);
    expect(converted(144, 'in2', 'area', 'us')).toBe(1);
    expect(converted(600, 'kip-in', 'moment', 'us')).toBe(50);
  });

  it('converts between the systems', () => {
    expect(converted(3048, 'mm', 'length', 'us')).toBeCloseTo(10, 12);
    expect(converted(10, 'ft', 'length', 'si')).toBeCloseTo(3.048, 12);
    expect(converted(1, 'kip', 'force', 'si')).toBeCloseTo(4.4482216152605, 12);
    expect(converted(35, 'MPa', 'concreteStrength', 'us')).toBeCloseTo(5076.320819, 5);
    expect(converted(1, 'kip-ft', 'moment', 'si')).toBeCloseTo(1.3558179483314, 12);
    expect(converted(100, 'm2', 'area', 'us')).toBeCloseTo(1076.391041671, 8);
  });

  it('spells units freely where nothing is lost', () => {
    expect(converted(1, 'kN·m', 'moment', 'si')).toBe(1);
    expect(converted(1, 'KIP', 'force', 'us')).toBe(1);
    expect(converted(1, 'ft²', 'area', 'us')).toBe(1);
    expect(readUnit('mN', 'force', 'si').ok).toBe(false);
    expect(readUnit('toString', 'force', 'si').ok).toBe(false);
  });

  it('refuses what does not fit the column', () => {
    expect(readUnit('kip', 'length', 'us')).toMatchObject({
      ok: false,
      message: expect.stringContaining('something else'),
    });
    expect(readUnit('yd', 'length', 'us')).toMatchObject({ ok: false, message: expect.stringContaining('not known') });
    expect(readUnit('ft', 'fraction', 'us')).toMatchObject({
      ok: false,
      message: expect.stringContaining('have none'),
    });
  });
});
