import type { ApiRouter } from '../../http/ApiRouter.ts';
import { answeredByTag } from '../../http/entityTags.ts';
import type { Services } from '../../services/Services.ts';

const workbookType = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';

/** A file name of plain letters from the building's own name. */
const fileName = (name: string): string =>
  `${
    name
      .replace(/[^A-Za-z0-9]+/g, '-')
      .replace(/^-+|-+$/g, '')
      .slice(0, 60) || 'building'
  }-wall-schedule.xlsx`;

export function scheduleRoutes(api: ApiRouter, { schedule }: Services): void {
  api.building('GET', '/api/buildings/:id/schedule', async ({ request, response, building }) => {
    const { tag, resource } = await schedule.get(building);
    if (!answeredByTag(request, response, tag)) response.json(resource);
  });
  api.building('PATCH', '/api/buildings/:id/schedule/:rowId', async ({ request, response, signedIn, building }) => {
    const rowId = String(request.params.rowId);
    response.json(await schedule.edit(signedIn.caller, building, rowId, request.body));
  });
  api.building('GET', '/api/buildings/:id/schedule.xlsx', async ({ request, response, building }) => {
    const { tag, file } = await schedule.workbook(building);
    if (answeredByTag(request, response, tag)) return;
    const body = Buffer.from(await file());
    response.type(workbookType).attachment(fileName(building.settings.name));
    response.end(body);
  });
}
