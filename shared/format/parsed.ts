/** Answer of every parser here: the value, or what was expected in words that follow "expected". */
export type Parsed<T> = { readonly ok: true; readonly value: T } | { readonly ok: false; readonly expected: string };

export const refuse = (expected: string): { readonly ok: false; readonly expected: string } => ({
  ok: false,
  expected,
});
