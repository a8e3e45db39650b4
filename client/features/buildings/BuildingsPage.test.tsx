import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { beforeEach, describe, expect, it } from 'vitest';

import { fakeServer, refusal } from '../../app/testing/fakeServer.ts';
import { renderAt } from '../../app/testing/renderAt.tsx';
import { sampleAnswers, sampleBuilding } from '../../app/testing/sampleBuilding.ts';

beforeEach(() => {
  // jsdom has no modal dialogs
  HTMLDialogElement.prototype.showModal = function showModal(this: HTMLDialogElement) {
    this.open = true;
  };
  HTMLDialogElement.prototype.close = function close(this: HTMLDialogElement) {
    this.open = false;
  };
});

describe('BuildingsPage', () => {
  it('lists buildings with height from the levels', async () => {
    fakeServer(sampleAnswers());
    renderAt('/buildings');
    const row = (await screen.findByRole('link', { name: 'Tern Yard' })).closest('tr');
    if (row === null) throw new Error('the building stands in no row');
    // 12 + 11 + 14.5 ft
    expect(await within(row).findByText('37.5')).toBeInTheDocument();
    expect(row).toHaveTextContent('In progress');
  });

  it('finds by number', async () => {
    fakeServer(sampleAnswers());
    renderAt('/buildings');
    await userEvent.type(await screen.findByLabelText('Find a building'), '99');
    expect(screen.queryByRole('link', { name: 'Tern Yard' })).toBeNull();
    await userEvent.clear(screen.getByLabelText('Find a building'));
    await userEvent.type(screen.getByLabelText('Find a building'), '41');
    expect(screen.getByRole('link', { name: 'Tern Yard' })).toBeInTheDocument();
  });

  it('makes a new building and opens its inputs', async () => {
    const server = fakeServer({
      ...sampleAnswers(),
      'POST /api/buildings': { status: 201, body: sampleBuilding },
    });
    const { router } = renderAt('/buildings');
    await userEvent.click(await screen.findByRole('button', { name: 'New building' }));
    await userEvent.click(screen.getByRole('button', { name: 'Create building' }));
    expect(screen.getByText('Name is blank, expected the name of the building.')).toBeInTheDocument();
    await userEvent.type(screen.getByLabelText('Name'), 'Tern Yard');
    await userEvent.click(screen.getByRole('button', { name: /SI/ }));
    await userEvent.click(screen.getByRole('button', { name: 'Create building' }));
    expect(await screen.findByRole('grid', { name: 'Levels' })).toBeInTheDocument();
    expect(server.of('POST /api/buildings')[0]?.body).toEqual({ name: 'Tern Yard', units: 'si' });
    expect(router.state.location.pathname).toBe('/buildings/b1/inputs/levels');
  });

  it.each(['checker', 'admin'])('offers no new building to a %s', async (role) => {
    fakeServer(sampleAnswers(role));
    renderAt('/buildings');
    await screen.findByRole('link', { name: 'Tern Yard' });
    expect(screen.queryByRole('button', { name: 'New building' })).toBeNull();
  });

  it('tells a drafter what will stand here', async () => {
    fakeServer({ ...sampleAnswers('drafter'), 'GET /api/buildings': { body: { rows: [] } } });
    renderAt('/buildings');
    expect(await screen.findByText('No revision has been issued yet')).toBeInTheDocument();
  });

  it('offers to ask again when the server is busy', async () => {
    fakeServer({ ...sampleAnswers(), 'GET /api/buildings': refusal(503, 'busy') });
    renderAt('/buildings');
    expect(await screen.findByText('The server is busy')).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Ask again' })).toBeInTheDocument();
  });
});

describe('a building that is not open to the person', () => {
  it('shows a drafter the designed page', async () => {
    fakeServer({ ...sampleAnswers('drafter'), 'GET /api/buildings/b1': refusal(403, 'forbidden') });
    renderAt('/buildings/b1/schedule');
    expect(await screen.findByRole('heading', { name: 'Work in progress is not shown' })).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'All buildings' })).toHaveAttribute('href', '/buildings');
    expect(screen.queryByRole('navigation', { name: 'Building' })).toBeNull();
  });

  it('says that nothing stands at an unknown address', async () => {
    fakeServer(sampleAnswers());
    renderAt('/buildings/b9/inputs/levels');
    expect(await screen.findByRole('heading', { name: 'Nothing stands at this address' })).toBeInTheDocument();
  });
});
