import { acknowledgmentSchema } from '#shared/contracts/acknowledgments';

import type { ApiRouter } from '../../http/ApiRouter.ts';
import { validate } from '../../http/validate.ts';
import type { Services } from '../../services/Services.ts';

export function acknowledgmentsRoutes(api: ApiRouter, { acknowledgments }: Services): void {
  const path = '/api/buildings/:id/acknowledgments';
  api.building('GET', path, async ({ response, building }) => {
    response.json(await acknowledgments.list(building));
  });
  api.building('POST', path, async ({ request, response, signedIn, building }) => {
    const body = validate(acknowledgmentSchema, request.body);
    response.status(201).json(await acknowledgments.add(signedIn.caller, building, body));
  });
}
