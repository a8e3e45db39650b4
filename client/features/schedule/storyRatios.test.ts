import { expect, it } from 'vitest';

import { levelsDown } from '../../components/drawing/resultChoice.ts';
import { sample } from '../../engine/testing/sampleBuilding.ts';
import { storyRatios } from './storyRatios.ts';

const down = levelsDown(sample.document);

it('agrees with the rows: the worst of a band is the worst of its stories', () => {
  const ratios = new Map(storyRatios(sample.document.checks, 'P1', down).map((one) => [one.level, one.ratio ?? 0]));
  const row = sample.rows.find((one) => one.wall === 'P1' && one.to === 'L3');
  expect(Math.max(ratios.get('L2') ?? 0, ratios.get('L3') ?? 0)).toBe(row?.ratio);
});

it('is over where a check fails, and knows where the wall does not stand', () => {
  const [check] = sample.document.checks.filter(
    (one) => one.wall === 'P1' && one.check === 'shear' && one.level === 'L3',
  );
  if (!check) throw new Error('no shear check');
  const failing = { ...check, capacity: null, ratio: null, ok: false };
  const [roof, third] = storyRatios([failing], 'P1', down);
  expect(third).toEqual({ level: 'L3', ratio: null, over: true, stands: true });
  expect(roof).toMatchObject({ stands: false, over: false });
});
