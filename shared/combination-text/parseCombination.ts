import { checkSyntax } from './checkSyntax.ts';
import { CombinationError } from './CombinationError.ts';
import { expandAlternatives } from './expandAlternatives.ts';
import { linearFactors } from './linearFactors.ts';
import { parseExpression } from './parseExpression.ts';
import { printFactors } from './printFactors.ts';
import type { CombinationConstants, LoadFactors, LoadSymbol } from './symbols.ts';
import { isLoadSymbol } from './symbols.ts';
import type { Token } from './tokenize.ts';
import { tokenize } from './tokenize.ts';

export interface CombinationAlternative {
  /** numbers written out, constants evaluated: `1.2D + 1.0W + 1.0L + 0.5S` */
  readonly text: string;
  readonly factors: LoadFactors;
}

export type CombinationReading =
  | { readonly ok: true; readonly alternatives: readonly CombinationAlternative[] }
  | {
      readonly ok: false;
      /** place in the text as typed, from 0 */
      readonly position: number;
      readonly length: number;
      readonly message: string;
    };

const longestText = 1_000;
const cacheLimit = 2_000;
const cache = new Map<string, CombinationReading>();

/**
 * Reads one combination of loads, for example `1.2D + 1.0W + L + 0.5(Lr or S or R)`: the factor of every load in every
 * alternative. Numbers have no exponent, symbols are case-sensitive, products may be implied, `1/2D` reads from left to
 * right as (1/2)D. W and E in one alternative are refused, as is anything that is not linear in the loads.
 * Never throws: what is not understood is answered with its place. Cached by text and constants.
 */
export function parseCombination(text: string, constants: CombinationConstants): CombinationReading {
  const key = `${String(constants.SDS)} ${String(constants.rho)} ${String(constants.Omega0)} ${text}`;
  const known = cache.get(key);
  if (known !== undefined) return known;
  const reading = read(text, constants);
  if (cache.size >= cacheLimit) cache.clear();
  cache.set(key, reading);
  return reading;
}

function read(text: string, constants: CombinationConstants): CombinationReading {
  try {
    if (text.length > longestText) {
      throw new CombinationError(
        `the text has ${String(text.length)} characters, expected at most ${String(longestText)}`,
        longestText,
        text.length - longestText,
      );
    }
    const tokens = tokenize(text);
    if (tokens.length === 0) throw new CombinationError('the text is empty, expected a combination such as 1.4D', 0, 0);
    checkSyntax(tokens);
    return { ok: true, alternatives: expandAlternatives(tokens).map((list) => readAlternative(list, constants)) };
  } catch (error) {
    if (!(error instanceof CombinationError)) throw error;
    return { ok: false, position: error.position, length: error.length, message: error.message };
  }
}

function readAlternative(tokens: readonly Token[], constants: CombinationConstants): CombinationAlternative {
  const factors = linearFactors(parseExpression(tokens), tokens, constants);
  const loads = tokens.filter((token) => token.kind === 'symbol' && isLoadSymbol(token.text));
  const wind = loads.find((token) => token.text === 'W');
  const seismic = loads.find((token) => token.text === 'E');
  if (wind !== undefined && seismic !== undefined) {
    const later = wind.position > seismic.position ? wind : seismic;
    throw new CombinationError(
      'W and E act together in one alternative, expected one of them (ASCE 7 2.3)',
      later.position,
      later.text.length,
    );
  }
  const order = [...new Set(loads.map((token) => token.text))].filter((name): name is LoadSymbol => isLoadSymbol(name));
  return { text: printFactors(factors, order), factors };
}
