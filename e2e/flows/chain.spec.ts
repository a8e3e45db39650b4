import type { ResultDocument } from '../../shared/contracts/result.ts';
import { changing, expect, newBuilding, signIn, signedOutQuestion, square, test } from '../fixtures.ts';

test.use({ expected: { errors: [signedOutQuestion] } });

/** Story L2 of the square building under EY: 150 kip, 6 ft off the center, sum k r^2 = 2,600 k. */
const torsional = (150 * 6 * 30) / 2600;
const byRigidity = { Y1: 75 - torsional, Y2: 75 + torsional };
/** flexible floors give each of two walls 60 ft apart half of the floor */
const byWidth = 75;

/**
 * Drift of L2 under EX, by hand: 100 kip at 20 ft and 50 at 10 ft along the line of symmetry, half on each of two walls 20 ft by 10 in;
 * cantilever with shear, E = 57,000 sqrt(5,000) psi, half of the gross inertia, G = 0.4 E.
 */
function driftOfL2(): number {
  const modulusKsi = (57000 * Math.sqrt(5000)) / 1000;
  const [lengthIn, thicknessIn, heightIn] = [240, 10, 120];
  const bending = (modulusKsi * 0.5 * thicknessIn * lengthIn * lengthIn * lengthIn) / 12;
  const shearing = (0.4 * modulusKsi * thicknessIn * lengthIn) / 1.2;
  const [upper, lower] = [50, 25];
  // load P at a, deflection at z up to a: P z^2 (3a - z)/(6 EI) + P z/GA
  const at = (load: number, armIn: number) =>
    (load * heightIn * heightIn * (3 * armIn - heightIn)) / (6 * bending) + (load * heightIn) / shearing;
  return (at(upper, 2 * heightIn) + at(lower, heightIn)) / heightIn;
}

const symmetric = square.forces + 'Roof,EX,seismic,100,0\nL2,EX,seismic,50,0\n';

test('bases, drift, envelope, a warning accepted, and a share that was changed on the way', async ({ page }) => {
  await signIn(page, 'engineer');
  const id = await newBuilding(page.request, 'Square Chain');
  const stored = await page.request.post(`/api/buildings/${id}/uploads`, {
    headers: changing,
    multipart: { table: 'forces', file: { name: 'forces.csv', mimeType: 'text/csv', buffer: Buffer.from(symmetric) } },
  });
  expect(stored.status()).toBe(200);
  const building = (await (await page.request.get(`/api/buildings/${id}`)).json()) as { version: number };
  const bases = { version: building.version, basis: ['rigid', 'flexible', 'compatible'] };
  expect((await page.request.patch(`/api/buildings/${id}`, { headers: changing, data: bases })).status()).toBe(200);

  // side by side, against numbers by hand
  await page.goto(`/buildings/${id}/distribution?case=EY&level=L2`);
  const table = page.getByRole('region', { name: 'The bases, L2, EY' });
  for (const wall of ['Y1', 'Y2'] as const) {
    const row = table.getByRole('row').filter({ has: page.getByRole('button', { name: wall, exact: true }) });
    await expect(row.getByRole('cell').nth(0)).toHaveText(byRigidity[wall].toFixed(1));
    await expect(row.getByRole('cell').nth(1)).toHaveText(byWidth.toFixed(1));
  }
  await expect(table.getByText(/spreads most:/)).toBeVisible();
  await table.getByRole('button', { name: 'Flexible' }).click();
  await expect(page).toHaveURL(/basis=flexible/);
  await expect(page.getByRole('option', { name: 'Y1, 75.0 kip, 50.0 %' })).toBeVisible();
  await table.getByRole('button', { name: 'Rigid' }).click();

  // drift against the closed form
  await page.getByRole('group', { name: 'Case' }).getByRole('button', { name: 'EX' }).click();
  const drifts = page.getByRole('region', { name: 'Drift and torsion by level' });
  const atL2 = drifts.getByRole('row').filter({ has: page.getByRole('rowheader', { name: 'L2' }) });
  await expect(atL2.getByRole('cell').first()).toHaveText(`${(100 * driftOfL2()).toFixed(3)}\u2009%`);
  await page.getByRole('button', { name: 'Drift', exact: true }).click();
  await expect(page.getByRole('figure', { name: 'Stack' }).getByText('Drift over its limit')).toBeVisible();

  // the envelope
  await page.getByRole('button', { name: 'Use the envelope' }).click();
  await expect(
    table.or(page.getByRole('region', { name: 'The bases, L2, EX' })).getByText(/envelope is in use/),
  ).toBeVisible();
  await expect(page.getByRole('button', { name: 'Use the envelope' })).toHaveCount(0);

  // a warning, accepted with a reason
  const weigh = page.getByRole('region', { name: 'What to weigh' });
  const first = weigh.getByRole('row').nth(1);
  const message = ((await first.getByRole('cell').nth(2).textContent()) ?? '').replace('Accept, because', '').trim();
  const point = weigh.getByRole('row').filter({ hasText: message });
  await point.getByRole('button', { name: 'Accept, because' }).click();
  await point.getByLabel(/^Reason/).fill('Looked at by hand on sheet 4');
  await point.getByRole('button', { name: 'Accept, because' }).click();
  await expect(point.getByText(/by Demo engineer.*Looked at by hand on sheet 4/)).toBeVisible();

  // down the height: what governs, by keys
  await page.getByRole('navigation', { name: 'Building' }).getByRole('link', { name: 'Takedown' }).click();
  await page.getByRole('listbox', { name: 'Down the wall' }).focus();
  await page.keyboard.press('End');
  await expect(page.getByRole('region', { name: 'What governs' })).toContainText('at Roof, what governs under rigid');

  // one share changed between server and page: the foot breaks in words
  await page.route(`**/api/buildings/${id}/results`, async (route) => {
    const answer = await route.fetch();
    const document = (await answer.json()) as ResultDocument;
    const distribution = document.distribution.map((one) =>
      one.basis === 'rigid' && one.case === 'EY' && one.variant === '0' && one.level === 'L2' && one.wall === 'Y1'
        ? { ...one, total: one.total + 5 }
        : one,
    );
    await route.fulfill({ response: answer, json: { ...document, distribution } });
  });
  await page.goto(`/buildings/${id}/distribution?case=EY&level=L2`);
  await expect(page.getByRole('contentinfo').getByRole('alert')).toContainText(
    'EY, L2, rigid: the shares in y add up to 155.0, resisted are 150.0 kip',
  );
  await expect(page.getByRole('region', { name: 'Balance, L2, EY' }).getByRole('alert')).toContainText(
    'Balance broken',
  );
});
