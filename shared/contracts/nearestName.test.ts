import { describe, expect, it } from 'vitest';

import { nearestName } from './nearestName.ts';

describe('nearestName', () => {
  const names = ['thickness', 'height', 'fc', 'fy', 'x1'];
  it.each([
    ['thicknes', 'thickness'],
    ['Heigth', 'height'],
    ['fcc', 'fc'],
    ['elevation', null],
    ['', null],
  ])('%j: %j', (typed, near) => {
    expect(nearestName(typed, names)).toBe(near);
  });

  it('knows no name where there is none', () => {
    expect(nearestName('fc', [])).toBeNull();
  });
});
