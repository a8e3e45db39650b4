import { expect, it } from 'vitest';

import { storyForKey } from './stackKeys.ts';

const levels = ['Roof', 'L12', 'L11', 'L2', 'Mezzanine', 'Base floor'];
const go = (chosen: string | null, key: string, typed = ''): string | null => storyForKey(levels, chosen, key, typed);

it('walks up and down and stops at the ends', () => {
  expect(go('L11', 'ArrowUp')).toBe('L12');
  expect(go('L11', 'ArrowDown')).toBe('L2');
  expect(go('Roof', 'ArrowUp')).toBe('Roof');
  expect(go('Base floor', 'ArrowDown')).toBe('Base floor');
});

it('reaches base with Home and roof with End', () => {
  expect(go('L11', 'Home')).toBe('Base floor');
  expect(go('L11', 'End')).toBe('Roof');
});

it('jumps by letter or digit, round the list with one and onward with several', () => {
  expect(go('Roof', 'l', 'l')).toBe('L12');
  expect(go('L12', 'l', 'l')).toBe('L11');
  expect(go('L2', 'l', 'l')).toBe('L12');
  expect(go('Roof', '1', 'l11')).toBe('L11');
  expect(go('Roof', '2', '2')).toBe('L2');
  expect(go('Roof', 'm', 'm')).toBe('Mezzanine');
});

it('leaves other keys alone', () => {
  expect(go('L11', 'Tab')).toBeNull();
  expect(go('L11', 'z', 'z')).toBeNull();
});
