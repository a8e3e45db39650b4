import { readFile } from 'node:fs/promises';

import ExcelJS from 'exceljs';

import { expect, signIn, signedOutQuestion, square, test } from '../fixtures.ts';

test.use({ expected: { errors: [signedOutQuestion, /status of 422/] } });

const file = (name: string, text: string) => ({ name, mimeType: 'text/csv', buffer: Buffer.from(text) });

/** Story L2 of the square building under EY, by hand: 150 kip, e = 6 ft, sum k r^2 = 2,600 k. */
const torsional = (150 * 6 * 30) / 2600;
const shareOfY2 = (100 * (75 + torsional)) / 150;

test('the main job: from nothing to a workbook', async ({ page }) => {
  await signIn(page, 'engineer');
  await page.getByRole('button', { name: 'New building' }).click();
  await page.getByLabel('Name').fill('Square House');
  await page.getByRole('button', { name: 'Create building' }).click();
  await expect(page.getByRole('navigation', { name: 'Building' })).toBeVisible();

  // four tables, the first of them wrong at first
  const upload = page.getByRole('region', { name: 'Upload' });
  if (!(await upload.isVisible())) await page.getByRole('button', { name: 'Upload a table' }).first().click();
  const field = upload.getByLabel('File to upload');
  await field.setInputFiles(file('levels.csv', square.levels.replace('Roof,10,', 'Roof,ten,')));
  await expect(upload.getByText('levels.csv was not taken')).toBeVisible();
  await expect(upload.getByText(/Row 2, height/)).toBeVisible();
  await expect(upload.getByText(/ten/).first()).toBeVisible();
  for (const table of ['levels', 'walls', 'forces', 'gravity'] as const) {
    await field.setInputFiles(file(`${table}.csv`, square[table]));
    await expect(upload.getByText(`${table}.csv can be taken`)).toBeVisible();
    await upload.getByRole('button', { name: 'Take it' }).click();
    await expect(upload.getByText(`${table}.csv is stored`)).toBeVisible();
  }

  // the shares, against numbers by hand
  await page.getByRole('navigation', { name: 'Building' }).getByRole('link', { name: 'Distribution' }).click();
  await page.getByRole('listbox', { name: 'Stories' }).getByRole('option', { name: /^L2/ }).click();
  const row = page
    .getByRole('region', { name: /^Shares, L2/ })
    .getByRole('row')
    .filter({ has: page.getByRole('rowheader', { name: 'Y2', exact: true }) });
  await expect(row).toContainText(`${shareOfY2.toFixed(1)}`);
  await expect(page.getByRole('figure', { name: 'Plan' })).toBeVisible();
  await expect(page.getByText('Computed here and on the server: equal')).toBeVisible();

  // a schedule cell: edited, undone, edited again
  await page.getByRole('navigation', { name: 'Building' }).getByRole('link', { name: 'Schedule' }).click();
  const grid = page.getByRole('grid', { name: 'Wall schedule' });
  await expect(grid.getByRole('columnheader', { name: /^Vertical/ })).toBeVisible();
  const headings = grid.getByRole('row').filter({ has: page.getByRole('columnheader', { name: /^Vertical/ }) });
  const headers = await headings.getByRole('columnheader').allTextContents();
  const column = headers.findIndex((text) => text.startsWith('Vertical'));
  expect(column).toBeGreaterThan(0);
  const cell = grid
    .getByRole('row')
    .filter({ has: page.getByRole('gridcell') })
    .first()
    .getByRole('gridcell')
    .nth(column);
  const automatic = (await cell.textContent()) ?? '';
  await cell.click();
  await page.keyboard.press('Enter');
  await page.keyboard.press('Control+A');
  await page.keyboard.type('#7 @ 6" ef');
  await page.keyboard.press('Enter');
  await expect(cell).toContainText('#7@6 EF');
  await expect(cell).toHaveAttribute('aria-description', /overwritten/);
  await cell.click();
  await page.keyboard.press('Control+z');
  await expect(cell).toHaveText(automatic);
  await cell.click();
  await page.keyboard.type('#7@6 EF');
  await page.keyboard.press('Enter');
  await expect(cell).toContainText('#7@6 EF');

  // the workbook, read back
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'Download workbook' }).click(),
  ]);
  const workbook = new ExcelJS.Workbook();
  await workbook.xlsx.load(new Uint8Array(await readFile(await download.path())).buffer);
  const schedule = workbook.getWorksheet('Wall schedule');
  const texts: string[] = [];
  schedule?.eachRow((line) => line.eachCell((one) => texts.push(one.text)));
  expect(texts.some((text) => text.includes('#7@6 EF'))).toBe(true);
  expect(texts.some((text) => text.includes('licensed professional'))).toBe(true);

  // shear of Y2 in story L2 and its moment at the base: 85.385 kip, (56.923 + 85.385) x 10 ft = 1,423.08 kip-ft
  const numbers: number[] = [];
  workbook.getWorksheet('Takedown')?.eachRow((line) =>
    line.eachCell((one) => {
      if (typeof one.value === 'number') numbers.push(one.value);
    }),
  );
  const shear = 75 + torsional;
  const moment = 10 * (shear + 50 + (100 * 6 * 30) / 2600);
  expect(numbers.some((value) => Math.abs(value - shear) < 1e-6)).toBe(true);
  expect(numbers.some((value) => Math.abs(value - moment) < 1e-6)).toBe(true);
});
