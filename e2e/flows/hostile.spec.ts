import { changing, expect, newBuilding, signedOutQuestion, signIn, signInByApi, square, test } from '../fixtures.ts';

test.use({ expected: { errors: [signedOutQuestion, /status of (401|409)/] } });

const markup = '<img src=x onerror=alert(1)>';
const file = (name: string, text: string) => ({ name, mimeType: 'text/csv', buffer: Buffer.from(text) });

interface Changed {
  readonly seq: number;
  readonly version: number;
}

test('a double click makes one building, stores a file once and opens one session', async ({ page }) => {
  const posts: string[] = [];
  page.on('request', (request) => {
    if (request.method() === 'POST') posts.push(new URL(request.url()).pathname);
  });
  await page.goto('/');
  await page.getByLabel('Email').fill('engineer@demo.example');
  await page.getByLabel('Password').fill('groundward-demo');
  await page.getByRole('button', { name: 'Sign in' }).dblclick();
  await expect(page.getByRole('heading', { name: 'Buildings' })).toBeVisible();
  expect(posts).toEqual(['/api/session']);

  await page.getByRole('button', { name: 'New building' }).click();
  await page.getByLabel('Name').fill('Twice House');
  await page.getByRole('button', { name: 'Create building' }).dblclick();
  await expect(page.getByRole('navigation', { name: 'Building' })).toBeVisible();
  expect(posts.filter((path) => path === '/api/buildings')).toHaveLength(1);

  const id = /buildings\/([^/]+)/.exec(page.url())?.[1] ?? '';
  const panel = page.getByRole('region', { name: 'Upload' });
  if (!(await panel.isVisible())) await page.getByRole('button', { name: 'Upload a table' }).first().click();
  await panel.getByLabel('File to upload').setInputFiles(file('levels.csv', square.levels));
  await expect(panel.getByText('levels.csv can be taken')).toBeVisible();
  await panel.getByRole('button', { name: 'Take it' }).dblclick();
  await expect(panel.getByText('levels.csv is stored')).toBeVisible();
  // created, then one upload: seq 2; one trial and one upload were sent
  expect(((await (await page.request.get(`/api/buildings/${id}`)).json()) as Changed).seq).toBe(2);
  expect(posts.filter((path) => path.endsWith('/uploads'))).toHaveLength(2);
});

test('leaving while a file is on its way keeps the page usable and stores the file whole', async ({
  page,
  request,
}) => {
  await signInByApi(request, 'engineer');
  const id = await newBuilding(request, 'Leaving House');
  await signIn(page, 'engineer');
  await page.getByRole('link', { name: 'Leaving House' }).click();
  await page.getByRole('button', { name: 'Upload a table' }).first().click();
  const panel = page.getByRole('region', { name: 'Upload' });
  const taller = square.levels.replace('Roof,10,', 'Roof,14,');
  await panel.getByLabel('File to upload').setInputFiles(file('levels.csv', taller));
  await expect(panel.getByText('levels.csv can be taken')).toBeVisible();
  const answered = page.waitForResponse((response) => response.url().endsWith('/uploads'));
  let release: () => void = () => undefined;
  const held = new Promise<void>((free) => (release = free));
  await page.route('**/uploads', async (route) => {
    await held;
    await route.continue();
  });
  await panel.getByRole('button', { name: 'Take it' }).click();
  await page.goBack();
  await expect(page.getByRole('heading', { name: 'Buildings' })).toBeVisible();
  release();
  await answered;
  await page.getByRole('link', { name: 'Leaving House' }).click();
  // 14 + 10 ft
  await expect(page.getByText('2 levels, 24.0 ft above the base')).toBeVisible();
  const stored = (await (await request.get(`/api/buildings/${id}/levels`)).json()) as { rows: { height: number }[] };
  expect(stored.rows.map(({ height }) => height)).toEqual([14, 10]);
});

test('markup in names stays text on every page', async ({ page, request }) => {
  const dialogs: string[] = [];
  page.on('dialog', (dialog) => {
    dialogs.push(dialog.message());
    void dialog.dismiss();
  });
  await signInByApi(request, 'engineer');
  const id = await newBuilding(request, `${markup} House`);
  const walls = (await (await request.get(`/api/buildings/${id}/walls`)).json()) as { rows: { id: string }[] };
  const levels = (await (await request.get(`/api/buildings/${id}/levels`)).json()) as { rows: { id: string }[] };
  const forces = (await (await request.get(`/api/buildings/${id}/forces`)).json()) as { rows: { id: string }[] };
  for (const [table, column, was, rowId] of [
    ['walls', 'wall', 'Y1', walls.rows[0]?.id],
    ['levels', 'level', 'L2', levels.rows[1]?.id],
    ['forces', 'case', 'EY', forces.rows[0]?.id],
  ]) {
    const data = { edits: [{ id: rowId, column, was, to: `${markup} ${String(was)}` }] };
    const answer = await request.patch(`/api/buildings/${id}/${String(table)}`, { headers: changing, data });
    expect(answer.status()).toBe(200);
  }
  await signIn(page, 'engineer');
  await expect(page.getByRole('link', { name: `${markup} House` })).toBeVisible();
  await page.getByRole('link', { name: `${markup} House` }).click();
  for (const link of ['Inputs', 'Distribution', 'Takedown', 'Schedule']) {
    await page.getByRole('navigation', { name: 'Building' }).getByRole('link', { name: link }).click();
    await expect(page.getByText(markup).first()).toBeAttached();
    expect(await page.locator('img[src="x"]').count()).toBe(0);
  }
  expect(dialogs).toEqual([]);
  const result = (await (await request.get(`/api/buildings/${id}/results`)).json()) as {
    levels: { level: string; shear: Record<string, { vy: number }> }[];
  };
  // 100 kip under the new name, 50 kip still under the old one
  const base = result.levels.find(({ level }) => level.endsWith('L2'));
  expect(
    Object.values(base?.shear ?? {})
      .map(({ vy }) => Math.round(vy))
      .sort((a, b) => a - b),
  ).toEqual([50, 100]);
});

test('two tabs meet in one cell: the second is told, and the first one stands', async ({ page, context, request }) => {
  await signInByApi(request, 'engineer');
  const id = await newBuilding(request, 'Tabs House');
  await signIn(page, 'engineer');
  const other = await context.newPage();
  const heightIn = (tab: typeof page) =>
    tab.getByRole('grid', { name: 'Levels' }).getByRole('row').nth(1).getByRole('gridcell').nth(1);
  for (const tab of [page, other]) {
    await tab.goto(`/buildings/${id}/inputs/levels`);
    await expect(heightIn(tab)).toHaveText('10.0');
  }
  await heightIn(page).click();
  await page.keyboard.type('11');
  await page.keyboard.press('Enter');
  await expect
    .poll(async () => {
      const stored = (await (await request.get(`/api/buildings/${id}/levels`)).json()) as {
        rows: { height: number }[];
      };
      return stored.rows[0]?.height;
    })
    .toBe(11);
  // the other tab must not learn of it by coming to the front
  await heightIn(other).click();
  await other.keyboard.type('12');
  await other.keyboard.press('Enter');
  await expect(heightIn(other)).toHaveText(/^1[12]\.0$/);
  await other.reload();
  const stored = (await (await request.get(`/api/buildings/${id}/levels`)).json()) as { rows: { height: number }[] };
  await expect(heightIn(other)).toHaveText(`${stored.rows[0]?.height.toFixed(1) ?? ''}`);
  await other.close();
});

test('typing goes on while the network is slow, and every cell arrives', async ({ page, request }) => {
  await signInByApi(request, 'engineer');
  const id = await newBuilding(request, 'Slow House');
  await signIn(page, 'engineer');
  await page.goto(`/buildings/${id}/inputs/levels`);
  const cell = (row: number) =>
    page.getByRole('grid', { name: 'Levels' }).getByRole('row').nth(row).getByRole('gridcell').nth(1);
  await expect(cell(1)).toHaveText('10.0');
  let release: () => void = () => undefined;
  const held = new Promise<void>((free) => (release = free));
  await page.route(`**/api/buildings/${id}/levels`, async (route) => {
    if (route.request().method() !== 'GET') await held;
    await route.continue();
  });
  await cell(1).click();
  await page.keyboard.type('12');
  await page.keyboard.press('Enter');
  await page.keyboard.type('13');
  await page.keyboard.press('Enter');
  await expect(cell(1)).toHaveText('12.0');
  await expect(cell(2)).toHaveText('13.0');
  release();
  await expect
    .poll(async () => {
      const stored = (await (await request.get(`/api/buildings/${id}/levels`)).json()) as {
        rows: { height: number }[];
      };
      return stored.rows.map(({ height }) => height);
    })
    .toEqual([12, 13]);
  await expect(page.getByText('2 levels, 25.0 ft above the base')).toBeVisible();
});

test('a session that was ended in another tab leads to sign-in and back', async ({ page, context, request }) => {
  await signInByApi(request, 'engineer');
  const id = await newBuilding(request, 'Ended House');
  await signIn(page, 'engineer');
  await page.goto(`/buildings/${id}/inputs/levels`);
  const cell = page.getByRole('grid', { name: 'Levels' }).getByRole('row').nth(1).getByRole('gridcell').nth(1);
  await expect(cell).toHaveText('10.0');
  // everything that the page asks for by itself is answered; the edit is the first to meet the ended session
  await page.waitForLoadState('networkidle');
  expect((await context.request.delete('/api/session', { headers: changing })).status()).toBe(204);
  await cell.click();
  await page.keyboard.type('17');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('button', { name: 'Sign in' })).toBeVisible();
  await page.getByLabel('Email').fill('engineer@demo.example');
  await page.getByLabel('Password').fill('groundward-demo');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(cell).toHaveText('10.0');
});
