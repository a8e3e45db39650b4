import type { ConstantNode, MathNode, OperatorNode, ParenthesisNode, SymbolNode } from 'mathjs/number';

import { CombinationError } from './CombinationError.ts';
import type { CombinationConstants, LoadFactors, LoadSymbol } from './symbols.ts';
import { isConstantSymbol, isLoadSymbol, loadSymbols } from './symbols.ts';
import type { Token } from './tokenize.ts';

/** A sum of loads with factors, or a plain number, and the place in the text from which it was read. */
type Form = { readonly start: number; readonly end: number } & (
  | { readonly kind: 'number'; readonly value: number }
  | { readonly kind: 'loads'; readonly factors: ReadonlyMap<LoadSymbol, number> }
);

/**
 * Walks the tree of one alternative over a whitelist (numbers, known symbols, + - * /, signs, parentheses) and answers the
 * factor of every load. Refused with the place: a product of two loads, division by a load or by zero, a number without a
 * load. Leaves of the tree come in the order of the operands in the text, which gives every leaf its place.
 */
export function linearFactors(tree: MathNode, tokens: readonly Token[], constants: CombinationConstants): LoadFactors {
  const operands = tokens.filter((token) => token.kind === 'number' || token.kind === 'symbol');
  let nextOperand = 0;

  const leaf = (): { operand: Token; start: number; end: number } => {
    const operand = operands[nextOperand];
    if (operand === undefined) throw new CombinationError('the combination could not be read', 0, 0);
    nextOperand += 1;
    return { operand, start: operand.position, end: operand.position + operand.text.length };
  };

  const walk = (node: MathNode): Form => {
    if (node.type === 'ParenthesisNode') return walk((node as ParenthesisNode).content);
    if (node.type === 'ConstantNode') {
      const { start, end } = leaf();
      return { kind: 'number', value: Number((node as ConstantNode).value), start, end };
    }
    if (node.type === 'SymbolNode') {
      const { operand, start, end } = leaf();
      const name = (node as SymbolNode).name;
      if (name === operand.text && isLoadSymbol(name)) {
        return { kind: 'loads', factors: new Map([[name, 1]]), start, end };
      }
      if (name === operand.text && isConstantSymbol(name)) {
        return { kind: 'number', value: constants[name], start, end };
      }
    }
    if (node.type === 'OperatorNode') return operator(node as OperatorNode);
    throw new CombinationError('the combination could not be read, expected loads with factors', 0, 0);
  };

  const operator = (node: OperatorNode): Form => {
    const [first, second] = node.args as MathNode[];
    if (first === undefined) throw new CombinationError('the combination could not be read', 0, 0);
    const left = walk(first);
    if (second === undefined) return node.op === '-' ? scaled(left, -1) : left;
    const right = walk(second);
    if (node.op === '+') return added(left, right, 1);
    if (node.op === '-') return added(left, right, -1);
    if (node.op === '*') return multiplied(left, right);
    if (node.op === '/') return divided(left, right);
    throw refusal(right, `the operator "${node.op}" is not taken, expected + - * /`);
  };

  const form = walk(tree);
  if (form.kind === 'number') throw refusal(form, 'a combination needs at least one load, such as 1.4D');
  const factors = Object.fromEntries(loadSymbols.map((symbol) => [symbol, form.factors.get(symbol) ?? 0]));
  for (const value of form.factors.values()) {
    if (!Number.isFinite(value)) throw refusal(form, 'a factor is not a finite number');
  }
  return factors as Record<LoadSymbol, number>;
}

const refusal = (form: Form, message: string): CombinationError =>
  new CombinationError(message, form.start, form.end - form.start);

const span = (a: Form, b: Form): { start: number; end: number } => ({
  start: Math.min(a.start, b.start),
  end: Math.max(a.end, b.end),
});

function scaled(form: Form, by: number): Form {
  if (form.kind === 'number') return { ...form, value: form.value * by };
  return { ...form, factors: new Map([...form.factors].map(([symbol, factor]) => [symbol, factor * by])) };
}

function added(left: Form, right: Form, sign: 1 | -1): Form {
  if (left.kind === 'number' && right.kind === 'number') {
    return { kind: 'number', value: left.value + sign * right.value, ...span(left, right) };
  }
  if (left.kind === 'loads' && right.kind === 'loads') {
    const factors = new Map(left.factors);
    for (const [symbol, factor] of right.factors) factors.set(symbol, (factors.get(symbol) ?? 0) + sign * factor);
    return { kind: 'loads', factors, ...span(left, right) };
  }
  throw refusal(left.kind === 'number' ? left : right, 'a number without a load, expected a load such as 1.2D');
}

function multiplied(left: Form, right: Form): Form {
  if (left.kind === 'loads' && right.kind === 'loads') {
    throw refusal(right, 'a product of two loads, a combination is linear in its loads');
  }
  if (left.kind === 'number') return { ...scaled(right, left.value), ...span(left, right) };
  return right.kind === 'number' ? { ...scaled(left, right.value), ...span(left, right) } : left;
}

function divided(left: Form, right: Form): Form {
  if (right.kind === 'loads') throw refusal(right, 'division by a load, a combination is linear in its loads');
  if (right.value === 0) throw refusal(right, 'division by zero');
  if (left.kind === 'number') return { kind: 'number', value: left.value / right.value, ...span(left, right) };
  const factors = new Map([...left.factors].map(([symbol, factor]) => [symbol, factor / right.value]));
  return { kind: 'loads', factors, ...span(left, right) };
}
