import type { ApiRouter } from '../../http/ApiRouter.ts';
import type { Services } from '../../services/Services.ts';

export function undoRoutes(api: ApiRouter, { undo }: Services): void {
  api.building('POST', '/api/buildings/:id/undo', async ({ response, signedIn, building }) => {
    response.json(await undo.undo(signedIn.caller, building));
  });
}
