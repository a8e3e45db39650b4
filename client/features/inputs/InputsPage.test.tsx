import { fireEvent, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';

import { fakeServer, refusal } from '../../app/testing/fakeServer.ts';
import { renderAt } from '../../app/testing/renderAt.tsx';
import { sampleAnswers, sampleBuilding, sampleLevels } from '../../app/testing/sampleBuilding.ts';

const address = '/buildings/b1/inputs/levels';
const patched = { body: { rows: [], deleted: [], version: 3, seq: 8, alsoChanged: [] } };

async function levelCell(row: number, column: number): Promise<HTMLElement> {
  const grid = await screen.findByRole('grid', { name: 'Levels' });
  const cell = within(within(grid).getAllByRole('row')[row + 1] ?? grid).getAllByRole('gridcell')[column];
  if (cell === undefined) throw new Error(`no cell ${row}, ${column}`);
  return cell;
}

describe('the Levels grid', () => {
  it('shows what is stored, and elevations worked out from the heights', async () => {
    fakeServer(sampleAnswers());
    renderAt(address);
    expect(await levelCell(0, 1)).toHaveTextContent('12.0');
    expect(await levelCell(0, 2)).toHaveTextContent('37.5');
    expect(await levelCell(0, 2)).toHaveAccessibleDescription('worked out from the heights');
    expect(await levelCell(2, 2)).toHaveTextContent('14.5');
    expect(await levelCell(0, 7)).toHaveTextContent('–');
    expect(screen.getByText('3 levels, 37.5 ft above the base')).toBeInTheDocument();
  });

  it('sends an edit with what stood there before', async () => {
    const server = fakeServer({ ...sampleAnswers(), 'PATCH /api/buildings/b1/levels': patched });
    renderAt(address);
    await userEvent.click(await levelCell(1, 1));
    await userEvent.keyboard('10.25{Enter}');
    expect(server.of('PATCH /api/buildings/b1/levels').map((one) => one.body)).toEqual([
      { edits: [{ id: 'l2', column: 'height', was: 11, to: 10.25 }] },
    ]);
  });

  it('marks a cell that the server has not answered, and tells of a refusal that a quick second edit followed', async () => {
    let answer: (value?: unknown) => void = () => undefined;
    const after = new Promise((done) => (answer = done));
    let refused = false;
    fakeServer({
      ...sampleAnswers(),
      'PATCH /api/buildings/b1/levels': () => {
        if (refused) return patched;
        refused = true;
        return { ...refusal(409, 'cell-moved'), after };
      },
    });
    renderAt(address);
    await userEvent.click(await levelCell(1, 1));
    await userEvent.keyboard('10.25{Enter}');
    expect(await levelCell(1, 1)).toHaveAccessibleDescription('saving');
    await userEvent.keyboard('15{Enter}');
    expect(await levelCell(2, 1)).toHaveAccessibleDescription('saving');
    answer();
    expect(await screen.findByText(/A cell was changed while you edited it/)).toBeInTheDocument();
    expect(await levelCell(1, 1)).not.toHaveAccessibleDescription();
  });

  it('refuses a height of zero and a name that is taken, before the server is asked', async () => {
    const server = fakeServer(sampleAnswers());
    renderAt(address);
    await userEvent.click(await levelCell(1, 1));
    await userEvent.keyboard('0{Enter}');
    expect(screen.getByRole('textbox')).toHaveAccessibleDescription(/expected ?a number above 0/);
    await userEvent.keyboard('{Escape}');
    await userEvent.click(await levelCell(1, 0));
    await userEvent.keyboard('Roof{Enter}');
    expect(screen.getByRole('textbox')).toHaveAccessibleDescription(/a name that no other level has/);
    expect(server.asked.filter((one) => one.method === 'PATCH')).toEqual([]);
  });

  it('puts the stored value back and says so when the cell has moved', async () => {
    fakeServer({ ...sampleAnswers(), 'PATCH /api/buildings/b1/levels': refusal(409, 'cell-moved') });
    renderAt(address);
    await userEvent.click(await levelCell(1, 1));
    await userEvent.keyboard('10{Enter}');
    expect(await screen.findByText(/A cell was changed while you edited it/)).toBeInTheDocument();
    expect(await levelCell(1, 1)).toHaveTextContent('11.0');
  });

  it('clears an optional cell on Delete and keeps a required one', async () => {
    const server = fakeServer({ ...sampleAnswers(), 'PATCH /api/buildings/b1/levels': patched });
    renderAt(address);
    await userEvent.click(await levelCell(0, 3));
    await userEvent.keyboard('{Delete}');
    expect(server.of('PATCH /api/buildings/b1/levels').map((one) => one.body)).toEqual([
      { edits: [{ id: 'l3', column: 'x', was: 30, to: null }] },
    ]);
    await userEvent.click(await levelCell(0, 1));
    await userEvent.keyboard('{Delete}');
    expect(screen.getByText(/Height can't be blank, expected a number above 0/)).toBeInTheDocument();
  });

  it('undoes on Ctrl+Z, and says when there is nothing', async () => {
    const server = fakeServer({ ...sampleAnswers(), 'POST /api/buildings/b1/undo': refusal(409, 'nothing-to-undo') });
    renderAt(address);
    await userEvent.click(await levelCell(0, 1));
    await userEvent.keyboard('{Control>}z{/Control}');
    expect(await screen.findByText(/Nothing to undo/)).toBeInTheDocument();
    expect(server.of('POST /api/buildings/b1/undo')).toHaveLength(1);
  });

  it('adds a level above the chosen one and takes one out', async () => {
    const server = fakeServer({ ...sampleAnswers(), 'PATCH /api/buildings/b1/levels': patched });
    renderAt(address);
    await userEvent.click(await levelCell(1, 0));
    await userEvent.click(screen.getByRole('button', { name: 'Add a level' }));
    await userEvent.click(screen.getByRole('button', { name: 'Delete level L3' }));
    await screen.findByText('3 levels, 37.5 ft above the base');
    expect(server.of('PATCH /api/buildings/b1/levels').map((one) => one.body)).toEqual([
      { inserts: [{ after: 'l3', row: { level: 'L5', height: 11 } }] },
      { deletes: [{ id: 'l2', version: 1 }] },
    ]);
  });

  it('adds pasted rows that reach beyond the last one, in one patch', async () => {
    const server = fakeServer({ ...sampleAnswers(), 'PATCH /api/buildings/b1/levels': patched });
    renderAt(address);
    const cell = await levelCell(2, 0);
    await userEvent.click(cell);
    await userEvent.paste('L2\t15\nL1\t16');
    const [sent] = server.of('PATCH /api/buildings/b1/levels');
    expect(sent?.body).toMatchObject({
      edits: [{ id: 'l1', column: 'height', was: 14.5, to: 15 }],
      inserts: [{ after: 'l1', row: { level: 'L1', height: 16, elevation: null } }],
    });
  });

  it('keeps story and wall in the address', async () => {
    fakeServer(sampleAnswers());
    const { router } = renderAt(`${address}?level=L3`);
    const stories = await screen.findByRole('listbox', { name: 'Stories' });
    expect(within(stories).getByRole('option', { selected: true })).toHaveAccessibleName(/^L3/);
    await userEvent.click(within(stories).getByRole('option', { name: /^Roof/ }));
    expect(router.state.location.search).toBe('?level=Roof');
    const nav = screen.getByRole('navigation', { name: 'Building' });
    expect(within(nav).getByRole('link', { name: 'Schedule' })).toHaveAttribute(
      'href',
      '/buildings/b1/schedule?level=Roof',
    );
  });
});

it('lists the combinations in force while there are none of the building', async () => {
  fakeServer({
    ...sampleAnswers(),
    'GET /api/buildings/b1/combinations': { body: { rows: [], version: 1, seq: 1 } },
  });
  renderAt('/buildings/b1/inputs/combinations');
  const list = await screen.findByRole('region', { name: 'Combinations in force' });
  expect(within(list).getByRole('rowheader', { name: 'ASCE 7-22 2.3.1 (5)' }).closest('tr')).toHaveTextContent(
    '0.9D + 1.0W',
  );
  expect(within(list).getByRole('link', { name: 'Settings' })).toHaveAttribute('href', '/buildings/b1/inputs/settings');
});

describe('roles', () => {
  it.each(['checker', 'admin'])('%s reads only', async (role) => {
    fakeServer(sampleAnswers(role));
    renderAt(address);
    const cell = await levelCell(0, 1);
    expect(cell).toHaveAttribute('aria-readonly', 'true');
    await userEvent.click(cell);
    await userEvent.keyboard('5');
    expect(screen.queryByRole('textbox')).toBeNull();
    expect(screen.queryByRole('button', { name: 'Upload a table' })).toBeNull();
    expect(screen.getByText('read only for your role')).toBeInTheDocument();
  });
});

describe('an empty table', () => {
  it('says what to bring first', async () => {
    fakeServer(sampleAnswers());
    renderAt('/buildings/b1/inputs/forces');
    expect(await screen.findByRole('heading', { name: 'No forces yet' })).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Download the template' })).toBeInTheDocument();
  });
});

describe('uploading', () => {
  const ready = {
    table: 'levels',
    rows: sampleLevels.map(({ id: _id, version: _version, ...row }) => row),
    notices: ['remarks is no column of levels.csv and was left out'],
    changes: { added: 2, removed: 1, changed: 0, same: 1 },
    version: 2,
    columns: [],
  };
  const file = (name: string, text: string) => new File([text], name, { type: 'text/csv' });
  const levelsCsv = file('levels.csv', 'level,height (ft)\nRoof,12\nL3,11\nL2,14.5\n');

  async function upload(one: File) {
    await userEvent.click(await screen.findByRole('button', { name: 'Upload a table' }));
    await userEvent.upload(screen.getByLabelText('File to upload'), one);
  }

  it('tries a file without storing, then takes it', async () => {
    const server = fakeServer({ ...sampleAnswers(), 'POST /api/buildings/b1/uploads': { body: ready } });
    renderAt(address);
    await upload(levelsCsv);
    expect(await screen.findByText('2 added, 1 taken out, 1 as they are')).toBeInTheDocument();
    expect(screen.getByText(/remarks is no column/)).toBeInTheDocument();
    const tried = server.of('POST /api/buildings/b1/uploads')[0]?.body;
    if (!(tried instanceof FormData)) throw new Error('no form was sent');
    expect([tried.get('table'), tried.get('dryRun')]).toEqual(['levels', 'true']);
    await userEvent.click(screen.getByRole('button', { name: 'Take it' }));
    expect(await screen.findByRole('heading', { name: 'levels.csv is stored' })).toBeInTheDocument();
    const taken = server.of('POST /api/buildings/b1/uploads')[1]?.body;
    expect(taken instanceof FormData && taken.get('dryRun')).toBeNull();
  });

  it('lists every problem by row and column, and lets heads be matched', async () => {
    const server = fakeServer({
      ...sampleAnswers(),
      'POST /api/buildings/b1/uploads': refusal(422, 'problems', {
        problems: [
          { file: 'levels.csv', row: 1, column: 'level', message: 'the column level is missing in the header; add it' },
          { file: 'levels.csv', row: 3, column: 'height', message: 'height reads "1,3", expected a number above 0' },
        ],
      }),
    });
    renderAt(address);
    await upload(file('levels.csv', 'Floor,height (ft)\nRoof,12\nL3,"1,3"\n'));
    expect(await screen.findByText('Row 1, level')).toBeInTheDocument();
    expect(screen.getByText('Row 3, height')).toBeInTheDocument();
    expect(screen.getByText(/^2 problems/)).toHaveTextContent('What is stored now stays as it is.');
    await userEvent.selectOptions(screen.getByLabelText('Column for Floor'), 'level');
    const again = server.of('POST /api/buildings/b1/uploads')[1]?.body;
    expect(again instanceof FormData && again.get('columns')).toBe('{"Floor":"level"}');
  });

  it('asks for the table when the name does not say it', async () => {
    const server = fakeServer({ ...sampleAnswers(), 'POST /api/buildings/b1/uploads': { body: ready } });
    renderAt(address);
    await upload(file('export-3.csv', 'level,height (ft)\nRoof,12\n'));
    expect(await screen.findByRole('heading', { name: 'Which table is this' })).toBeInTheDocument();
    expect(server.of('POST /api/buildings/b1/uploads')).toEqual([]);
    await userEvent.selectOptions(screen.getByLabelText('Table'), 'levels');
    expect(await screen.findByRole('heading', { name: 'export-3.csv can be taken' })).toBeInTheDocument();
  });

  it('reads rows pasted into an empty table as a file', async () => {
    const server = fakeServer({ ...sampleAnswers(), 'POST /api/buildings/b1/uploads': { body: ready } });
    renderAt('/buildings/b1/inputs/walls');
    await screen.findByRole('heading', { name: 'No walls yet' });
    fireEvent.paste(document.body, { clipboardData: { getData: () => 'wall\tx1\nW1\t0\n' } });
    expect(await screen.findByRole('heading', { name: 'walls.csv can be taken' })).toBeInTheDocument();
    const sent = server.of('POST /api/buildings/b1/uploads')[0]?.body;
    expect(sent instanceof FormData && sent.get('table')).toBe('walls');
  });
});

describe('settings', () => {
  it('sends only what changed, nested keys nested, blanks as null', async () => {
    const server = fakeServer({ ...sampleAnswers(), 'PATCH /api/buildings/b1': { body: sampleBuilding } });
    renderAt('/buildings/b1/inputs/settings');
    const fc = await screen.findByLabelText(/Concrete f′c/);
    await userEvent.clear(fc);
    await userEvent.type(fc, '6,000');
    const flexure = screen.getByLabelText(/Flexure factor/);
    await userEvent.clear(flexure);
    await userEvent.type(flexure, '0.35');
    await userEvent.clear(screen.getByLabelText(/Number/));
    expect(screen.getByText('3 fields changed, not saved')).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Save settings' }));
    expect(server.of('PATCH /api/buildings/b1')[0]?.body).toEqual({
      version: 3,
      fc: 6000,
      stiffness: { flexure: 0.35 },
      number: null,
    });
  });

  it('says what was read and expected beside the field', async () => {
    const server = fakeServer(sampleAnswers());
    renderAt('/buildings/b1/inputs/settings');
    const cover = await screen.findByLabelText(/Cover/);
    await userEvent.clear(cover);
    await userEvent.type(cover, 'thick');
    await userEvent.click(screen.getByRole('button', { name: 'Save settings' }));
    expect(screen.getByText(/read thick, expected a number/)).toBeInTheDocument();
    expect(server.of('PATCH /api/buildings/b1')).toEqual([]);
  });

  it('has no field for what is not built', async () => {
    fakeServer(sampleAnswers());
    renderAt('/buildings/b1/inputs/settings');
    await screen.findByLabelText(/Concrete f′c/);
    for (const absent of [/wall class/i, /^code/i, /shear method/i, /merge/i, /critical/i]) {
      expect(screen.queryByLabelText(absent)).toBeNull();
    }
  });

  it('fixes the units once a table has rows', async () => {
    fakeServer(sampleAnswers());
    renderAt('/buildings/b1/inputs/settings');
    const units = await screen.findByRole('group', { name: 'Units' });
    expect(within(units).getByRole('button', { name: 'SI' })).toBeDisabled();
  });
});
