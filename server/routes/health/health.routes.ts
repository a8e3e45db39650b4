import type { ApiRouter } from '../../http/ApiRouter.ts';
import type { Services } from '../../services/Services.ts';

export function healthRoutes(api: ApiRouter, { health }: Services): void {
  api.open('GET', '/api/health', async ({ response }) => {
    response.json({ ok: true });
  });
  api.open('GET', '/api/ready', async ({ response }) => {
    const ready = await health.readiness();
    response.status(ready.ok ? 200 : 503).json(ready);
  });
}
