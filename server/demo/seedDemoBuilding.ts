import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

import type { Logger } from 'pino';

import { readFolder } from '#shared/csv/readFolder';

import type { BuildingService } from '../services/buildings/BuildingService.ts';
import type { Context } from '../services/Context.ts';

/** The invented demo building from its folder of CSVs; one line in the log where the folder is not there or has problems. */
export async function seedDemoBuilding(
  context: Context,
  buildings: BuildingService,
  engineerId: string,
  folder: string,
  logger: Logger,
): Promise<void> {
  if (!existsSync(join(folder, 'building.json'))) {
    logger.warn('no demo building: its folder is absent');
    return;
  }
  const files = new Map(readdirSync(folder).map((name) => [name, new Uint8Array(readFileSync(join(folder, name)))]));
  const reading = readFolder(files);
  if (!reading.ok) {
    logger.warn({ problems: reading.problems.slice(0, 5) }, 'no demo building: its folder has problems');
    return;
  }
  const engineer = await context.gate.read((store) => store.people.caller(engineerId));
  if (engineer === null) return;
  await buildings.add(engineer, context.newId(), reading.input.settings, reading.input.tables);
}
