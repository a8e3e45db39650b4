import { describe, expect, it } from 'vitest';

import { listedFormat } from './listedFormat.ts';
import { ratioFormat } from './ratioFormat.ts';

describe('number formats of the schedule', () => {
  it.each([
    [12, '#,##0'],
    [5000, '#,##0'],
    [3.5, '#,##0.0'],
    [43.25, '#,##0.00'],
    [27.5000001, '#,##0.0'],
    [10, '#,##0'],
  ])('%d is listed as %s', (value, format) => {
    expect(listedFormat(value)).toBe(format);
  });

  it.each([
    [0.853, '0.000'],
    [1, '0.000'],
    [1.003, '0.000'],
    [1.0004, '0.0000'],
    [1.0000004, '0.0000000'],
    [null, '0.000'],
  ])('ratio %d prints with %s', (ratio, format) => {
    expect(ratioFormat(ratio)).toBe(format);
  });
});
