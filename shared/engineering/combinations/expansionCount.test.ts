import { describe, expect, it } from 'vitest';

import { generateBuilding } from '../../../scripts/bench/generateBuilding.ts';
import { runBuilding } from '../../result/runBuilding.ts';
import type { Settings } from '../input.ts';

/**
 * Rows of `--all-actions`, a wall and story, for the default combinations of seven lines written out: 1.4D (1); 1.2D + 1.6L with three
 * roof loads (3); roof loads with L (3) or with 0.5W (3); 1.0W with three roof loads (3); 0.9D + 1.0W (1); two with E. So 7 without lateral
 * load, 7 a wind state and 2 a seismic state.
 *
 * Wind states with x and y cases each way, `windCases`: 2 (x + y) whole, 4 (x + y) at 0.75 with eccentricity, 4 xy pairs at 0.75, 16 xy
 * pairs at 0.563 with an eccentricity each. Without eccentricity (`flexible`): 2 (x + y), 2 (x + y), 4 xy, 4 xy.
 * Seismic states with `orthogonal`: 2 xy ordered pairs, 4 signs, 4 places of the eccentricity (+ or - on the one or the other); 1 without.
 */
const windStates = (x: number, y: number, eccentric: boolean): number =>
  eccentric ? 6 * (x + y) + 20 * x * y : 4 * (x + y) + 8 * x * y;
const seismicStates = (x: number, y: number, eccentric: boolean): number => 2 * x * y * 4 * (eccentric ? 4 : 1);
const rows = (x: number, y: number, eccentric: boolean): number =>
  7 + 7 * windStates(x, y, eccentric) + 2 * seismicStates(x, y, eccentric);

function counts(more: Partial<Settings>): Map<string, number> {
  const input = generateBuilding(2, 4, 3);
  const outcome = runBuilding({ ...input, settings: { ...input.settings, ...more } }, { allActions: true });
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
  const found = new Map<string, number>();
  for (const { basis, wall, level } of outcome.document.actions) {
    if (wall === 'W1' && level === 'N1') found.set(basis, (found.get(basis) ?? 0) + 1);
  }
  return found;
}

describe('the bench building: two wind and two seismic cases each way', () => {
  it('991 rows a wall and story: 7 + 7 x 104 + 2 x 128', () => {
    expect(windStates(2, 2, true)).toBe(104);
    expect(seismicStates(2, 2, true)).toBe(128);
    expect(rows(2, 2, true)).toBe(991);
    expect(counts({ basis: ['rigid', 'compatible'] })).toEqual(
      new Map([
        ['rigid', 991],
        ['compatible', 991],
      ]),
    );
  });

  it('407 where floors are flexible: 7 + 7 x 48 + 2 x 32', () => {
    expect(rows(2, 2, false)).toBe(407);
    expect(counts({ basis: ['flexible'] })).toEqual(new Map([['flexible', 407]]));
  });

  it('without wind cases and pairs: 7 + 7 x 8 + 2 x 16', () => {
    expect(counts({ basis: ['rigid'], windCases: false, orthogonal: 0 })).toEqual(new Map([['rigid', 95]]));
  });
});
