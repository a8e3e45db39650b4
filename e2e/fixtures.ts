import { test as base, expect } from '@playwright/test';
import type { APIRequestContext, Page } from '@playwright/test';

export type Account = 'engineer' | 'checker' | 'admin' | 'drafter';
export const password = 'groundward-demo';
export const changing = { 'X-Requested-With': 'groundward' };

/** Every test fails on a console error, an uncaught exception, a policy violation or a request that leaves the house. */
export const test = base.extend<{ watched: null; expected: { errors: readonly RegExp[] } }>({
  expected: [{ errors: [] }, { option: true }],
  watched: [
    async ({ page, baseURL, expected }, use) => {
      const seen: string[] = [];
      page.on('console', (message) => {
        if (message.type() === 'error') seen.push(`${message.text()} ${message.location().url}`);
      });
      page.on('pageerror', (error) => seen.push(error.message));
      page.on('request', (request) => {
        const url = request.url();
        if (!url.startsWith(baseURL ?? '') && !url.startsWith('data:') && !url.startsWith('blob:'))
          seen.push(`request to ${url}`);
      });
      await use(null);
      expect(seen.filter((text) => !expected.errors.some((pattern) => pattern.test(text)))).toEqual([]);
    },
    { auto: true },
  ],
});

/** Before signing in the page asks who is there and is told 401: the one error a console may show. */
export const signedOutQuestion = /status of 401.*\/api\/session/;

export async function signIn(page: Page, account: Account): Promise<void> {
  await page.goto('/');
  await page.getByLabel('Email').fill(`${account}@demo.example`);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('heading', { name: 'Buildings' })).toBeVisible();
}

/** Signs in by the API alone; the cookie is the page's too. */
export async function signInByApi(request: APIRequestContext, account: Account): Promise<void> {
  const answer = await request.post('/api/session', {
    headers: changing,
    data: { email: `${account}@demo.example`, password },
  });
  expect(answer.status()).toBe(200);
}

export async function demoBuildingId(request: APIRequestContext): Promise<string> {
  const list = (await (await request.get('/api/buildings')).json()) as { rows: { id: string; name: string }[] };
  const demo = list.rows.find(({ name }) => name === 'Osier Terrace');
  expect(demo).toBeDefined();
  return demo?.id ?? '';
}

/**
 * Two stories of 10 ft; two equal walls in y at x = 0 and 60, two in x at y = 0 and 40, all 20 ft by 10 in. The level's point
 * stands 6 ft east of the center of rigidity at (30, 20).
 */
export const square = {
  levels: 'level,height (ft),x,y,extent_x,extent_y,edge_x,edge_y\nRoof,10,36,20,60,40,0,0\nL2,10,36,20,60,40,0,0\n',
  walls: [
    'wall,x1,y1,x2,y2,thickness (in),from_level,to_level',
    'Y1,0,10,0,30,10,L2,Roof',
    'Y2,60,10,60,30,10,L2,Roof',
    'X1,20,0,40,0,10,L2,Roof',
    'X2,20,40,40,40,10,L2,Roof',
    '',
  ].join('\n'),
  forces: 'level,case,kind,fx,fy\nRoof,EY,seismic,0,100\nL2,EY,seismic,0,50\n',
  gravity: [
    'level,wall,dead,live',
    ...['Y1', 'Y2', 'X1', 'X2'].flatMap((wall) => [`Roof,${wall},40,0`, `L2,${wall},50,20`]),
    '',
  ].join('\n'),
};

export async function newBuilding(request: APIRequestContext, name: string): Promise<string> {
  const made = await request.post('/api/buildings', { headers: changing, data: { name, units: 'us' } });
  expect(made.status()).toBe(201);
  const { id } = (await made.json()) as { id: string };
  for (const [table, text] of Object.entries(square)) {
    const answer = await request.post(`/api/buildings/${id}/uploads`, {
      headers: changing,
      multipart: { table, file: { name: `${table}.csv`, mimeType: 'text/csv', buffer: Buffer.from(text) } },
    });
    expect(answer.status()).toBe(200);
  }
  return id;
}

export { expect };
