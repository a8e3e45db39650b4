import { describe, expect, it } from 'vitest';

import type { ResultBalance, ResultDocument } from '#shared/contracts/result';

import { sample, sampleTables } from '../engine/testing/sampleBuilding.ts';
import { balanceInView } from './balanceInView.ts';
import { shareSums } from './shareSums.ts';

const line = (level: string, loadCase: string, residual: number, x: number, y: number): ResultBalance => ({
  basis: 'rigid',
  case: loadCase,
  variant: '0',
  level,
  residual,
  lines: [
    { line: 'force x', applied: x, resisted: x },
    { line: 'force y', applied: y, resisted: y },
  ],
});
const levels = [
  { level: 'Roof', elevation: 24 },
  { level: 'L2', elevation: 12 },
] as unknown as ResultDocument['levels'];

it('takes the worst residual of the case and the base shear in its larger direction', () => {
  const balance = [line('Roof', 'EX', 3e-12, 40, 0), line('L2', 'EX', 1e-14, 90, 5), line('L2', 'EY', 1, 0, 70)];
  const seen = balanceInView({ balance, levels, distribution: [] }, { case: 'EX' });
  expect(seen?.worst.residual).toBe(3e-12);
  expect(seen?.base).toMatchObject({ applied: 90, resisted: 90 });
  expect(seen?.closed).toBe(true);
});

it('breaks above 1e-9, also below zero', () => {
  const balance = [line('L2', 'EY', -2e-9, 0, 70)];
  expect(balanceInView({ balance, levels, distribution: [] }, { case: 'EY' })?.closed).toBe(false);
});

it('takes the first case where the address names none that is there, and nothing where nothing was computed', () => {
  const balance = [line('L2', 'WX', 0, 12, 0)];
  expect(balanceInView({ balance, levels, distribution: [] }, { case: 'EX' })?.case).toBe('WX');
  expect(balanceInView({ balance: [], levels, distribution: [] }, { case: 'EX' })).toBeNull();
});

describe('shares added up once more', () => {
  const walls = sampleTables.walls;
  const { document } = sample;

  it('meet what the balance says is resisted, in every basis, variant and story', () => {
    const seen = balanceInView(document, { case: 'EY' }, walls);
    expect(seen).toMatchObject({ closed: true, lost: null });
    // three stories, three variants, two directions
    expect(shareSums(document, walls, 'EY')).toHaveLength(18);
  });

  it('find a share that was changed on the way, though the balance itself is closed', () => {
    const distribution = document.distribution.map((one) =>
      one.case === 'EY' && one.variant === '0' && one.level === 'L2' && one.wall === 'P1'
        ? { ...one, total: one.total + 5 }
        : one,
    );
    const seen = balanceInView({ ...document, distribution }, { case: 'EY' }, walls);
    expect(seen?.closed).toBe(false);
    // 60 + 45 + 30 kip; 5 of 140 kip of magnitudes
    expect(seen?.lost).toMatchObject({ level: 'L2', direction: 'y', basis: 'rigid' });
    expect(seen?.lost?.sum).toBeCloseTo(140, 9);
    expect(seen?.lost?.resisted).toBeCloseTo(135, 9);
    expect(seen?.lost?.residual).toBeCloseTo(5 / 140, 9);
    expect(balanceInView({ ...document, distribution }, { case: 'EX' }, walls)?.closed).toBe(true);
  });
});
