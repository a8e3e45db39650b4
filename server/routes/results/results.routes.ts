import { gunzipSync } from 'node:zlib';

import type { ApiRouter } from '../../http/ApiRouter.ts';
import { answeredByTag } from '../../http/entityTags.ts';
import type { Services } from '../../services/Services.ts';

export function resultsRoutes(api: ApiRouter, { results }: Services): void {
  api.building('GET', '/api/buildings/:id/results', async ({ request, response, building }) => {
    const known = results.knownKey(building);
    if (known !== null && request.get('If-None-Match')?.includes(`"${known}"`) === true) {
      answeredByTag(request, response, known);
      return;
    }
    const { key, computed } = await results.result(building.id);
    if (answeredByTag(request, response, key)) return;
    response.type('application/json').vary('Accept-Encoding');
    if (request.acceptsEncodings('gzip') === 'gzip') {
      response.setHeader('Content-Encoding', 'gzip');
      response.end(Buffer.from(computed.result));
      return;
    }
    response.end(gunzipSync(computed.result));
  });
}
