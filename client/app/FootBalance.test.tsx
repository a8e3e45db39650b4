import { screen } from '@testing-library/react';
import { expect, it } from 'vitest';

import { fakeServer } from './testing/fakeServer.ts';
import { renderAt } from './testing/renderAt.tsx';
import { sampleAnswers } from './testing/sampleBuilding.ts';

const results = (residual: number) => ({
  body: {
    units: 'us',
    distribution: [],
    levels: [{ level: 'L2', elevation: 14.5 }],
    balance: [
      {
        basis: 'rigid',
        case: 'EX',
        variant: '0',
        level: 'L2',
        residual,
        lines: [{ line: 'force x', applied: 1290.1, resisted: 1290.1 }],
      },
    ],
  },
});

const complete = () => ({
  ...sampleAnswers(),
  'GET /api/buildings/b1/walls': {
    body: {
      rows: [
        {
          id: 'w1',
          version: 1,
          wall: 'W1',
          x1: 0,
          y1: 0,
          x2: 20,
          y2: 0,
          thickness: 12,
          from_level: 'L2',
          to_level: 'L2',
        },
      ],
      version: 1,
      seq: 1,
    },
  },
  'GET /api/buildings/b1/forces': {
    body: {
      rows: [{ id: 'f1', version: 1, level: 'L2', case: 'EX', kind: 'seismic', fx: 9, fy: 0 }],
      version: 1,
      seq: 1,
    },
  },
});

it('does not ask for results before there are levels, walls and forces', async () => {
  const server = fakeServer(sampleAnswers());
  renderAt('/buildings/b1/inputs/levels');
  await screen.findByRole('grid', { name: 'Levels' });
  expect(screen.getByText('follows levels, walls and forces')).toBeInTheDocument();
  expect(server.of('GET /api/buildings/b1/results')).toEqual([]);
});

it('shows applied against resisted with the residual', async () => {
  fakeServer({ ...complete(), 'GET /api/buildings/b1/results': results(6.7e-16) });
  renderAt('/buildings/b1/inputs/walls');
  expect(await screen.findByText('residual 6.7e−16')).toBeInTheDocument();
  expect(screen.getByText(/EX applied/)).toHaveTextContent('EX applied 1,290.1');
});

it('breaks loudly, in words, when a load was lost', async () => {
  fakeServer({ ...complete(), 'GET /api/buildings/b1/results': results(0.02) });
  renderAt('/buildings/b1/inputs/walls');
  const alert = (await screen.findByText('Balance broken')).parentElement;
  expect(alert).toHaveAttribute('role', 'alert');
  expect(alert).toHaveTextContent('Balance broken');
  expect(alert).toHaveTextContent('EX, L2: residual 2.0e−2, over 1e−9.');
});
