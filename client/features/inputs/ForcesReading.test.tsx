import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';

import { fakeServer } from '../../app/testing/fakeServer.ts';
import { renderAt } from '../../app/testing/renderAt.tsx';
import { sampleAnswers, sampleBuilding, sampleLevels } from '../../app/testing/sampleBuilding.ts';

import { baseShears, differenceFrom } from './baseShears.ts';

const force = (id: string, level: string, fx: number, fy: number) => ({
  id,
  version: 1,
  level,
  case: 'EY',
  kind: 'seismic' as const,
  fx,
  fy,
  x: null,
  y: null,
  mz: null,
});
const forces = [force('f1', 'Roof', 1, 40), force('f2', 'L3', 1, 70), force('f3', 'L2', 1, -96)];

describe('base shears', () => {
  const levels = sampleLevels.map((row) => ({ ...row, diaphragm: 'rigid' as const }));
  it('reads the rows both ways, along the larger direction', () => {
    expect(baseShears(levels, forces)).toEqual([
      { case: 'EY', kind: 'seismic', asLevelForces: 14, asStoryShears: -96 },
    ]);
  });

  it('has no story shear at the base where the lowest level has no row', () => {
    expect(baseShears(levels, forces.slice(0, 2))[0]?.asStoryShears).toBeNull();
  });

  it('compares sizes, not signs', () => {
    expect(differenceFrom(-102, 100)).toBeCloseTo(0.02, 12);
    expect(differenceFrom(95, -100)).toBeCloseTo(-0.05, 12);
  });
});

describe('the Forces tab', () => {
  const answers = (settings: object = {}) => ({
    ...sampleAnswers(),
    'GET /api/buildings/b1': { body: { ...sampleBuilding, expectedBaseShear: { EY: 100 }, ...settings } },
    'GET /api/buildings/b1/forces': { body: { rows: forces, version: 2, seq: 7 } },
    'PATCH /api/buildings/b1': { body: { ...sampleBuilding, forcesAre: 'story-shear', version: 4 } },
  });

  it('shows both readings, and the difference of the one in force', async () => {
    fakeServer(answers({ forcesAre: 'story-shear' }));
    renderAt('/buildings/b1/inputs/forces');
    const table = await screen.findByRole('table', { name: 'Base shears' });
    const cells = within(table)
      .getAllByRole('cell')
      .map((cell) => cell.textContent);
    expect(cells.slice(0, 2)).toEqual(['14.0', '−96.0']);
    expect(cells[3]).toBe('100.0');
    expect(cells[4]).toMatch(/^−4\.00/);
  });

  it('sends the answer with the version that was read', async () => {
    const server = fakeServer(answers());
    renderAt('/buildings/b1/inputs/forces');
    await userEvent.click(await screen.findByRole('button', { name: 'Story shear' }));
    expect(server.of('PATCH /api/buildings/b1').map((one) => one.body)).toEqual([
      { version: 3, forcesAre: 'story-shear' },
    ]);
  });
});

describe('the Overrides tab', () => {
  it('shows the grid with kinds, names and reasons, and adds a row', async () => {
    const row = {
      id: 'o1',
      version: 1,
      kind: 'transfer',
      level: 'L2',
      wall: 'W1',
      case: null,
      shear: null,
      axial: 120,
      moment: null,
      share: null,
      reason: 'hangs on the ring beam',
    };
    const server = fakeServer({
      ...sampleAnswers(),
      'GET /api/buildings/b1/overrides': { body: { rows: [row], version: 1, seq: 7 } },
      'PATCH /api/buildings/b1/overrides': { body: { rows: [], deleted: [], version: 2, seq: 8, alsoChanged: [] } },
    });
    renderAt('/buildings/b1/inputs/overrides');
    const grid = await screen.findByRole('grid', { name: 'Overrides' });
    const cells = within(grid)
      .getAllByRole('gridcell')
      .map((cell) => cell.textContent);
    expect(cells).toContain('hangs on the ring beam');
    expect(screen.getByText('1 transfer, 0 shares')).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Add an override' }));
    expect(server.of('PATCH /api/buildings/b1/overrides').map((one) => one.body)).toMatchObject([
      { inserts: [{ row: { kind: 'transfer', level: 'L2', wall: 'W1' } }] },
    ]);
  });
});
