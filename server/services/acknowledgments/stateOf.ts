import type { AcknowledgmentRecord, AcknowledgmentState } from '../../db/repositories/AcknowledgmentRepository.ts';

/** What the change log keeps of an acknowledgment: enough to bring it back. */
export function stateOf({ code, level, wall, reason, factsHash, byId, at }: AcknowledgmentRecord): AcknowledgmentState {
  return { code, level, wall, reason, factsHash, byId, at };
}
