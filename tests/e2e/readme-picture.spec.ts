import { copyFileSync, mkdirSync } from 'node:fs';
import path from 'node:path';
import { expect, test } from '@playwright/test';
import { skerryPoint } from '../../lib/demo/skerry-point';

const [owner] = skerryPoint.people;
const FILE = '.data/test/pictures/section.png';
const IN_README = 'public/readme/section.png';

test.use({ viewport: { width: 1280, height: 980 }, colorScheme: 'light' });

/** With CELLARSUN_WRITE_PICTURES=1 the picture replaces the README's; otherwise it stays in .data. */
test('the README’s picture: the demo’s section, drawn with every tier’s daily light', async ({ page }) => {
  const { csrfToken } = await (await page.request.get('/api/auth/csrf')).json();
  const form = { csrfToken, email: owner.email, password: owner.passphrase, json: 'true' };
  expect((await page.request.post('/api/auth/callback/credentials', { form })).ok()).toBe(true);

  const read = async (path: string) => (await page.request.get(`/api/v1/gardens${path}`)).json();
  const [garden] = await read('');
  const [tent] = await read(`/${garden.gardenId}/tents`);
  await page.goto(`/gardens/${garden.gardenId}/tents/${tent.tentId}/${tent.currentScenarioId}`);
  for (const tier of skerryPoint.scenarios[0].plan.tiers)
    await expect(page.getByText(new RegExp(`${tier.name}: [\\d.]+ mol a day`)).first()).toBeAttached();

  for (const file of process.env['CELLARSUN_WRITE_PICTURES'] ? [FILE, IN_README] : [FILE])
    mkdirSync(path.dirname(file), { recursive: true });
  await page.screenshot({ path: FILE });
  if (process.env['CELLARSUN_WRITE_PICTURES']) copyFileSync(FILE, IN_README);
});
