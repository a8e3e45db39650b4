import { CombinationError } from './CombinationError.ts';
import type { Token } from './tokenize.ts';

const deepestNesting = 40;

const startsOperand = (token: Token): boolean =>
  token.kind === 'number' || token.kind === 'symbol' || token.kind === 'open';
const endsOperand = (token: Token): boolean =>
  token.kind === 'number' || token.kind === 'symbol' || token.kind === 'close';
const isSign = (token: Token): boolean => token.kind === 'operator' && (token.text === '+' || token.text === '-');

/** A product is implied between these two, as in `1.2D`, `rho E`, `0.5(L)`. */
export const impliesProduct = (left: Token, right: Token): boolean => endsOperand(left) && startsOperand(right);

/**
 * Refuses, with the place, what no reader could take for a combination: unbalanced parentheses, operators without an
 * operand, and a number after a symbol or a number (`1.2D 1.6L` lacks its plus; as a product it would only confuse).
 */
export function checkSyntax(tokens: readonly Token[]): void {
  const open: Token[] = [];
  let previous: Token | null = null;
  for (const token of tokens) {
    if (token.kind === 'open') {
      open.push(token);
      if (open.length > deepestNesting) throw at(token, `more than ${String(deepestNesting)} parentheses are open`);
    }
    checkPair(previous, token);
    if (token.kind === 'close' && open.pop() === undefined) {
      throw at(token, 'this parenthesis closes nothing, remove it or open one before');
    }
    previous = token;
  }
  if (previous !== null && !endsOperand(previous)) {
    throw at(previous, `the text ends after "${previous.text}", expected a load or a number`);
  }
  const unclosed = open.pop();
  if (unclosed !== undefined) throw at(unclosed, 'this parenthesis is not closed, expected ")"');
}

function checkPair(previous: Token | null, token: Token): void {
  const wantsOperand = previous === null || !endsOperand(previous);
  if (wantsOperand) {
    if (startsOperand(token) || isSign(token)) return;
    const before = previous === null ? 'at the start' : `after "${previous.text}"`;
    throw at(token, `read "${token.text}" ${before}, expected a load or a number`);
  }
  if (token.kind === 'number') {
    throw at(token, `read "${token.text}" after "${previous.text}", expected + - * or / between them`);
  }
}

function at(token: Token, message: string): CombinationError {
  return new CombinationError(message, token.position, token.text.length);
}
