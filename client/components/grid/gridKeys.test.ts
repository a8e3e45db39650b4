import { describe, expect, it } from 'vitest';

import { keyInEditor, keyOnCell, steppedChoice, type KeyPress } from './gridKeys.ts';

const press = (key: string, held: Partial<KeyPress> = {}): KeyPress => ({
  key,
  ctrl: false,
  shift: false,
  alt: false,
  ...held,
});

describe('keyOnCell', () => {
  it('knows arrows, with Shift as a range', () => {
    expect(keyOnCell(press('ArrowDown'))).toEqual({ kind: 'move', rows: 1, columns: 0, extend: false });
    expect(keyOnCell(press('ArrowLeft', { shift: true }))).toEqual({
      kind: 'move',
      rows: 0,
      columns: -1,
      extend: true,
    });
    expect(keyOnCell(press('PageDown'))).toEqual({ kind: 'move', rows: 10, columns: 0, extend: false });
  });

  it('knows Home and End, alone and with Ctrl', () => {
    expect(keyOnCell(press('Home'))).toEqual({ kind: 'row-edge', end: false, extend: false });
    expect(keyOnCell(press('End', { ctrl: true }))).toEqual({ kind: 'grid-edge', end: true, extend: false });
  });

  it('edits on Enter and F2, types on a sign, clears on Delete, undoes on Ctrl+Z', () => {
    expect(keyOnCell(press('Enter'))).toEqual({ kind: 'edit' });
    expect(keyOnCell(press('F2'))).toEqual({ kind: 'edit' });
    expect(keyOnCell(press('#'))).toEqual({ kind: 'type', text: '#' });
    expect(keyOnCell(press('Delete'))).toEqual({ kind: 'clear' });
    expect(keyOnCell(press('z', { ctrl: true }))).toEqual({ kind: 'undo' });
  });

  it('leaves Tab, copy, paste, Alt and redo to others', () => {
    for (const held of [
      press('Tab'),
      press('c', { ctrl: true }),
      press('v', { ctrl: true }),
      press('w', { alt: true }),
      press('Z', { ctrl: true, shift: true }),
    ]) {
      expect(keyOnCell(held)).toBeNull();
    }
  });
});

describe('keyInEditor', () => {
  it('commits down on Enter, right on Tab, the other way with Shift', () => {
    expect(keyInEditor(press('Enter'), false)).toEqual({ kind: 'commit', rows: 1, columns: 0 });
    expect(keyInEditor(press('Tab', { shift: true }), false)).toEqual({ kind: 'commit', rows: 0, columns: -1 });
    expect(keyInEditor(press('Escape'), false)).toEqual({ kind: 'leave' });
  });

  it('keeps arrows for the text unless there are choices', () => {
    expect(keyInEditor(press('ArrowDown'), false)).toBeNull();
    expect(keyInEditor(press('ArrowDown'), true)).toEqual({ kind: 'step-choice', by: 1 });
  });
});

describe('steppedChoice', () => {
  const kinds = ['wind', 'seismic', 'other'];
  it('goes round', () => {
    expect(steppedChoice(kinds, 'wind', 1)).toBe('seismic');
    expect(steppedChoice(kinds, 'wind', -1)).toBe('other');
  });
  it('completes what was begun', () => {
    expect(steppedChoice(kinds, 'se', 1)).toBe('seismic');
    expect(steppedChoice(kinds, 'q', 1)).toBe('wind');
  });
});
