import { parseCombination } from './parseCombination.ts';

/** Constants only decide numbers, never whether a text can be read. */
const anyConstants = { SDS: 0.2, rho: 1, Omega0: 2 };

/** What is wrong with the text of a combination, with its place; null where it can be read. */
export function checkExpression(text: string): string | null {
  const reading = parseCombination(text, anyConstants);
  return reading.ok ? null : placedMessage(reading.message, reading.position, text);
}

/** The sentence shown for a combination that can't be read: the fault and where it stands. */
export function placedMessage(message: string, position: number, text: string): string {
  return `${message} (at character ${position + 1} of “${text}”)`;
}
