import { readdirSync } from 'node:fs';
import path from 'node:path';
import { expect, test, type Page } from '@playwright/test';
import { fenwickStreet } from '../../lib/demo/fenwick-street';
import { skerryPoint } from '../../lib/demo/skerry-point';
import { isAccessible } from './walk';

interface DemoPerson {
  email: string;
  passphrase: string;
}

async function signIn(page: Page, { email, passphrase }: DemoPerson) {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Passphrase', { exact: true }).fill(passphrase);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL(/\/gardens/);
}

/** The demo's ids by the names that stand in the addresses of pages. */
async function idsOf(page: Page): Promise<Record<string, string>> {
  const read = async (at: string) => (await page.request.get(`/api/v1/gardens${at}`)).json();
  const [{ gardenId }] = await read('');
  const [tent] = await read(`/${gardenId}/tents`);
  const [{ fixtureId }] = await read(`/${gardenId}/fixtures`);
  return { gardenId, tentId: tent.tentId, scenarioId: tent.currentScenarioId, roomId: tent.roomId, fixtureId };
}

function pageFiles(folder = 'app'): string[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    const full = path.join(folder, entry.name);
    return entry.isDirectory() ? pageFiles(full) : entry.name === 'page.tsx' ? [full] : [];
  });
}

/** Every page of the app, from its files, so that a new one is visited without being asked. */
const templates = pageFiles().map(
  (file) =>
    file
      .replace(/^app/, '')
      .replaceAll(/\/\([^/]+\)/g, '')
      .replace(/\/page\.tsx$/, '') || '/',
);
const signedOut = ['/', '/sign-in', '/sign-up', '/sources', '/stored'];
const fill = (template: string, ids: Record<string, string>) =>
  template.replaceAll(/\[(\w+)\]/g, (_, name: string) => ids[name] ?? `no-${name}`);

const looks = [
  { colorScheme: 'light', width: 1280, height: 860, garden: skerryPoint },
  { colorScheme: 'dark', width: 360, height: 740, garden: fenwickStreet },
] as const;
/** The other pairs of theme and width, which the main job walks too; all pages in them take two minutes more. */
const otherLooks = [
  { colorScheme: 'dark', width: 1280, height: 860, garden: fenwickStreet },
  { colorScheme: 'light', width: 360, height: 740, garden: skerryPoint },
] as const;

for (const { colorScheme, width, height, garden } of [
  ...looks,
  ...(process.env['CELLARSUN_EVERY_LOOK'] ? otherLooks : []),
]) {
  test.describe(`${colorScheme}, ${width} px, ${garden.name}`, () => {
    test.use({ colorScheme, viewport: { width, height } });

    test('every page answers, has one heading that names it, nothing for axe, nothing sideways', async ({ page }) => {
      test.setTimeout(240_000);
      const broken: string[] = [];
      page.on('pageerror', (error) => broken.push(error.message));
      for (const address of signedOut) {
        await page.goto(address);
        await isAccessible(page, address);
      }
      await signIn(page, garden.people[0]);
      const ids = await idsOf(page);
      for (const template of templates.filter((each) => !signedOut.includes(each))) {
        const answer = await page.goto(fill(template, ids));
        expect(answer!.status(), template).toBe(200);
        await expect(page.getByRole('heading', { level: 1 }), template).toHaveCount(1);
        await isAccessible(page, template);
      }
      expect(broken).toEqual([]);
    });
  });
}

test.describe('who sees what', () => {
  test('a stranger is sent to sign in from every page of a garden', async ({ page }) => {
    const ids = { gardenId: '00000000-0000-4000-8000-000000000000' };
    for (const template of templates.filter((each) => each.startsWith('/gardens') || each === '/account')) {
      await page.goto(fill(template, ids));
      await expect(page, template).toHaveURL(/\/sign-in/);
    }
  });

  test('a member of another garden finds nothing, as where nothing is', async ({ page }) => {
    test.setTimeout(120_000);
    await signIn(page, fenwickStreet.people[0]);
    const theirs = await idsOf(page);
    await page.context().clearCookies();
    await signIn(page, skerryPoint.people[0]);
    const nowhere = { ...theirs, gardenId: '00000000-0000-4000-8000-000000000000' };
    for (const template of templates.filter((each) => each.includes('[gardenId]'))) {
      // A page that has begun to stream answers 200; what it says must not differ, nor name anything of theirs.
      const said: string[] = [];
      for (const ids of [theirs, nowhere]) {
        await page.goto(fill(template, ids));
        await expect(page.getByText('There is no such page here.'), template).toBeVisible();
        said.push((await page.getByRole('main').innerText()).trim());
      }
      expect(said[0], template).toBe(said[1]);
      expect(said[0], template).not.toContain(fenwickStreet.name);
    }
  });

  test('a viewer reads every page and is told why what they may not do is closed', async ({ page }) => {
    test.setTimeout(120_000);
    const viewer = skerryPoint.people.find((person) => person.role === 'viewer')!;
    await signIn(page, viewer);
    const ids = await idsOf(page);
    for (const template of ['fixtures/new', 'rooms/new', 'tents/new']) {
      await page.goto(`/gardens/${ids['gardenId']}/${template}`);
      await expect(page.getByRole('button', { name: /^Add/ }), template).toHaveCount(0);
      await expect(page.getByRole('main'), template).toContainText(/planner|owner|role/i);
    }
    await page.goto(fill('/gardens/[gardenId]/rooms/[roomId]', ids));
    await expect(page.getByLabel('Latitude')).toBeDisabled();
    await page.goto(fill('/gardens/[gardenId]/tents/[tentId]/[scenarioId]', ids));
    await expect(page.getByRole('button', { name: 'Try another' })).toHaveCount(0);
  });
});
