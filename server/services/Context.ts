import type { Gate } from '../db/gate.ts';

/** What every service is given: the gate, a clock and an id maker. */
export interface Context {
  readonly gate: Gate;
  /** ISO text in UTC */
  readonly now: () => string;
  readonly newId: () => string;
}
