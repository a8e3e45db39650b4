import type { AcknowledgmentBody, AcknowledgmentList, AcknowledgmentRow } from '#shared/contracts/acknowledgments';
import type { Warning } from '#shared/engineering/input';
import { factsHash, warningsNamed } from '#shared/result/warningFacts';

import { recordChange } from '../../change-log/recordChange.ts';
import type { AcknowledgmentRecord } from '../../db/repositories/AcknowledgmentRepository.ts';
import type { BuildingRecord } from '../../db/repositories/BuildingRepository.ts';
import type { Caller } from '../../db/repositories/PersonRepository.ts';
import { HttpError } from '../../http/HttpError.ts';
import type { Context } from '../Context.ts';
import type { ResultService } from '../results/ResultService.ts';

import { stateOf } from './stateOf.ts';

export class AcknowledgmentService {
  constructor(
    private readonly context: Context,
    private readonly results: ResultService,
  ) {}

  async list(building: BuildingRecord): Promise<AcknowledgmentList> {
    const { records, seq } = await this.context.gate.read(async (store) => ({
      records: await store.acknowledgments.rows(building.id),
      seq: (await store.buildings.get(building.id)).seq,
    }));
    if (records.length === 0) return { rows: [], seq };
    const warnings = await this.warnings(building.id);
    return { rows: records.map((record) => resource(record, warnings)), seq };
  }

  /** What the last computation says of the building as it is stored; null where it does not compute. */
  private async warnings(id: string): Promise<readonly Warning[] | null> {
    try {
      return (await this.results.result(id)).computed.warnings;
    } catch (error) {
      if (error instanceof HttpError && error.code === 'does-not-compute') return null;
      throw error;
    }
  }

  /** Settles warnings that stand, on the facts they stand on; one that had lapsed gives way. */
  async add(caller: Caller, building: BuildingRecord, body: AcknowledgmentBody): Promise<AcknowledgmentRow> {
    const loaded = await this.results.load(building.id);
    const { warnings } = await this.results.compute(loaded);
    const name = { code: body.code, level: body.level ?? null, wall: body.wall ?? null };
    const named = warningsNamed(warnings, name);
    if (named.length === 0) {
      throw new HttpError(409, 'no-such-warning', `No warning stands as ${sayName(name)}.`, {
        current: warnings.filter(({ code }) => code === name.code).slice(0, 50),
      });
    }
    if (named.every(({ settled }) => settled === true)) {
      throw new HttpError(409, 'already-settled', `The warning ${sayName(name)} has been settled already.`);
    }
    const facts = factsHash(loaded.input, named);
    const id = this.context.newId();
    const state = { ...name, reason: body.reason, factsHash: facts, byId: caller.id, at: this.context.now() };
    await this.context.gate.write(async (store) => {
      const seq = await store.buildings.nextSeq(building.id, true);
      if ((await store.buildings.get(building.id)).inputsSeq !== loaded.inputsSeq + 1) {
        throw new HttpError(409, 'version', 'The building has been changed since the warning was read.');
      }
      const lapsed = (await store.acknowledgments.rows(building.id)).filter(
        (one) => one.code === name.code && one.level === name.level && one.wall === name.wall,
      );
      for (const one of lapsed) await store.acknowledgments.remove(building.id, one.id);
      await store.acknowledgments.add(building.id, id, state);
      const before = Object.fromEntries(lapsed.map((one) => [one.id, stateOf(one)]));
      await recordChange(store, this.context, {
        buildingId: building.id,
        personId: caller.id,
        seq,
        kind: 'acknowledge',
        delta: {
          before: { acknowledgments: { ...before, [id]: null } },
          after: { acknowledgments: { ...Object.fromEntries(lapsed.map((one) => [one.id, null])), [id]: state } },
        },
      });
    });
    return resource(
      { id, ...state, byName: caller.name },
      [...named].map((one) => ({ ...one, settled: true })),
    );
  }
}

const sayName = ({ code, level, wall }: { code: string; level: string | null; wall: string | null }): string =>
  [code, ...(level === null ? [] : [`at level ${level}`]), ...(wall === null ? [] : [`of wall ${wall}`])].join(' ');

function resource(record: AcknowledgmentRecord, warnings: readonly Warning[] | null): AcknowledgmentRow {
  const { id, code, level, wall, reason, at, byId, byName } = record;
  const stands = warnings === null ? null : warningsNamed(warnings, record).some(({ settled }) => settled === true);
  return { id, code, level, wall, reason, factsHash: record.factsHash, by: { id: byId, name: byName }, at, stands };
}
