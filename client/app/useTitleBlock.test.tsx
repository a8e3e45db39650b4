import { screen } from '@testing-library/react';
import { expect, it } from 'vitest';

import { fakeServer } from './testing/fakeServer.ts';
import { renderAt } from './testing/renderAt.tsx';
import { sampleAnswers } from './testing/sampleBuilding.ts';
import { cssString } from './useTitleBlock.ts';

it('writes any text as a CSS string', () => {
  expect(cssString('Tower "A"\nLevel \\ 2')).toBe('"Tower \\"A\\"\\a Level \\\\ 2"');
});

it('gives the margin of printed sheets building, page, state and caution', async () => {
  fakeServer(sampleAnswers());
  renderAt('/buildings/b1/inputs/levels?level=L3');
  await screen.findByRole('grid', { name: 'Levels' });
  const of = (name: string) => document.documentElement.style.getPropertyValue(name);
  expect(of('--print-building')).toContain('Inputs, L3');
  expect(of('--print-state')).toContain('No revision issued, in progress');
  expect(of('--print-caution')).toContain('licensed professional');
  expect(of('--print-date')).toMatch(/^"\d{4}-\d\d-\d\d"$/);
});
