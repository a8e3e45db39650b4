import type { ApiRouter } from '../../http/ApiRouter.ts';
import { buildingResource } from '../../services/buildings/BuildingService.ts';
import type { Services } from '../../services/Services.ts';

export function buildingsRoutes(api: ApiRouter, { buildings }: Services): void {
  api.person('GET', '/api/buildings', async ({ response, signedIn }) => {
    response.json({ rows: await buildings.list(signedIn.caller) });
  });
  api.person('POST', '/api/buildings', async ({ request, response, signedIn }) => {
    const created = await buildings.create(signedIn.caller, request.body);
    response.status(201).location(`/api/buildings/${created.id}`).json(created);
  });
  api.building('GET', '/api/buildings/:id', async ({ response, building }) => {
    response.json(buildingResource(building));
  });
  api.building('PATCH', '/api/buildings/:id', async ({ request, response, signedIn, building }) => {
    response.json(await buildings.edit(signedIn.caller, building, request.body));
  });
  api.building('DELETE', '/api/buildings/:id', async ({ response, signedIn, building }) => {
    await buildings.hide(signedIn.caller, building);
    response.status(204).end();
  });
}
