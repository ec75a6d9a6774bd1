import AxeBuilder from '@axe-core/playwright';
import { expect, test, type Page } from '@playwright/test';

async function isAccessible(page: Page, where: string) {
  const { violations } = await new AxeBuilder({ page })
    .withTags(['wcag2a', 'wcag2aa', 'wcag21aa', 'wcag22aa'])
    .analyze();
  const words = violations.map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.target.join(' ')).join(', ')}`);
  expect(words, where).toEqual([]);
  const wide = await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
  expect(wide, `${where} scrolls sideways`).toBeLessThanOrEqual(0);
}

for (const { colorScheme, width, height } of [
  { colorScheme: 'light', width: 1280, height: 860 },
  { colorScheme: 'dark', width: 360, height: 740 },
] as const) {
  test.describe(`${colorScheme}, ${width} px`, () => {
    test.use({ colorScheme, viewport: { width, height } });

    test('a newcomer signs up, makes a garden and a room, and draws a tent', async ({ page, baseURL }) => {
      test.setTimeout(180_000);
      const elsewhere: string[] = [];
      page.on('request', (request) => {
        if (!request.url().startsWith(baseURL!) && !/^(data|blob):/.test(request.url())) elsewhere.push(request.url());
      });
      await page.goto('/sign-up');
      await isAccessible(page, 'sign-up');
      await page.getByLabel('Name that others see').fill('Ines');
      await page.getByLabel('E-mail').fill(`ines-${Date.now()}-${width}@tests.example`);
      await page.getByLabel('Passphrase', { exact: true }).fill('slow green kettle on the sill');
      await page.getByRole('button', { name: 'Sign up' }).click();
      await page.waitForURL(/\/gardens/);

      await page.goto('/gardens/new');
      await isAccessible(page, 'a new garden');
      await page.getByLabel('Name of the garden').fill('Sill and cellar');
      await page.getByRole('button', { name: /Make the garden/ }).click();
      await page.waitForURL(/\/gardens\/[0-9a-f-]{36}/);
      const gardenId = /gardens\/([0-9a-f-]{36})/.exec(page.url())![1]!;

      await page.goto(`/gardens/${gardenId}/rooms/new`);
      await isAccessible(page, 'a new room');
      await page.getByLabel('Name of the room').fill('Cellar');
      await page.getByLabel('Coldest month, mean of its air').fill('9 C');
      await page.getByLabel('Warmest month, mean of its air').fill('64 F');
      await page.getByRole('button', { name: 'Add the room' }).click();
      await page.waitForURL((url) => !url.pathname.endsWith('/rooms/new'));

      await page.goto(`/gardens/${gardenId}/tents/new`);
      await isAccessible(page, 'a new tent');
      await page.getByLabel('Name of the tent').fill('First tent');
      await page.getByRole('button', { name: 'Add the tent' }).click();
      await page.waitForURL(/\/tents\/[0-9a-f-]{36}\/[0-9a-f-]{36}/);
      await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
      expect(elsewhere).toEqual([]);
    });
  });
}
