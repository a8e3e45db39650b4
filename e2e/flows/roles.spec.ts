import { demoBuildingId, expect, newBuilding, signIn, signInByApi, signedOutQuestion, test } from '../fixtures.ts';

test.use({ expected: { errors: [signedOutQuestion, /status of 403/, /status of 404/] } });

test('a wrong password is refused in words, and the right one still works', async ({ page }) => {
  await page.goto('/');
  await page.getByLabel('Email').fill('engineer@demo.example');
  await page.getByLabel('Password').fill('not this one');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('alert')).toBeVisible();
  await signIn(page, 'engineer');
});

test('a checker reads every page and edits nothing', async ({ page }) => {
  await signInByApi(page.request, 'checker');
  const id = await demoBuildingId(page.request);
  await page.goto(`/buildings/${id}/inputs`);
  await expect(page.getByRole('grid', { name: 'Levels' })).toBeVisible();
  await expect(page.getByRole('button', { name: 'Upload a table' })).toHaveCount(0);
  const cell = page.getByRole('grid', { name: 'Levels' }).getByRole('gridcell').nth(1);
  await cell.click();
  await page.keyboard.press('Enter');
  await expect(page.getByRole('grid', { name: 'Levels' }).getByRole('textbox')).toHaveCount(0);
  await page.getByRole('navigation', { name: 'Building' }).getByRole('link', { name: 'Schedule' }).click();
  await expect(page.getByRole('grid', { name: 'Wall schedule' })).toBeVisible();
});

test('a drafter is told what is theirs instead', async ({ page }) => {
  await signInByApi(page.request, 'engineer');
  const id = await demoBuildingId(page.request);
  await signInByApi(page.request, 'drafter');
  await page.goto(`/buildings/${id}/schedule`);
  await expect(page.getByText(/revision/i).first()).toBeVisible();
  await expect(page.getByRole('grid')).toHaveCount(0);
});

test('back and forward keep level and page', async ({ page }) => {
  await signInByApi(page.request, 'engineer');
  const id = await newBuilding(page.request, 'Back and forward');
  await page.goto(`/buildings/${id}/distribution`);
  await page.getByRole('listbox', { name: 'Stories' }).getByRole('option', { name: /^Roof/ }).click();
  await expect(page).toHaveURL(/level=Roof/);
  await page.getByRole('navigation', { name: 'Building' }).getByRole('link', { name: 'Takedown' }).click();
  await expect(page).toHaveURL(/takedown/);
  await page.goBack();
  await expect(page).toHaveURL(/distribution.*level=Roof/);
});

test('an unknown building says so and shows a way', async ({ page }) => {
  await signInByApi(page.request, 'engineer');
  await page.goto('/buildings/01a00000-0000-7000-8000-000000000000/inputs');
  await expect(page.getByRole('link', { name: /buildings/i }).first()).toBeVisible();
});

test('a story that comes to rest does not call the reader back from the next page', async ({ page }) => {
  await signInByApi(page.request, 'engineer');
  const id = await demoBuildingId(page.request);
  await page.route(/SchedulePage/, async (route) => {
    await new Promise((fulfill) => setTimeout(fulfill, 700));
    await route.continue();
  });
  await page.goto(`/buildings/${id}/inputs`);
  await page.getByRole('grid', { name: 'Levels' }).getByRole('gridcell').nth(1).click();
  await page.getByRole('navigation', { name: 'Building' }).getByRole('link', { name: 'Schedule' }).click();
  await expect(page.getByRole('grid', { name: 'Wall schedule' })).toBeVisible();
  await expect(page).toHaveURL(/schedule/);
});
