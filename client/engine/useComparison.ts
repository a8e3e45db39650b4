import { useEffect, useState } from 'react';

import type { ResultDocument } from '#shared/contracts/result';

import { useAcknowledgments, useSchedule } from '../data/queries.ts';
import { differingParts, type ComparedPart } from './comparedParts.ts';
import { engine } from './engine.ts';
import { pinnedBands } from './pinnedBands.ts';
import { useBuildingInput } from './useBuildingInput.ts';

export type Comparison =
  | { readonly kind: 'waiting' }
  | { readonly kind: 'equal' }
  | { readonly kind: 'different'; readonly parts: readonly ComparedPart[] }
  | { readonly kind: 'none'; readonly reason: string };

const waiting: Comparison = { kind: 'waiting' };

/** Runs the chain in the page's worker and compares it with what the server answered, bit for bit. */
export function useComparison(id: string, there: ResultDocument | undefined): Comparison {
  const input = useBuildingInput(id);
  const rows = useSchedule(id).data?.rows;
  const acknowledged = useAcknowledgments(id).data?.rows;
  const [said, setSaid] = useState<{ for: ResultDocument; comparison: Comparison } | null>(null);
  useEffect(() => {
    if (!input || !rows || !acknowledged || !there) return undefined;
    let current = true;
    const say = (comparison: Comparison): void => {
      if (current) setSaid({ for: there, comparison });
    };
    const client = engine('comparison');
    if (!client) {
      say({ kind: 'none', reason: 'this browser runs no workers' });
      return undefined;
    }
    void client.run(input, { pinned: pinnedBands(rows), acknowledged }).then((outcome) => {
      if (outcome.kind === 'failed') say({ kind: 'none', reason: outcome.message });
      if (outcome.kind === 'refused') say({ kind: 'none', reason: outcome.problems[0]?.message ?? 'refused' });
      if (outcome.kind !== 'computed') return;
      const parts = differingParts(outcome.document, there);
      say(parts.length === 0 ? { kind: 'equal' } : { kind: 'different', parts });
    });
    return () => {
      current = false;
    };
  }, [input, rows, acknowledged, there]);
  return said !== null && said.for === there ? said.comparison : waiting;
}
