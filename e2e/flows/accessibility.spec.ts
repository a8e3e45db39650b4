import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';

import { demoBuildingId, expect, signInByApi, signedOutQuestion, test } from '../fixtures.ts';

test.use({ expected: { errors: [signedOutQuestion] } });

async function violations(page: Page): Promise<string[]> {
  const report = await new AxeBuilder({ page }).withTags(['wcag2a', 'wcag2aa', 'wcag21aa', 'wcag22aa']).analyze();
  return report.violations.flatMap(({ id, nodes }) => nodes.map((node) => `${id}: ${node.target.join(' ')}`));
}

for (const colorScheme of ['light', 'dark'] as const) {
  test.describe(colorScheme, () => {
    test.use({ colorScheme });

    test('sign in', async ({ page }) => {
      await page.goto('/');
      await expect(page.getByRole('button', { name: 'Sign in' })).toBeVisible();
      expect(await violations(page)).toEqual([]);
    });

    test('every page of the demo building', async ({ page }) => {
      await signInByApi(page.request, 'engineer');
      const id = await demoBuildingId(page.request);
      await page.goto('/');
      await expect(page.getByText('Osier Terrace')).toBeVisible();
      expect(await violations(page)).toEqual([]);
      for (const [path, ready] of [
        ['inputs', page.getByRole('grid', { name: 'Levels' })],
        ['distribution', page.getByRole('figure', { name: 'Plan' })],
        ['takedown', page.getByRole('figure', { name: 'Down the height' })],
        ['schedule', page.getByRole('grid', { name: 'Wall schedule' })],
      ] as const) {
        await page.goto(`/buildings/${id}/${path}`);
        await expect(ready).toBeVisible();
        await expect(page.getByRole('figure', { name: 'Stack' })).toBeVisible();
        expect(await violations(page), path).toEqual([]);
      }
    });
  });
}

test('the fonts ship with the application and the policy is strict', async ({ page }) => {
  const answer = await page.goto('/');
  const policy = answer?.headers()['content-security-policy'] ?? '';
  expect(policy).toContain("default-src 'self'");
  expect(policy).not.toContain('unsafe');
  const loaded = await page.evaluate(async () => {
    await document.fonts.load('14px "IBM Plex Sans"');
    return [...document.fonts]
      .filter(({ status }) => status === 'loaded')
      .map(({ family }) => family.replaceAll('"', ''));
  });
  expect(loaded).toContain('IBM Plex Sans');
});
