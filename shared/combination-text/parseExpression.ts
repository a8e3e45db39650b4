import { create, parseDependencies } from 'mathjs/number';
import type { FactoryFunctionMap, MathNode } from 'mathjs/number';

import { impliesProduct } from './checkSyntax.ts';
import { CombinationError } from './CombinationError.ts';
import type { Token } from './tokenize.ts';

const math = create(parseDependencies as FactoryFunctionMap);

/** The tokens as an expression in which every product is written: `1.2D+1E` becomes `1.2 * D + 1 * E`. */
export function writeProducts(tokens: readonly Token[]): string {
  const parts: string[] = [];
  let previous: Token | null = null;
  for (const token of tokens) {
    if (previous !== null && impliesProduct(previous, token)) parts.push('*');
    parts.push(token.kind === 'number' ? String(Number(token.text)) : token.text);
    previous = token;
  }
  return parts.join(' ');
}

/** The syntax tree of one alternative. mathjs sees only the rewritten text, in which no number can take up an E. */
export function parseExpression(tokens: readonly Token[]): MathNode {
  try {
    return math.parse(writeProducts(tokens));
  } catch {
    const first = tokens[0];
    const last = tokens[tokens.length - 1];
    const start = first?.position ?? 0;
    const end = last === undefined ? start : last.position + last.text.length;
    throw new CombinationError('the combination could not be read, expected loads with factors', start, end - start);
  }
}
