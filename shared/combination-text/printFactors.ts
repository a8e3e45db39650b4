import type { LoadFactors, LoadSymbol } from './symbols.ts';

/** A factor with at least one decimal and at most four: 1 prints 1.0, 0.15 prints 0.15. */
export function printFactor(factor: number): string {
  const rounded = Math.abs(factor).toFixed(4).replace(/0+$/, '');
  return rounded.endsWith('.') ? `${rounded}0` : rounded;
}

/** One alternative with its numbers written out, loads in the order given; a load whose factor is 0 is left out. */
export function printFactors(factors: LoadFactors, order: readonly LoadSymbol[]): string {
  const acting = order.filter((symbol) => factors[symbol] !== 0);
  const shown = acting.length > 0 ? acting : order.slice(0, 1);
  return shown
    .map((symbol, index) => {
      const term = `${printFactor(factors[symbol])}${symbol}`;
      if (factors[symbol] < 0) return index === 0 ? `-${term}` : `- ${term}`;
      return index === 0 ? term : `+ ${term}`;
    })
    .join(' ');
}
