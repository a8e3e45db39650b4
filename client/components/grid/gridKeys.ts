/** What a key means, told apart from what is then done. */
export interface KeyPress {
  readonly key: string;
  readonly ctrl: boolean;
  readonly shift: boolean;
  readonly alt: boolean;
}

export type GridIntent =
  | { readonly kind: 'move'; readonly rows: number; readonly columns: number; readonly extend: boolean }
  | { readonly kind: 'row-edge'; readonly end: boolean; readonly extend: boolean }
  | { readonly kind: 'grid-edge'; readonly end: boolean; readonly extend: boolean }
  | { readonly kind: 'edit' }
  | { readonly kind: 'type'; readonly text: string }
  | { readonly kind: 'clear' }
  | { readonly kind: 'undo' }
  | { readonly kind: 'fill-down' }
  | { readonly kind: 'choose-all' }
  | { readonly kind: 'collapse' }
  | { readonly kind: 'commit'; readonly rows: number; readonly columns: number }
  | { readonly kind: 'leave' }
  | { readonly kind: 'step-choice'; readonly by: number };

/** Rows that PageUp and PageDown pass. */
export const pageRows = 10;

const arrows: Readonly<Record<string, readonly [number, number]>> = {
  ArrowUp: [-1, 0],
  ArrowDown: [1, 0],
  ArrowLeft: [0, -1],
  ArrowRight: [0, 1],
  PageUp: [-pageRows, 0],
  PageDown: [pageRows, 0],
};

/** A key in a cell that is not being edited; null: not ours, the browser or the page has it. */
export function keyOnCell({ key, ctrl, shift, alt }: KeyPress): GridIntent | null {
  if (alt) return null;
  const arrow = arrows[key];
  if (arrow !== undefined) {
    return ctrl ? null : { kind: 'move', rows: arrow[0], columns: arrow[1], extend: shift };
  }
  if (key === 'Home' || key === 'End') {
    return { kind: ctrl ? 'grid-edge' : 'row-edge', end: key === 'End', extend: shift };
  }
  if (ctrl) {
    const letter = key.toLowerCase();
    if (letter === 'z' && !shift) return { kind: 'undo' };
    if (letter === 'd' && !shift) return { kind: 'fill-down' };
    if (letter === 'a' && !shift) return { kind: 'choose-all' };
    return null;
  }
  if (key === 'Enter' || key === 'F2') return { kind: 'edit' };
  if (key === 'Delete' || key === 'Backspace') return { kind: 'clear' };
  if (key === 'Escape') return { kind: 'collapse' };
  return key.length === 1 && key !== ' ' ? { kind: 'type', text: key } : null;
}

/** A key while a cell is edited; null: it belongs to the text field. */
export function keyInEditor({ key, ctrl, shift, alt }: KeyPress, hasChoices: boolean): GridIntent | null {
  if (ctrl || alt) return null;
  if (key === 'Enter') return { kind: 'commit', rows: shift ? -1 : 1, columns: 0 };
  if (key === 'Tab') return { kind: 'commit', rows: 0, columns: shift ? -1 : 1 };
  if (key === 'Escape') return { kind: 'leave' };
  if (hasChoices && key === 'ArrowDown') return { kind: 'step-choice', by: 1 };
  if (hasChoices && key === 'ArrowUp') return { kind: 'step-choice', by: -1 };
  return null;
}

/** The choice after or before the one that the draft begins; the first where it begins none. */
export function steppedChoice(choices: readonly string[], draft: string, by: number): string {
  const at = choices.indexOf(draft);
  if (at < 0) return choices.find((choice) => choice.startsWith(draft.toLowerCase())) ?? choices[0] ?? draft;
  return choices[(at + by + choices.length) % choices.length] ?? draft;
}
