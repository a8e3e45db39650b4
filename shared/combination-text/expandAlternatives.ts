import { CombinationError } from './CombinationError.ts';
import type { Token } from './tokenize.ts';

const mostAlternatives = 256;

/**
 * Writes out the `or` groups: every way of taking one choice of each group, as plain token lists. Choices keep their
 * written order and the first group varies slowest. `or` binds weaker than every operator, in parentheses and outside.
 */
export function expandAlternatives(tokens: readonly Token[]): Token[][] {
  const { lists } = readChoices(tokens, 0);
  return lists;
}

interface Reading {
  readonly lists: Token[][];
  readonly next: number;
}

function readChoices(tokens: readonly Token[], start: number): Reading {
  const lists: Token[][] = [];
  let next = start;
  for (;;) {
    const choice = readChoice(tokens, next);
    lists.push(...choice.lists);
    next = choice.next;
    const token = tokens[next];
    if (token?.kind !== 'or') return { lists, next };
    if (lists.length > mostAlternatives) throw tooMany(token);
    next += 1;
  }
}

function readChoice(tokens: readonly Token[], start: number): Reading {
  let lists: Token[][] = [[]];
  let next = start;
  for (;;) {
    const token = tokens[next];
    if (token === undefined || token.kind === 'or' || token.kind === 'close') return { lists, next };
    if (token.kind === 'open') {
      const inner = readChoices(tokens, next + 1);
      const close = tokens[inner.next];
      if (lists.length * inner.lists.length > mostAlternatives) throw tooMany(token);
      lists = lists.flatMap((list) =>
        inner.lists.map((choice) => [...list, token, ...choice, ...(close === undefined ? [] : [close])]),
      );
      next = inner.next + 1;
    } else {
      for (const list of lists) list.push(token);
      next += 1;
    }
  }
}

function tooMany(token: Token): CombinationError {
  return new CombinationError(
    `more than ${String(mostAlternatives)} alternatives, write them as several combinations`,
    token.position,
    token.text.length,
  );
}
