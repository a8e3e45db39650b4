import type { BuildingInput } from '#shared/engineering/input';
import type { PinnedBand } from '#shared/engineering/wall-design/designTypes';
import type { Acknowledged } from '#shared/result/warningFacts';

import { Lru } from './Lru.ts';
import type { ResultFiles } from './ResultFiles.ts';
import type { RunAnswer, Runner, RunTask } from './Runner.ts';

const megabyte = 1024 * 1024;

/** One computation a key at a time; what was computed stays in memory and, as long as nobody deletes it, in files. */
export class Computing {
  /** engine runs since the start, for figures and tests */
  runs = 0;
  private readonly memory = new Lru<RunAnswer>(64 * megabyte);
  private readonly flights = new Map<string, Promise<RunAnswer>>();

  constructor(
    readonly runner: Runner,
    private readonly files: ResultFiles | null,
  ) {}

  compute(
    key: string,
    input: BuildingInput,
    pinned: readonly PinnedBand[],
    acknowledged: readonly Acknowledged[] = [],
  ): Promise<RunAnswer> {
    const kept = this.memory.get(key);
    if (kept !== undefined) return Promise.resolve(kept);
    const flying = this.flights.get(key);
    if (flying !== undefined) return flying;
    const flight = this.fetch(key, { kind: 'run', input, pinned, acknowledged }).finally(() =>
      this.flights.delete(key),
    );
    this.flights.set(key, flight);
    return flight;
  }

  private async fetch(key: string, task: RunTask): Promise<RunAnswer> {
    const stored = (await this.files?.read(key)) ?? null;
    if (stored === null) this.runs += 1;
    const answer = stored ?? (await this.runner.run(task));
    // the schedule beside the document is a small part of it
    this.memory.set(key, answer, answer.ok ? answer.result.byteLength * 2 : 10_000);
    if (stored === null && answer.ok) await this.files?.write(key, answer);
    return answer;
  }
}
