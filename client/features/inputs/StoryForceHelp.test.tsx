import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';

import { fakeServer } from '../../app/testing/fakeServer.ts';
import { renderAt } from '../../app/testing/renderAt.tsx';
import { sampleAnswers, sampleBuilding, sampleLevels } from '../../app/testing/sampleBuilding.ts';

import { storyForces } from './storyForceRows.ts';

const weighed = sampleLevels.map((row, place) => ({
  ...row,
  diaphragm: 'rigid' as const,
  weight: [200, 300, 400][place] ?? 0,
}));
const draft = { case: 'EX', direction: 'x' as const, baseShear: '100', period: '0.4' };

describe('storyForces', () => {
  it('shares by weight times height up to half a second', () => {
    // heights 14.5, 25.5, 37.5 ft: 5,800 + 7,650 + 7,500 = 20,950
    const answer = storyForces(draft, weighed, []);
    if (!answer.ok) throw new Error(answer.message);
    expect(answer.forces.map(({ force }) => Number(force.toFixed(3)))).toEqual([35.8, 36.516, 27.685]);
    expect(answer.forces[2]?.shear).toBeCloseTo(100, 12);
  });

  it.each([
    ['case', { ...draft, case: ' ' }],
    ['baseShear', { ...draft, baseShear: '-3' }],
    ['period', { ...draft, period: '' }],
  ])('names the %s that is wrong', (field, given) => {
    expect(storyForces(given, weighed, [])).toMatchObject({ ok: false, field });
  });

  it('leaves a case with rows alone, and asks for weights', () => {
    expect(storyForces(draft, weighed, ['EX'])).toMatchObject({ ok: false, field: 'case' });
    const light = weighed.map((row) => ({ ...row, weight: row.level === 'L2' ? null : row.weight }));
    const bare = storyForces(draft, light, []);
    expect(bare).toMatchObject({ ok: false, field: null });
    expect(bare.ok ? '' : bare.message).toContain('L2 have none');
  });
});

describe('Story forces from weights', () => {
  const answers = (forcesAre: string) => ({
    ...sampleAnswers(),
    'GET /api/buildings/b1': { body: { ...sampleBuilding, forcesAre } },
    'GET /api/buildings/b1/levels': { body: { rows: weighed, version: 2, seq: 7 } },
    'PATCH /api/buildings/b1/forces': { body: { rows: [], deleted: [], version: 2, seq: 8, alsoChanged: [] } },
  });
  const fill = async () => {
    renderAt('/buildings/b1/inputs/forces');
    await userEvent.click(await screen.findByRole('button', { name: 'Story forces from weights' }));
    const form = within(screen.getByRole('form', { name: 'Story forces from weights' }));
    await userEvent.type(form.getByLabelText('Case'), 'EY');
    await userEvent.click(form.getByRole('button', { name: 'y' }));
    await userEvent.type(form.getByLabelText('Base shear, kip'), '209.5');
    await userEvent.type(form.getByLabelText('Period T, s'), '0.5');
    await userEvent.click(form.getByRole('button', { name: 'Make the rows' }));
  };
  const sent = (server: ReturnType<typeof fakeServer>): readonly unknown[] => {
    const body = server.of('PATCH /api/buildings/b1/forces')[0]?.body as { inserts: { row: Record<string, number> }[] };
    return body.inserts.map(({ row }) => [row.level, row.case, row.kind, row.fx, Number(row.fy?.toFixed(6))]);
  };

  it('makes the rows of a case as edits', async () => {
    const server = fakeServer(answers('level-force'));
    await fill();
    expect(sent(server)).toEqual([
      ['Roof', 'EY', 'seismic', 0, 75],
      ['L3', 'EY', 'seismic', 0, 76.5],
      ['L2', 'EY', 'seismic', 0, 58],
    ]);
  });

  it('makes story shears where the table holds those', async () => {
    const server = fakeServer(answers('story-shear'));
    await fill();
    expect(sent(server)).toEqual([
      ['Roof', 'EY', 'seismic', 0, 75],
      ['L3', 'EY', 'seismic', 0, 151.5],
      ['L2', 'EY', 'seismic', 0, 209.5],
    ]);
  });
});
