import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';

import type { ScheduleResourceRow } from '#shared/contracts/schedule';

import { fakeServer, refusal, type Answer, type Answers } from '../../app/testing/fakeServer.ts';
import { renderAt } from '../../app/testing/renderAt.tsx';
import { sample } from '../../engine/testing/sampleBuilding.ts';
import { computedAnswers } from '../../engine/testing/sampleServer.ts';

const address = '/buildings/b1/schedule?wall=P1&level=L2';
const patchRoute = 'PATCH /api/buildings/b1/schedule/row-2';

const first = sample.rows[1];
if (!first) throw new Error('the sample has no second row');
const row: ScheduleResourceRow = first;

/** The schedule with the second row as given. */
const withRow = (changed: Partial<ScheduleResourceRow>): Answers => ({
  ...computedAnswers(),
  'GET /api/buildings/b1/schedule': {
    body: { rows: sample.rows.map((one) => (one.id === row.id ? { ...one, ...changed } : one)), seq: 8, orphans: [] },
  },
});

const grid = () => screen.findByRole('grid', { name: 'Wall schedule' });

async function cellOf(line: number, text: RegExp): Promise<HTMLElement> {
  const found = within(await grid())
    .getAllByRole('row')
    .filter((one) => one.querySelector('[data-row]') !== null)[line];
  if (!found) throw new Error(`no row ${line}`);
  const cell = within(found)
    .getAllByRole('gridcell')
    .find((one) => text.test(one.textContent));
  if (!cell) throw new Error(`no cell ${text.source}`);
  return cell;
}

describe('SchedulePage', () => {
  it('shows one grid with a group for each wall, levels, notation and the worst ratio', async () => {
    fakeServer(computedAnswers());
    renderAt(address);
    const table = await grid();
    expect(within(table).getAllByRole('rowheader')).toHaveLength(4);
    expect(await cellOf(1, /^#4@18 EF/)).toBeInTheDocument();
    expect(await cellOf(1, /^0\.96/)).toHaveAttribute('aria-description', expect.stringContaining('within the limits'));
    expect(await cellOf(1, /^12$/)).toHaveAttribute('aria-readonly', 'true');
    expect(screen.getByText(/4 walls, 8 bands/)).toBeInTheDocument();
  });

  it('reads a typed callout, sends the whole cell and shows the answer', async () => {
    const answer: Answer = {
      body: {
        row: { ...row, version: 2, vertical: { curtains: 2, bar: 5, spacing: 10 }, overwritten: ['vertical'] },
        alsoChanged: [],
        seq: 8,
      },
    };
    const server = fakeServer({ ...computedAnswers(), [patchRoute]: answer });
    renderAt(address);
    await userEvent.click(await cellOf(1, /^#4@18 EF/));
    await userEvent.keyboard('no. 5 @ 10" ef');
    // 2 x 0.31 / (10 x 12)
    expect(screen.getByText(/0\.0052/)).toBeInTheDocument();
    expect(screen.getByText('2 curtains, No. 5 at 10 in')).toBeInTheDocument();
    await userEvent.keyboard('{Enter}');
    await waitFor(() => expect(server.of(patchRoute)).toHaveLength(1));
    expect(server.of(patchRoute)[0]?.body).toEqual({ version: 1, vertical: { curtains: 2, bar: 5, spacing: 10 } });
  });

  it('says what it expected and sends nothing while a text does not parse', async () => {
    const server = fakeServer(computedAnswers());
    renderAt(address);
    await userEvent.click(await cellOf(1, /^#4@18 EF/));
    await userEvent.keyboard('#16@12 EF{Enter}');
    expect(screen.getByText(/a bar of inch-pound size: #3, #4/)).toBeInTheDocument();
    await userEvent.keyboard('{Escape}');
    expect(server.of(patchRoute)).toHaveLength(0);
  });

  it('sends two quick edits of a row one after the other, the second with the version that the first left', async () => {
    let version = 1;
    const server = fakeServer({
      ...computedAnswers(),
      [patchRoute]: () => {
        version += 1;
        return { body: { row: { ...row, version }, alsoChanged: [], seq: 7 + version } };
      },
    });
    renderAt(address);
    await userEvent.click(await cellOf(1, /^#4@18 EF/));
    await userEvent.keyboard('#5@10 EF{Tab}#5@9 EF{Enter}');
    await waitFor(() => expect(server.of(patchRoute)).toHaveLength(2));
    expect(server.of(patchRoute).map((one) => one.body)).toEqual([
      { version: 1, vertical: { curtains: 2, bar: 5, spacing: 10 } },
      { version: 2, horizontal: { curtains: 2, bar: 5, spacing: 9, end: 'hook' } },
    ]);
  });

  it('marks overwritten and over cells, and gives a cell back with Delete', async () => {
    const server = fakeServer(
      withRow({
        vertical: { curtains: 2, bar: 5, spacing: 10 },
        overwritten: ['vertical'],
        ok: false,
        state: 'over',
        ratio: 1.034,
      }),
    );
    renderAt(address);
    const cell = await cellOf(1, /^#5@10 EF/);
    expect(cell).toHaveAttribute('aria-description', 'overwritten, auto #4@18 EF');
    expect(await cellOf(1, /^1\.04/)).toHaveTextContent(/^1\.04over/);
    expect(screen.getByText('1 over a limit')).toBeInTheDocument();
    await userEvent.click(cell);
    await userEvent.keyboard('{Delete}');
    await waitFor(() => expect(server.of(patchRoute)).toHaveLength(1));
    expect(server.of(patchRoute)[0]?.body).toEqual({ version: 1, release: ['vertical'] });
  });

  it('finds a wall or a bar, from anywhere by its key', async () => {
    fakeServer(computedAnswers());
    renderAt(address);
    await grid();
    await userEvent.keyboard('/');
    expect(screen.getByRole('searchbox', { name: 'Wall or bar' })).toHaveFocus();
    await userEvent.keyboard('q2');
    expect(within(await grid()).getAllByRole('rowheader')).toHaveLength(1);
    await userEvent.keyboard('xx');
    expect(screen.getByText(/No row has a wall or a bar that reads q2xx/)).toBeInTheDocument();
    await userEvent.keyboard('{Escape}');
    expect(within(await grid()).getAllByRole('rowheader')).toHaveLength(4);
  });

  it('shows what is not settled, and why, and the way to what there is to weigh', async () => {
    const answers = withRow({ state: 'not settled', notDesigned: ['out-of-plane slenderness'] });
    // one of three is settled, and drift has a note of its own
    const warnings = [
      { code: 'core', message: 'A core.' },
      { code: 'opening-solid', level: 'L2', wall: 'P2', message: 'P2 is taken as solid.' },
      { code: 'wall-stops-below-roof', level: 'L3', wall: 'Q2', message: 'Q2 stops at L3.', settled: true },
      { code: 'drift-not-available', message: 'Drift is not available.' },
    ];
    fakeServer({ ...answers, 'GET /api/buildings/b1/results': { body: { ...sample.document, warnings } } });
    renderAt(address);
    const cell = await cellOf(1, /not settled/);
    expect(cell).toHaveAttribute('aria-description', expect.stringContaining('not settled'));
    expect(screen.getByText('Not designed: out-of-plane slenderness')).toBeInTheDocument();
    expect(screen.getByRole('link', { name: '2 points to weigh' })).toHaveAttribute(
      'href',
      '/buildings/b1/distribution?level=L2&wall=P1#what-to-weigh',
    );
  });

  it('takes the automatic choice by its button', async () => {
    const server = fakeServer(withRow({ vertical: { curtains: 2, bar: 5, spacing: 10 }, overwritten: ['vertical'] }));
    renderAt(address);
    const button = await screen.findByRole('button', { name: 'Take auto selection' });
    expect(button).toHaveAttribute('aria-disabled', 'true');
    await userEvent.click(await cellOf(1, /^#5@10 EF/));
    await userEvent.click(button);
    await waitFor(() => expect(server.of(patchRoute)[0]?.body).toEqual({ version: 1, release: ['vertical'] }));
  });

  it('shows both values of a conflict and lets the person choose', async () => {
    const stored = { ...row, version: 5, vertical: { curtains: 2, bar: 6, spacing: 12 } };
    let asked = 0;
    const server = fakeServer({
      ...computedAnswers(),
      [patchRoute]: () => {
        asked += 1;
        if (asked === 1) return refusal(409, 'version', { current: stored });
        return { body: { row: { ...stored, version: 6 }, alsoChanged: [], seq: 9 } };
      },
    });
    renderAt(address);
    await userEvent.click(await cellOf(1, /^#4@18 EF/));
    await userEvent.keyboard('#5@10 EF{Enter}');
    const conflict = await screen.findByRole('alert', { name: 'Conflict' });
    expect(within(conflict).getByText('#5@10 EF')).toBeInTheDocument();
    expect(within(conflict).getByText('#6@12 EF')).toBeInTheDocument();
    await userEvent.click(within(conflict).getByRole('button', { name: 'Keep mine' }));
    await waitFor(() => expect(server.of(patchRoute)).toHaveLength(2));
    expect(server.of(patchRoute)[1]?.body).toEqual({ version: 5, vertical: { curtains: 2, bar: 5, spacing: 10 } });
    expect(screen.queryByRole('alert', { name: 'Conflict' })).toBeNull();
  });

  it('edits the notes of the focused row', async () => {
    const server = fakeServer({
      ...computedAnswers(),
      [patchRoute]: { body: { row: { ...row, version: 2 }, alsoChanged: [], seq: 8 } },
    });
    renderAt(address);
    await userEvent.click(await cellOf(1, /^#4@18 EF/));
    await userEvent.click(screen.getByRole('button', { name: 'Edit notes' }));
    const field = screen.getByRole('textbox', { name: /Notes, P1, L2 – L3/ });
    await userEvent.clear(field);
    await userEvent.type(field, 'Verify at opening.{Enter}Pour break at L3.');
    await userEvent.click(screen.getByRole('button', { name: 'Keep these notes' }));
    await waitFor(() =>
      expect(server.of(patchRoute)[0]?.body).toEqual({
        version: 1,
        notes: ['Verify at opening.', 'Pour break at L3.'],
      }),
    );
  });

  it('undoes with Ctrl+Z', async () => {
    const server = fakeServer({ ...computedAnswers(), 'POST /api/buildings/b1/undo': refusal(409, 'nothing-to-undo') });
    renderAt(address);
    await userEvent.click(await cellOf(1, /^#4@18 EF/));
    await userEvent.keyboard('{Control>}z{/Control}');
    expect(await screen.findByText(/Nothing to undo/)).toBeInTheDocument();
    expect(server.of('POST /api/buildings/b1/undo')).toHaveLength(1);
  });

  it.each(['checker', 'admin'])('is read only for a %s', async (role) => {
    fakeServer(computedAnswers(role));
    renderAt(address);
    expect(await grid()).toHaveAttribute('aria-readonly', 'true');
    expect(screen.queryByRole('button', { name: 'Take auto selection' })).toBeNull();
    await userEvent.click(await cellOf(1, /^#4@18 EF/));
    await userEvent.keyboard('#5');
    expect(screen.queryByRole('textbox')).toBeNull();
  });

  it('filters rows and says where there is none', async () => {
    fakeServer(withRow({ ok: false, state: 'over' }));
    renderAt(address);
    await userEvent.click(await screen.findByRole('button', { name: 'Over a limit' }));
    expect(within(await grid()).getAllByRole('rowheader')).toHaveLength(1);
    await userEvent.click(screen.getByRole('button', { name: 'Overwritten' }));
    expect(screen.getByText('No cell is overwritten.')).toBeInTheDocument();
  });

  it('follows the stack to the band of the chosen story', async () => {
    fakeServer(computedAnswers());
    renderAt(address);
    await userEvent.click(await screen.findByRole('option', { name: /^Roof/ }));
    expect(screen.getByText('band of P1, 12.0 ft')).toBeInTheDocument();
  });

  it('shows a refusal of the workbook instead of leaving the page', async () => {
    fakeServer({
      ...computedAnswers(),
      'GET /api/buildings/b1/schedule.xlsx': refusal(503, 'busy'),
    });
    renderAt(address);
    await userEvent.click(await screen.findByRole('button', { name: 'Download workbook' }));
    expect(await screen.findByText(/The server is busy/)).toBeInTheDocument();
  });
});
