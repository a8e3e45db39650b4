import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';

import { fakeServer, refusal } from '../../app/testing/fakeServer.ts';
import { renderAt } from '../../app/testing/renderAt.tsx';
import { threeBases, threeBasesInput } from '../../components/drawing/testing/threeBases.ts';
import { sample, sampleResource, sampleTable } from '../../engine/testing/sampleBuilding.ts';
import { computedAnswers } from '../../engine/testing/sampleServer.ts';

const address = '/buildings/b1/distribution?case=EY&level=L2';

describe('DistributionPage', () => {
  it('shows plan, shares and balance of the story in the address', async () => {
    fakeServer(computedAnswers());
    renderAt(address);
    expect(await screen.findByRole('figure', { name: 'Plan' })).toBeInTheDocument();
    const shares = screen.getByRole('region', { name: 'Shares, L2, EY' });
    const row = within(shares).getByRole('button', { name: 'P1' }).closest('tr');
    expect(row).toHaveTextContent('67.5');
    expect(row).toHaveTextContent('50.0 %');
    const balance = screen.getByRole('region', { name: 'Balance, L2, EY' });
    expect(within(balance).getByRole('rowheader', { name: 'Force y' }).closest('tr')).toHaveTextContent('135.0');
    // 12 x 40 kip typed and 24 + 24 + 24 + 20 ft of wall, 1 ft thick and 39 ft high, at 0.15 kcf
    expect(within(balance).getByRole('rowheader', { name: 'Vertical, D' }).closest('tr')).toHaveTextContent('1,018.2');
    expect(within(balance).getByRole('rowheader', { name: 'Vertical, L' }).closest('tr')).toHaveTextContent('120.0');
    expect(within(balance).queryByRole('rowheader', { name: 'Vertical, S' })).toBeNull();
    // what closes reads to the decimals of the balance, not as the rounding of the machine
    expect(within(balance).getByRole('rowheader', { name: 'Force y' }).closest('tr')).toHaveTextContent(
      'Force y135.0135.00.0kip',
    );
    expect(within(balance).getByText('closed')).toBeInTheDocument();
  });

  it('says plainly that drift is not available', async () => {
    const drifts = sample.document.drifts.map((one) => ({ ...one, x: null, y: null, edge: null, torsionRatio: null }));
    const warnings = [{ code: 'drift-not-available', message: 'Q2 starts above the base.' }];
    fakeServer({
      ...computedAnswers(),
      'GET /api/buildings/b1/results': { body: { ...sample.document, drifts, displacements: [], warnings } },
    });
    renderAt(address);
    expect(await screen.findByText('Drift: not available')).toBeInTheDocument();
    expect(screen.getByText('Q2 starts above the base.')).toBeInTheDocument();
    expect(screen.queryByText(/^Dashed: the slab/)).toBeNull();
  });

  it('walks the stories with the stack and keeps the choice in the address', async () => {
    fakeServer(computedAnswers());
    const { router } = renderAt(address);
    (await screen.findByRole('listbox', { name: 'Stories' })).focus();
    await userEvent.keyboard('{ArrowUp}');
    expect(await screen.findByRole('region', { name: 'Shares, L3, EY' })).toBeInTheDocument();
    expect(router.state.location.search).toContain('level=L3');
  });

  it('switches case and variant, and chooses a wall on the plan', async () => {
    fakeServer(computedAnswers());
    const { router } = renderAt(address);
    await userEvent.click(await screen.findByRole('button', { name: 'EX' }));
    await userEvent.click(screen.getByRole('button', { name: '+5 %' }));
    await userEvent.click(within(screen.getByRole('figure', { name: 'Plan' })).getByRole('option', { name: /^Q2/ }));
    const search = new URLSearchParams(router.state.location.search);
    expect([search.get('case'), search.get('variant'), search.get('wall')]).toEqual(['EX', '+', 'Q2']);
    expect(screen.getByRole('option', { name: /^Q2/ })).toHaveAttribute('aria-selected', 'true');
  });

  it('goes to the next wall with W', async () => {
    fakeServer(computedAnswers());
    const { router } = renderAt(`${address}&wall=Q2`);
    await screen.findByRole('figure', { name: 'Plan' });
    await userEvent.keyboard('w');
    expect(new URLSearchParams(router.state.location.search).get('wall')).toBe('P1');
  });

  it('starts from the wall with the largest share, and says what there is to weigh', async () => {
    fakeServer(computedAnswers());
    renderAt('/buildings/b1/distribution?case=EX&level=L2');
    // Q1 is 24 ft long and Q2 20 ft
    expect(await screen.findByRole('option', { name: /^Q1/ })).toHaveAttribute('aria-selected', 'true');
    const weigh = screen.getByRole('region', { name: 'What to weigh' });
    expect(within(weigh).getByText(/Shares are by relative rigidity/)).toBeInTheDocument();
    expect(within(weigh).queryByText(/Drift, torsion ratio/)).toBeNull();
  });

  it('says what to bring first where there are no levels', async () => {
    const empty = { ...sampleTable('levels'), rows: [] };
    fakeServer({
      ...computedAnswers(),
      'GET /api/buildings/b1/levels': { body: empty },
      'GET /api/buildings/b1/results': refusal(422, 'does-not-compute'),
    });
    renderAt(address);
    expect(await screen.findByRole('heading', { name: 'No levels yet' })).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Go to levels' })).toHaveAttribute('href', '/buildings/b1/inputs/levels');
  });

  it('lists the problems of tables that do not fit together, each with the way there', async () => {
    const problems = [
      { table: 'walls', row: 2, column: 'to_level', rowId: 'walls-2', message: 'read L9, expected a level.' },
    ];
    fakeServer({
      ...computedAnswers(),
      'GET /api/buildings/b1/results': refusal(422, 'does-not-compute', { problems }),
    });
    renderAt(address);
    expect(await screen.findByText('read L9, expected a level.')).toBeInTheDocument();
    expect(screen.getByRole('link', { name: /walls, row 2/ })).toHaveAttribute(
      'href',
      '/buildings/b1/inputs/walls?row=walls-2',
    );
  });
});

const several = (role = 'engineer') => ({
  ...computedAnswers(role),
  'GET /api/buildings/b1': { body: { ...sampleResource, basis: threeBasesInput.settings.basis } },
  'GET /api/buildings/b1/results': { body: threeBases },
});

describe('DistributionPage under several bases', () => {
  it('stands them side by side, and switches plan, shares and balance with the basis', async () => {
    fakeServer(several());
    const { router } = renderAt('/buildings/b1/distribution?case=EX&level=L2');
    const table = await screen.findByRole('region', { name: 'The bases, L2, EX' });
    // 135 kip by halves of the floor
    expect(within(table).getByRole('button', { name: 'Q1' }).closest('tr')).toHaveTextContent('67.5');
    expect(within(table).getByText(/spreads most:/)).toBeInTheDocument();
    const shares = screen.getByRole('region', { name: 'Shares, L2, EX' });
    expect(within(shares).getByRole('columnheader', { name: /Torsional/ })).toBeInTheDocument();
    await userEvent.click(within(table).getByRole('button', { name: 'Flexible' }));
    expect(new URLSearchParams(router.state.location.search).get('basis')).toBe('flexible');
    expect(within(shares).queryByRole('columnheader', { name: /Torsional/ })).toBeNull();
    expect(within(shares).getByRole('button', { name: 'Q1' }).closest('tr')).toHaveTextContent('50.0 %');
    expect(screen.getByRole('option', { name: 'Q1, 67.5 kip, 50.0 %' })).toBeInTheDocument();
    const balance = screen.getByRole('region', { name: 'Balance, L2, EX' });
    expect(within(balance).queryByRole('rowheader', { name: /^Torque/ })).toBeNull();
    expect(within(balance).getAllByText('closed')).toHaveLength(3);
  });

  it('puts the envelope beside the bases for an engineer, and offers it to nobody else', async () => {
    const server = fakeServer({ ...several(), 'PATCH /api/buildings/b1': { body: sampleResource } });
    const { unmount } = renderAt(address);
    await userEvent.click(await screen.findByRole('button', { name: 'Use the envelope' }));
    expect(server.of('PATCH /api/buildings/b1')[0]?.body).toEqual({
      version: 1,
      basis: ['rigid', 'flexible', 'compatible', 'envelope'],
    });
    unmount();
    fakeServer(several('checker'));
    renderAt(address);
    await screen.findByRole('figure', { name: 'Plan' });
    expect(screen.queryByRole('button', { name: 'Use the envelope' })).toBeNull();
  });

  it('breaks in words where a share was changed on the way', async () => {
    const distribution = threeBases.distribution.map((one) =>
      one.basis === 'rigid' && one.case === 'EY' && one.variant === '0' && one.level === 'L2' && one.wall === 'P1'
        ? { ...one, total: one.total + 5 }
        : one,
    );
    fakeServer({ ...several(), 'GET /api/buildings/b1/results': { body: { ...threeBases, distribution } } });
    renderAt(address);
    const balance = await screen.findByRole('region', { name: 'Balance, L2, EY' });
    expect(within(balance).getByRole('alert')).toHaveTextContent(
      'Balance broken: rigid shares at L2 add up to 140.0 in y, resisted are 135.0 kip.',
    );
    expect(screen.getByText('Balance broken').closest('[role=alert]')).toHaveTextContent('add up to 140.0');
  });

  it('puts drift and torsion in the bars of the stack, and the displaced slab in words', async () => {
    fakeServer(several());
    renderAt(address);
    await userEvent.click(await screen.findByRole('button', { name: 'Torsion' }));
    expect(within(screen.getByRole('figure', { name: 'Stack' })).getByText('Torsion ratio EY')).toBeInTheDocument();
    expect(within(screen.getByRole('figure', { name: 'Stack' })).getByText('limit 1.20')).toBeInTheDocument();
    expect(screen.getByText(/^Dashed: the slab of L2 as EY moves it/)).toBeInTheDocument();
    expect(screen.getByRole('region', { name: 'Drift and torsion by level' })).toBeInTheDocument();
    const panel = screen.getByRole('region', { name: 'How much the model matters' });
    expect(within(panel).getByRole('button', { name: 'P1' }).closest('tr')).toHaveTextContent('50.0');
  });
});
