import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';

import { fakeServer } from '../../app/testing/fakeServer.ts';
import { renderAt } from '../../app/testing/renderAt.tsx';
import { threeBases } from '../../components/drawing/testing/threeBases.ts';
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

describe('TakedownPage under several bases', () => {
  const answers = () => ({ ...computedAnswers(), 'GET /api/buildings/b1/results': { body: threeBases } });

  it('lays the bases over each other and says what governs by keys', async () => {
    fakeServer(answers());
    const { router } = renderAt(address);
    const figure = await screen.findByRole('figure', { name: 'Down the height' });
    for (const basis of ['rigid', 'flexible', 'compatible']) expect(within(figure).getAllByText(basis)).toHaveLength(2);
    const governs = screen.getByRole('region', { name: 'What governs' });
    expect(governs).toHaveTextContent('P1 at L2, what governs under rigid');
    within(figure).getByRole('listbox', { name: 'Down the wall' }).focus();
    await userEvent.keyboard('{ArrowUp}');
    expect(router.state.location.search).toContain('level=L3');
    expect(governs).toHaveTextContent('P1 at L3, what governs under rigid');
    // 1.4 x (80 kip typed + 24 ft x 1 ft x 24 ft x 0.15 kcf) against 1.2 x 166.4 + 1.6 x 20 = 231.7
    expect(within(governs).getByRole('rowheader', { name: 'Pmax' }).closest('tr')).toHaveTextContent(
      /233\.0 kip.*1\.4D, rigid/,
    );
  });

  it('follows the pointer without choosing', async () => {
    fakeServer(answers());
    const { router } = renderAt(address);
    const figure = await screen.findByRole('figure', { name: 'Down the height' });
    await userEvent.hover(within(figure).getByRole('option', { name: /^Roof/ }));
    expect(screen.getByRole('region', { name: 'What governs' })).toHaveTextContent('P1 at Roof, what governs');
    expect(router.state.location.search).toContain('level=L2');
  });

  it('gives the foundation its reactions, and each floor its collectors', async () => {
    fakeServer(answers());
    renderAt(address);
    const foundation = await screen.findByRole('region', { name: 'Reactions for the foundation' });
    expect(within(foundation).getByRole('button', { name: 'P1' })).toBeInTheDocument();
    const collectors = screen.getByRole('region', { name: 'Collectors' });
    // half of 60 kip
    expect(within(collectors).getByRole('rowheader', { name: 'Roof' }).closest('tr')).toHaveTextContent('30.0');
    const foot = screen.getByRole('region', { name: 'P1 at its foot, L2, by case and basis' });
    expect(within(foot).getAllByRole('rowheader', { name: 'EY' })).toHaveLength(3);
    // 3 x 40 kip typed, 24 ft x 1 ft x 39 ft x 0.15 kcf
    expect(
      await screen.findByText(/P1: dead 260.4 kip at its foot, 120.0 of it typed, 140.4 self-weight/),
    ).toBeInTheDocument();
  });

  it('lists what engineers assigned on lines of its own', async () => {
    const rows = [
      {
        id: 'o1',
        version: 1,
        kind: 'transfer',
        level: 'L3',
        wall: 'P1',
        case: 'EY',
        shear: 12,
        axial: null,
        moment: null,
        share: null,
        reason: 'Wall above the lobby',
      },
    ];
    fakeServer({ ...answers(), 'GET /api/buildings/b1/overrides': { body: { rows, version: 1, seq: 7 } } });
    renderAt(address);
    const assigned = await screen.findByRole('region', { name: 'Transfers and assigned shares' });
    expect(within(assigned).getByText('Wall above the lobby').closest('tr')).toHaveTextContent('L3P1EY–12.0');
  });
});
