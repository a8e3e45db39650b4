import { editableTables } from '#shared/contracts/tableColumns';
import { tablePatchSchema, tablePutSchema } from '#shared/contracts/tables';

import type { ApiRouter } from '../../http/ApiRouter.ts';
import { answeredByTag, ifMatchVersion } from '../../http/entityTags.ts';
import { validate } from '../../http/validate.ts';
import type { Services } from '../../services/Services.ts';

export function tablesRoutes(api: ApiRouter, { tables }: Services): void {
  for (const table of editableTables) {
    const path = `/api/buildings/:id/${table}` as const;
    api.building('GET', path, async ({ request, response, building }) => {
      const found = await tables.get(building, table);
      if (!answeredByTag(request, response, String(found.version))) response.json(found);
    });
    api.building('PUT', path, async ({ request, response, signedIn, building }) => {
      const version = ifMatchVersion(request);
      const { rows } = validate(tablePutSchema, request.body);
      response.json(await tables.put(signedIn.caller, building, table, version, rows));
    });
    api.building('PATCH', path, async ({ request, response, signedIn, building }) => {
      const patch = validate(tablePatchSchema, request.body);
      response.json(await tables.edit(signedIn.caller, building, table, patch));
    });
  }
}
