import { fireEvent, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { describe, expect, it, vi } from 'vitest';

import { DataGrid } from './DataGrid.tsx';
import type { DataGridProps, GridColumn } from './gridTypes.ts';

interface Row {
  readonly id: string;
  readonly name: string;
  readonly height: number;
  readonly kind: string;
}

const parseNumber = (text: string) =>
  /^\d+(\.\d+)?$/.test(text)
    ? ({ ok: true, value: Number(text) } as const)
    : ({ ok: false, expected: 'a number above 0' } as const);

const columns: readonly GridColumn<Row>[] = [
  {
    id: 'name',
    header: 'Level',
    align: 'left',
    width: 80,
    editable: false,
    text: (row) => row.name,
    parse: (text) => ({ ok: true, value: text }),
  },
  {
    id: 'height',
    header: 'Height',
    unit: 'ft',
    align: 'right',
    width: 80,
    editable: true,
    text: (row) => row.height.toFixed(1),
    editText: (row) => String(row.height),
    state: (row) => ({ overwritten: row.id === 'b' }),
    secondLine: (row) => (row.id === 'b' ? 'auto 12.0' : null),
    parse: parseNumber,
  },
  {
    id: 'kind',
    header: 'Kind',
    align: 'left',
    width: 80,
    editable: true,
    text: (row) => row.kind,
    choices: ['rigid', 'flexible'],
    parse: (text) =>
      text === 'rigid' || text === 'flexible'
        ? { ok: true, value: text }
        : { ok: false, expected: 'rigid or flexible' },
  },
];

const start: readonly Row[] = ['a', 'b', 'c'].map((id, index) => ({
  id,
  name: `L${4 - index}`,
  height: 10 + index,
  kind: 'rigid',
}));

const rowId = (row: Row) => row.id;

function Harness(props: Partial<DataGridProps<Row>>) {
  const [rows, setRows] = useState(start);
  return (
    <DataGrid
      name="Levels"
      columns={columns}
      rows={rows}
      rowId={rowId}
      rowHeight={32}
      {...props}
      onCommit={(edits) => {
        props.onCommit?.(edits);
        setRows((before) =>
          before.map((row) =>
            edits
              .filter((edit) => edit.rowId === row.id)
              .reduce((changed, edit) => ({ ...changed, [edit.columnId]: edit.value }), row),
          ),
        );
      }}
    />
  );
}

const cell = (row: number, column: number) => {
  const found = screen.getAllByRole('row')[row + 1];
  if (found === undefined) throw new Error(`no row ${row}`);
  const target = within(found).getAllByRole('gridcell')[column];
  if (target === undefined) throw new Error(`no column ${column}`);
  return target;
};

describe('DataGrid', () => {
  it('is an ARIA grid with one tab stop', async () => {
    const user = userEvent.setup();
    const { container } = render(<Harness />);
    const grid = screen.getByRole('grid', { name: 'Levels' });
    expect(grid).toHaveAttribute('aria-rowcount', '4');
    expect(screen.getAllByRole('columnheader').map((head) => head.textContent)).toEqual(['Level', 'Heightft', 'Kind']);
    expect(screen.getAllByRole('row').map((row) => row.getAttribute('aria-rowindex'))).toEqual(['1', '2', '3', '4']);
    expect(container.querySelectorAll('[tabindex="0"]')).toHaveLength(1);
    await user.tab();
    expect(cell(0, 0)).toHaveFocus();
    await user.tab();
    expect(document.body).toHaveFocus();
  });

  it('walks with arrows, Home, End and Ctrl', async () => {
    const user = userEvent.setup();
    render(<Harness />);
    await user.tab();
    await user.keyboard('{ArrowDown}{ArrowRight}');
    expect(cell(1, 1)).toHaveFocus();
    await user.keyboard('{End}');
    expect(cell(1, 2)).toHaveFocus();
    await user.keyboard('{Control>}{End}{/Control}');
    expect(cell(2, 2)).toHaveFocus();
    await user.keyboard('{Control>}{Home}{/Control}');
    expect(cell(0, 0)).toHaveFocus();
    await user.keyboard('{PageDown}');
    expect(cell(2, 0)).toHaveFocus();
  });

  it('edits with Enter, commits with Enter and goes down', async () => {
    const user = userEvent.setup();
    const onCommit = vi.fn();
    render(<Harness onCommit={onCommit} />);
    await user.click(cell(0, 1));
    await user.keyboard('{Enter}');
    expect(screen.getByRole('textbox', { name: 'Height, L4' })).toHaveValue('10');
    await user.keyboard('.5{Enter}');
    expect(onCommit).toHaveBeenCalledExactlyOnceWith([{ rowId: 'a', columnId: 'height', value: 10.5, text: '10.5' }]);
    expect(cell(0, 1)).toHaveTextContent('10.5');
    expect(cell(1, 1)).toHaveFocus();
  });

  it('starts anew when a sign is typed, and commits with Tab to the right', async () => {
    const user = userEvent.setup();
    const onCommit = vi.fn();
    render(<Harness onCommit={onCommit} />);
    await user.click(cell(2, 1));
    await user.keyboard('7{Tab}');
    expect(onCommit).toHaveBeenCalledExactlyOnceWith([{ rowId: 'c', columnId: 'height', value: 7, text: '7' }]);
    expect(cell(2, 2)).toHaveFocus();
  });

  it('says what was expected, keeps Enter from taking it, and leaves with Escape', async () => {
    const user = userEvent.setup();
    const onCommit = vi.fn();
    render(<Harness onCommit={onCommit} />);
    await user.click(cell(0, 1));
    await user.keyboard('x{Enter}');
    const field = screen.getByRole('textbox');
    expect(field).toHaveAttribute('aria-invalid', 'true');
    expect(field).toHaveAccessibleDescription(/expected ?a number above 0/);
    await user.keyboard('{Escape}');
    expect(screen.queryByRole('textbox')).toBeNull();
    expect(cell(0, 1)).toHaveFocus();
    expect(cell(0, 1)).toHaveTextContent('10.0');
    expect(onCommit).not.toHaveBeenCalled();
  });

  it('takes nothing when nothing was changed', async () => {
    const user = userEvent.setup();
    const onCommit = vi.fn();
    render(<Harness onCommit={onCommit} />);
    await user.click(cell(0, 1));
    await user.keyboard('{Enter}{Enter}');
    expect(onCommit).not.toHaveBeenCalled();
  });

  it('keeps a fitting draft when another cell is clicked, once', async () => {
    const user = userEvent.setup();
    const onCommit = vi.fn();
    render(<Harness onCommit={onCommit} />);
    await user.click(cell(0, 1));
    await user.keyboard('9');
    await user.click(cell(2, 0));
    expect(onCommit).toHaveBeenCalledExactlyOnceWith([{ rowId: 'a', columnId: 'height', value: 9, text: '9' }]);
    expect(cell(2, 0)).toHaveFocus();
  });

  it('steps through choices with the arrows', async () => {
    const user = userEvent.setup();
    const onCommit = vi.fn();
    render(<Harness onCommit={onCommit} />);
    await user.click(cell(0, 2));
    await user.keyboard('{Enter}{ArrowDown}{Enter}');
    expect(onCommit).toHaveBeenCalledExactlyOnceWith([
      { rowId: 'a', columnId: 'kind', value: 'flexible', text: 'flexible' },
    ]);
  });

  it('does not edit what is read only', async () => {
    const user = userEvent.setup();
    render(<Harness readOnly />);
    await user.click(cell(0, 1));
    await user.keyboard('{Enter}5');
    expect(screen.queryByRole('textbox')).toBeNull();
    expect(cell(0, 1)).toHaveAttribute('aria-readonly', 'true');
  });

  it('hands Delete, Ctrl+Z and the focus to the page', async () => {
    const user = userEvent.setup();
    const onClear = vi.fn();
    const onUndo = vi.fn();
    const onFocusCell = vi.fn();
    render(<Harness onClear={onClear} onUndo={onUndo} onFocusCell={onFocusCell} />);
    await user.click(cell(1, 1));
    await user.keyboard('{Delete}{Control>}z{/Control}');
    expect(onClear).toHaveBeenCalledExactlyOnceWith('b', 'height');
    expect(onUndo).toHaveBeenCalledOnce();
    expect(onFocusCell).toHaveBeenLastCalledWith('b', 'height');
  });

  it('describes an overwritten cell', () => {
    render(<Harness />);
    expect(cell(1, 1)).toHaveAccessibleDescription('overwritten, auto 12.0');
    expect(cell(0, 1)).not.toHaveAccessibleDescription();
  });

  it('copies the chosen range as tab-separated rows', async () => {
    const user = userEvent.setup();
    render(<Harness />);
    await user.click(cell(0, 0));
    await user.keyboard('{Shift>}{ArrowDown}{ArrowRight}{/Shift}');
    const setData = vi.fn();
    fireEvent.copy(cell(1, 1), { clipboardData: { setData } });
    expect(setData).toHaveBeenCalledExactlyOnceWith('text/plain', 'L4\t10\nL3\t11');
  });

  it('pastes into editable cells, passing over others', async () => {
    const user = userEvent.setup();
    const onCommit = vi.fn();
    render(<Harness onCommit={onCommit} />);
    await user.click(cell(0, 0));
    await user.paste('L9\t20\nL8\t21');
    expect(onCommit).toHaveBeenCalledExactlyOnceWith([
      { rowId: 'a', columnId: 'height', value: 20, text: '20' },
      { rowId: 'b', columnId: 'height', value: 21, text: '21' },
    ]);
  });

  it('pastes nothing when one cell does not parse, and says which', async () => {
    const user = userEvent.setup();
    const onCommit = vi.fn();
    render(<Harness onCommit={onCommit} />);
    await user.click(cell(0, 1));
    await user.paste('20\nabc');
    expect(onCommit).not.toHaveBeenCalled();
    expect(screen.getByRole('alert')).toHaveTextContent(
      'Row 2 of the pasted rows, Height: read abc, expected a number above 0. Nothing was pasted.',
    );
  });

  it('hands rows beyond the last one to the page', async () => {
    const user = userEvent.setup();
    const onPasteRows = vi.fn();
    render(<Harness onPasteRows={onPasteRows} />);
    await user.click(cell(2, 1));
    await user.paste('1\n2');
    expect(onPasteRows).toHaveBeenCalledExactlyOnceWith([['1'], ['2']], { rowId: 'c', columnId: 'height' });
  });

  it('fills down from the first row of the range', async () => {
    const user = userEvent.setup();
    const onCommit = vi.fn();
    render(<Harness onCommit={onCommit} />);
    await user.click(cell(0, 1));
    await user.keyboard('{Shift>}{ArrowDown}{ArrowDown}{/Shift}{Control>}d{/Control}');
    expect(onCommit).toHaveBeenCalledExactlyOnceWith([
      { rowId: 'b', columnId: 'height', value: 10, text: '10' },
      { rowId: 'c', columnId: 'height', value: 10, text: '10' },
    ]);
  });

  it('shows group heads and feet and counts them as rows', () => {
    render(
      <Harness
        groupOf={(row) => (row.id === 'c' ? 'W2' : 'W1')}
        renderGroupHead={(group) => <h2>{group}</h2>}
        renderGroupFoot={(group) => <p>quantities of {group}</p>}
      />,
    );
    expect(screen.getAllByRole('rowheader').map((head) => head.textContent)).toEqual(['W1', 'W2']);
    expect(screen.getByText('quantities of W1')).toBeInTheDocument();
    expect(screen.getByRole('grid')).toHaveAttribute('aria-rowcount', '8');
  });

  it("opens the page's reading beneath the row", async () => {
    const user = userEvent.setup();
    render(<Harness reading={(_row, columnId, draft) => `${columnId} reads as ${draft}`} />);
    await user.click(cell(0, 1));
    await user.keyboard('8');
    expect(screen.getByRole('status')).toHaveTextContent('height reads as 8');
  });

  it('puts every row of a long grid on paper, and only what is in view on the screen', () => {
    const many = Array.from({ length: 300 }, (_, index) => ({
      id: `r${index}`,
      name: `L${index}`,
      height: 10,
      kind: 'rigid',
    }));
    render(
      <DataGrid name="Levels" columns={columns} rows={many} rowId={rowId} rowHeight={32} onCommit={() => undefined} />,
    );
    const drawn = () => screen.getAllByRole('row').length - 1;
    expect(drawn()).toBeLessThan(300);
    fireEvent(window, new Event('beforeprint'));
    expect(drawn()).toBe(300);
    fireEvent(window, new Event('afterprint'));
    expect(drawn()).toBeLessThan(300);
  });
});
