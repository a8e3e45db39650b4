import { expect, it } from 'vitest';

import type { ResultBalance, ResultDocument } from '#shared/contracts/result';

import { balanceInView } from './balanceInView.ts';

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
  const seen = balanceInView({ balance, levels }, { case: 'EX' });
  expect(seen?.worst.residual).toBe(3e-12);
  expect(seen?.base).toMatchObject({ applied: 90, resisted: 90 });
  expect(seen?.closed).toBe(true);
});

it('breaks above 1e-9, also below zero', () => {
  const balance = [line('L2', 'EY', -2e-9, 0, 70)];
  expect(balanceInView({ balance, levels }, { case: 'EY' })?.closed).toBe(false);
});

it('takes the first case where the address names none that is there, and nothing where nothing was computed', () => {
  const balance = [line('L2', 'WX', 0, 12, 0)];
  expect(balanceInView({ balance, levels }, { case: 'EX' })?.case).toBe('WX');
  expect(balanceInView({ balance: [], levels }, { case: 'EX' })).toBeNull();
});
