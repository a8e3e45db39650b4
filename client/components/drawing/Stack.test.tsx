import { render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { expect, it, vi } from 'vitest';

import { Stack, type StackProps } from './Stack.tsx';

const props: StackProps = {
  stories: [
    { level: 'Roof', elevation: 30, height: 10, value: 40, text: '40' },
    { level: 'L3', elevation: 20, height: 10, value: 90, text: '90' },
    { level: 'L2', elevation: 10, height: 10, value: 120, text: '120', over: true },
  ],
  walls: [],
  caption: 'Story shear EX',
  unit: 'kip',
  chosen: 'L3',
  onChoose: () => undefined,
};

it('is a figure that holds the list of stories, each with its value', () => {
  render(<Stack {...props} />);
  const figure = screen.getByRole('figure', { name: 'Stack' });
  const list = within(figure).getByRole('listbox', { name: 'Stories' });
  const options = within(list).getAllByRole('option');
  expect(options.map((option) => option.getAttribute('aria-label'))).toEqual([
    'Roof, 40 kip',
    'L3, 90 kip',
    'L2, 120 kip over',
  ]);
  expect(within(list).getByRole('option', { selected: true })).toHaveAccessibleName('L3, 90 kip');
});

it('chooses with keys and with the pointer', async () => {
  const onChoose = vi.fn();
  render(<Stack {...props} onChoose={onChoose} />);
  screen.getByRole('listbox').focus();
  await userEvent.keyboard('{ArrowUp}{ArrowDown}{Home}{End}r');
  await userEvent.click(screen.getByRole('option', { name: /^L2/ }));
  expect(onChoose.mock.calls.map(([level]: unknown[]) => level)).toEqual(['Roof', 'L2', 'L2', 'Roof', 'Roof', 'L2']);
});

it('has one tab stop', async () => {
  render(<Stack {...props} />);
  await userEvent.tab();
  expect(screen.getByRole('listbox')).toHaveFocus();
  await userEvent.tab();
  expect(document.body).toHaveFocus();
});

it('says the limit in place of a unit', () => {
  render(<Stack {...props} limit={1} unit="" />);
  expect(screen.getByText('limit 1.00')).toBeInTheDocument();
});
