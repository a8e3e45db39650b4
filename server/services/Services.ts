import type { PasswordHasher } from '../auth/PasswordHasher.ts';

import { BuildingService } from './buildings/BuildingService.ts';
import type { Context } from './Context.ts';
import { SessionService } from './session/SessionService.ts';
import { TableService } from './tables/TableService.ts';

export interface Services {
  readonly health: { readonly readiness: Context['gate']['readiness'] };
  readonly session: SessionService;
  readonly buildings: BuildingService;
  readonly tables: TableService;
}

export function createServices(context: Context, hasher: PasswordHasher): Services {
  return {
    health: { readiness: () => context.gate.readiness() },
    session: new SessionService(context, hasher),
    buildings: new BuildingService(context),
    tables: new TableService(context),
  };
}
