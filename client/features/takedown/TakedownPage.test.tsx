import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';

import { fakeServer } from '../../app/testing/fakeServer.ts';
import { renderAt } from '../../app/testing/renderAt.tsx';
import { sample } from '../../engine/testing/sampleBuilding.ts';
import { computedAnswers } from '../../engine/testing/sampleServer.ts';

const address = '/buildings/b1/takedown?case=EY&wall=P1&level=L2';

describe('TakedownPage', () => {
  it('shows the wall down the height, story by story and at its foot', async () => {
    fakeServer(computedAnswers());
    renderAt(address);
    expect(await screen.findByRole('figure', { name: 'Down the height' })).toBeInTheDocument();
    const stories = screen.getByRole('region', { name: 'P1, story by story' });
    // 30 x 12 + 52.5 x 12 + 67.5 x 15 = 2,002.5 kip-ft
    expect(within(stories).getByRole('rowheader', { name: 'L2' }).closest('tr')).toHaveTextContent('2,003');
    const reactions = screen.getByRole('region', { name: 'Base reactions' });
    expect(within(reactions).getByRole('rowheader', { name: 'Sum' }).closest('tr')).toHaveTextContent('135.0');
  });

  it('shows another wall', async () => {
    fakeServer(computedAnswers());
    const { router } = renderAt(address);
    await userEvent.selectOptions(await screen.findByLabelText('Wall'), 'Q1');
    expect(await screen.findByRole('heading', { name: 'Takedown, wall Q1' })).toBeInTheDocument();
    expect(router.state.location.search).toContain('wall=Q1');
  });

  it('starts from the wall with the largest share, and lists walls that stop', async () => {
    const warnings = [
      { code: 'rigid-only', message: 'Shares are by relative rigidity.' },
      { code: 'wall-stops-below-roof', level: 'L3', wall: 'Q2', message: 'Q2 stops at L3.' },
    ];
    fakeServer({
      ...computedAnswers(),
      'GET /api/buildings/b1/results': { body: { ...sample.document, warnings } },
    });
    renderAt('/buildings/b1/takedown?case=EX');
    expect(await screen.findByRole('heading', { name: 'Takedown, wall Q1' })).toBeInTheDocument();
    const weigh = screen.getByRole('region', { name: 'What to weigh' });
    expect(within(weigh).getByText('Q2 stops at L3.').closest('tr')).toHaveTextContent('L3Q2');
    expect(within(weigh).queryByText(/relative rigidity/)).toBeNull();
  });

  it('chooses a story from the table', async () => {
    fakeServer(computedAnswers());
    const { router } = renderAt(address);
    const stories = await screen.findByRole('region', { name: 'P1, story by story' });
    await userEvent.click(within(stories).getByRole('rowheader', { name: 'L3' }));
    expect(router.state.location.search).toContain('level=L3');
  });
});
