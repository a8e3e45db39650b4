import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';

import type { AcknowledgmentRow } from '#shared/contracts/acknowledgments';
import type { Warning } from '#shared/engineering/input';

import { fakeServer } from '../../app/testing/fakeServer.ts';
import { renderAt } from '../../app/testing/renderAt.tsx';
import { sample } from '../../engine/testing/sampleBuilding.ts';
import { computedAnswers } from '../../engine/testing/sampleServer.ts';
import { acknowledgmentOf } from './acknowledgmentOf.ts';

const stopping: Warning = { code: 'wall-stops-below-roof', level: 'L3', wall: 'Q2', message: 'Q2 stops at L3.' };
const holding: Warning = {
  code: 'transfer-not-assigned',
  level: 'L2',
  wall: 'Q1',
  message: 'Q1 arrives on L2.',
  holds: { walls: ['P1'], from: 'L2', to: 'Roof' },
};
const row = (at: string, reason: string, stands: boolean): AcknowledgmentRow => ({
  id: at,
  code: 'wall-stops-below-roof',
  level: 'L3',
  wall: 'Q2',
  reason,
  factsHash: '0'.repeat(32),
  by: { id: 'p1', name: 'R. Vane' },
  at,
  stands,
});

const answers = (warnings: readonly Warning[], rows: readonly AcknowledgmentRow[], role = 'engineer') => ({
  ...computedAnswers(role),
  'GET /api/buildings/b1/results': { body: { ...sample.document, warnings } },
  'GET /api/buildings/b1/acknowledgments': { body: { rows, seq: 7 } },
});

const open = async () => {
  renderAt('/buildings/b1/distribution');
  return screen.findByRole('region', { name: 'What to weigh' });
};

describe('What to weigh', () => {
  it('ranks what holds rows first, then what held them until it was settled', async () => {
    const core: Warning = { code: 'core', message: 'A core.' };
    const held = { walls: ['Q2'], from: 'L2', to: 'L3' };
    fakeServer(answers([core, { ...stopping, holds: held, settled: true }, holding], []));
    const list = await open();
    const rows = within(list).getAllByRole('row').slice(1);
    expect(rows.map((one) => one.textContent)).toEqual([
      expect.stringContaining('Q1 arrives on L2.'),
      expect.stringContaining('Q2 stops at L3.'),
      expect.stringContaining('A core.'),
    ]);
    expect(rows[1]).toHaveTextContent('settled');
  });

  it('takes a reason and accepts the warning by its code, level and wall', async () => {
    const server = fakeServer({
      ...answers([stopping], []),
      'POST /api/buildings/b1/acknowledgments': { status: 201, body: row('2026-11-30T09:00:00Z', 'drawn so', true) },
    });
    const list = await open();
    await userEvent.click(await within(list).findByRole('button', { name: 'Accept, because' }));
    expect(within(list).getByRole('button', { name: 'Accept, because' })).toBeDisabled();
    await userEvent.type(within(list).getByLabelText(/^Reason/), 'The stair ends there.{Enter}');
    expect(server.of('POST /api/buildings/b1/acknowledgments')[0]?.body).toEqual({
      code: 'wall-stops-below-roof',
      level: 'L3',
      wall: 'Q2',
      reason: 'The stair ends there.',
    });
  });

  it('says who accepted it and why, and offers nothing more', async () => {
    fakeServer(answers([{ ...stopping, settled: true }], [row('2026-11-30T12:00:00Z', 'The stair ends there', true)]));
    const list = await open();
    expect(await within(list).findByText(/by R. Vane, Nov 30, 2026: The stair ends there/)).toBeInTheDocument();
    expect(within(list).queryByRole('button', { name: 'Accept, because' })).toBeNull();
  });

  it('says that a judgement has lapsed, and asks again', async () => {
    fakeServer(answers([stopping], [row('2026-11-30T12:00:00Z', 'The stair ends there', false)]));
    const list = await open();
    expect(await within(list).findByText('Lapsed:')).toBeInTheDocument();
    expect(within(list).getByText(/The facts have moved since/)).toBeInTheDocument();
    expect(await within(list).findByRole('button', { name: 'Accept, because' })).toBeInTheDocument();
  });

  it('lets a checker read', async () => {
    fakeServer(answers([stopping], [], 'checker'));
    const list = await open();
    expect(within(list).getByText('Q2 stops at L3.')).toBeInTheDocument();
    expect(within(list).queryByRole('button', { name: 'Accept, because' })).toBeNull();
  });
});

it('takes the last judgement of the same code, level and wall', () => {
  const rows = [row('2026-11-30T12:00:00Z', 'second', true), row('2026-11-02T12:00:00Z', 'first', false)];
  expect(acknowledgmentOf(stopping, rows)?.reason).toBe('second');
  expect(acknowledgmentOf({ ...stopping, wall: 'Q1' }, rows)).toBeNull();
  expect(acknowledgmentOf({ code: 'core', message: '' }, rows)).toBeNull();
});
