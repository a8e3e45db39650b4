import { expect, it } from 'vitest';

import type { EngineAnswer, EngineOutcome, EngineRequest } from './engineMessages.ts';
import { engineQueue } from './engineQueue.ts';
import { sampleInput } from './testing/sampleBuilding.ts';

const request = (id: number): EngineRequest => ({ id, input: sampleInput, options: { pinned: [] } });
const failed: EngineOutcome = { kind: 'failed', message: 'stand-in' };

function make() {
  const answers: EngineAnswer[] = [];
  const computed: number[] = [];
  const works: (() => void)[] = [];
  const queue = engineQueue(
    ({ id }) => {
      computed.push(id);
      return failed;
    },
    (answer) => answers.push(answer),
    (work) => works.push(work),
  );
  return { answers, computed, works, queue };
}

it('computes the newest of the questions that came together and says that the others are superseded', () => {
  const { answers, computed, works, queue } = make();
  [1, 2, 3].forEach((id) => queue.take(request(id)));
  works.forEach((work) => work());
  expect(computed).toEqual([3]);
  expect(answers.map(({ id, outcome }) => [id, outcome.kind])).toEqual([
    [1, 'superseded'],
    [2, 'superseded'],
    [3, 'failed'],
  ]);
});

it('computes questions that come one after the other', () => {
  const { computed, works, queue } = make();
  queue.take(request(1));
  works.shift()?.();
  queue.take(request(2));
  works.shift()?.();
  expect(computed).toEqual([1, 2]);
});
