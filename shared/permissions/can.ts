import type { Role } from '../contracts/session.ts';

import { matrix, type Action } from './matrix.ts';

/** Whether a role may do it on a building of its own office; the same answer on both sides. */
export function can(role: Role, action: Action): boolean {
  const line = matrix.find((one) => one.action === action);
  return line !== undefined && line.answers[role] < 400;
}
