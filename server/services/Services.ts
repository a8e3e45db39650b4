import type { PasswordHasher } from '../auth/PasswordHasher.ts';
import type { Computing } from '../compute/Computing.ts';

import { AcknowledgmentService } from './acknowledgments/AcknowledgmentService.ts';
import { BuildingService } from './buildings/BuildingService.ts';
import type { Context } from './Context.ts';
import { ResultService } from './results/ResultService.ts';
import { ScheduleService } from './schedule/ScheduleService.ts';
import { SessionService } from './session/SessionService.ts';
import { TableService } from './tables/TableService.ts';
import { UndoService } from './undo/UndoService.ts';
import { UploadService } from './uploads/UploadService.ts';

export interface Services {
  readonly health: { readonly readiness: Context['gate']['readiness'] };
  readonly session: SessionService;
  readonly buildings: BuildingService;
  readonly tables: TableService;
  readonly uploads: UploadService;
  readonly results: ResultService;
  readonly schedule: ScheduleService;
  readonly acknowledgments: AcknowledgmentService;
  readonly undo: UndoService;
}

export function createServices(
  context: Context,
  hasher: PasswordHasher,
  computing: Computing,
  engineBuild: string,
): Services {
  const results = new ResultService(context, computing, engineBuild);
  return {
    health: { readiness: () => context.gate.readiness() },
    session: new SessionService(context, hasher),
    buildings: new BuildingService(context),
    tables: new TableService(context),
    uploads: new UploadService(context),
    results,
    schedule: new ScheduleService(context, results),
    acknowledgments: new AcknowledgmentService(context, results),
    undo: new UndoService(context),
  };
}
