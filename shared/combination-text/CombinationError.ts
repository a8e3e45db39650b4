/** Why a combination is refused, with the place in the text as typed. Caught at the entry; never leaves this folder. */
export class CombinationError extends Error {
  readonly position: number;
  readonly length: number;

  constructor(message: string, position: number, length: number) {
    super(message);
    this.name = 'CombinationError';
    this.position = position;
    this.length = length;
  }
}
