import { CombinationError } from './CombinationError.ts';
import { symbolsLongestFirst } from './symbols.ts';

export type TokenKind = 'number' | 'symbol' | 'operator' | 'open' | 'close' | 'or';

export interface Token {
  readonly kind: TokenKind;
  /** as typed */
  readonly text: string;
  /** place in the text as typed, from 0 */
  readonly position: number;
}

const expectedSymbols = 'expected one of D L Lr S R W E H F T, SDS, rho, Omega0, or, a number, + - * / ( )';
const numberPattern = /(?:\d+\.?\d*|\.\d+)/y;

/**
 * Cuts a combination into tokens: numbers without exponent (`1E` is 1 times E), the longest known symbol at each place
 * (`rhoE` is rho E, `SDSD` is SDS D), `or`, four operators and parentheses. Anything else is refused with its place.
 */
export function tokenize(text: string): Token[] {
  const tokens: Token[] = [];
  let position = 0;
  while (position < text.length) {
    const space = /\s+/y;
    space.lastIndex = position;
    if (space.test(text)) {
      position = space.lastIndex;
      continue;
    }
    const token = nextToken(text, position);
    tokens.push(token);
    position += token.text.length;
  }
  return tokens;
}

function nextToken(text: string, position: number): Token {
  const character = text.charAt(position);
  if ('+-*/'.includes(character)) return { kind: 'operator', text: character, position };
  if (character === '(') return { kind: 'open', text: character, position };
  if (character === ')') return { kind: 'close', text: character, position };

  numberPattern.lastIndex = position;
  const digits = numberPattern.exec(text)?.[0];
  if (digits !== undefined) {
    refuseBadNumber(text, position, digits);
    return { kind: 'number', text: digits, position };
  }

  if (text.startsWith('or', position)) return { kind: 'or', text: 'or', position };
  const symbol = symbolsLongestFirst.find((candidate) => text.startsWith(candidate, position));
  if (symbol !== undefined) return { kind: 'symbol', text: symbol, position };
  throw unknownAt(text, position);
}

function refuseBadNumber(text: string, position: number, digits: string): void {
  const after = text.slice(position + digits.length, position + digits.length + 2);
  const whole = /^[\d.,]+/.exec(text.slice(position))?.[0] ?? digits;
  if (after.startsWith('.')) {
    throw new CombinationError(
      `read "${whole}", expected a number with one decimal point, such as 1.2`,
      position,
      whole.length,
    );
  }
  if (/^,\d/.test(after)) {
    throw new CombinationError(
      `read "${whole}" with a comma, expected a decimal point, such as 1.2`,
      position,
      whole.length,
    );
  }
  if (!Number.isFinite(Number(digits))) {
    throw new CombinationError('the number is too large, expected a load factor such as 1.2', position, digits.length);
  }
}

function unknownAt(text: string, position: number): CombinationError {
  const word =
    /^[\p{L}\p{N}_]+/u.exec(text.slice(position))?.[0] ?? String.fromCodePoint(text.codePointAt(position) ?? 0);
  const sameLetters = [...symbolsLongestFirst, 'or'].find((known) => known.toLowerCase() === word.toLowerCase());
  const remedy =
    sameLetters !== undefined
      ? `symbols are case-sensitive, expected ${sameLetters}`
      : word === '\u2212' || word === '\u2013'
        ? 'write the minus sign as -'
        : word === '\u00d7' || word === '\u00b7'
          ? 'write the product as *'
          : word === '^'
            ? 'exponents are not taken, a combination is linear in its loads'
            : expectedSymbols;
  return new CombinationError(`read "${word}", ${remedy}`, position, word.length);
}
