import { screen } from '@testing-library/react';
import { expect, it } from 'vitest';

import { fakeServer } from './testing/fakeServer.ts';
import { renderAt } from './testing/renderAt.tsx';
import { sampleAnswers } from './testing/sampleBuilding.ts';

const results = (residual: number) => ({
  body: {
    units: 'us',
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

it('shows applied against resisted with the residual', async () => {
  fakeServer({ ...sampleAnswers(), 'GET /api/buildings/b1/results': results(6.7e-16) });
  renderAt('/buildings/b1/inputs/walls');
  expect(await screen.findByText('residual 6.7e−16')).toBeInTheDocument();
  expect(screen.getByText(/EX applied/)).toHaveTextContent('EX applied 1,290.1');
});

it('breaks loudly, in words, when a load was lost', async () => {
  fakeServer({ ...sampleAnswers(), 'GET /api/buildings/b1/results': results(0.02) });
  renderAt('/buildings/b1/inputs/walls');
  const alert = await screen.findByRole('alert');
  expect(alert).toHaveTextContent('Balance broken');
  expect(alert).toHaveTextContent('EX, L2: residual 2.0e−2, over 1e−9.');
});
