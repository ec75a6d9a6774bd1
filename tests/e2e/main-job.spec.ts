import { expect, test, type Page } from '@playwright/test';
import { isAccessible, keyboard, mouse, type Hand } from './walk';

const ways = [
  { name: 'by mouse, light, 1280 px', colorScheme: 'light', width: 1280, height: 860, keys: false },
  { name: 'by mouse, dark, 360 px', colorScheme: 'dark', width: 360, height: 740, keys: false },
  { name: 'by keyboard alone, dark, 1280 px', colorScheme: 'dark', width: 1280, height: 860, keys: true },
  { name: 'by keyboard alone, light, 360 px', colorScheme: 'light', width: 360, height: 740, keys: true },
] as const;

async function signUp(page: Page, hand: Hand) {
  await page.goto('/sign-up');
  await isAccessible(page, 'sign-up');
  await fillSignUp(page, hand);
}

async function fillSignUp(page: Page, hand: Hand) {
  await hand.fill(page.getByLabel('Name that others see'), 'Ines');
  await hand.fill(page.getByLabel('E-mail'), `ines-${crypto.randomUUID()}@tests.example`);
  await hand.fill(page.getByLabel('Passphrase', { exact: true }), 'slow green kettle on the sill');
  await hand.press(page.getByRole('button', { name: 'Sign up' }));
  await page.waitForURL(/\/gardens/);
}

async function makeGarden(page: Page, hand: Hand): Promise<string> {
  await page.goto('/gardens/new');
  await isAccessible(page, 'a new garden');
  await hand.fill(page.getByLabel('Name of the garden'), 'Sill and cellar');
  await hand.press(page.getByRole('button', { name: /Make the garden/ }));
  await page.waitForURL(/\/gardens\/[0-9a-f-]{36}/);
  return /gardens\/([0-9a-f-]{36})/.exec(page.url())![1]!;
}

async function addRoom(page: Page, hand: Hand, garden: string) {
  await page.goto(`${garden}/rooms/new`);
  await isAccessible(page, 'a new room');
  await hand.fill(page.getByLabel('Name of the room'), 'Cellar');
  await hand.fill(page.getByLabel('Coldest month, mean of its air'), '9 C');
  await hand.fill(page.getByLabel('Warmest month, mean of its air'), '64 F');
  await hand.press(page.getByRole('button', { name: 'Add the room' }));
  await page.waitForURL((url) => !url.pathname.endsWith('/rooms/new'));
}

async function addLamp(page: Page, hand: Hand, garden: string) {
  await page.goto(`${garden}/fixtures/new`);
  await isAccessible(page, 'a new lamp');
  await hand.fill(page.getByLabel('Name', { exact: true }), 'Bar');
  await hand.fill(page.getByLabel('Power from the socket'), '40');
  await hand.fill(page.getByLabel('Photons, PPF'), '104');
  await hand.fill(page.getByLabel('Length of the lit face'), '80 cm');
  await hand.fill(page.getByLabel('Width of the lit face'), '2 in');
  await hand.press(page.getByRole('button', { name: 'Add this lamp' }));
  await page.waitForURL(/\/fixtures\/[0-9a-f-]{36}/);
  await isAccessible(page, 'a lamp');
}

async function addTent(page: Page, hand: Hand, garden: string) {
  await page.goto(`${garden}/tents/new`);
  await isAccessible(page, 'a new tent');
  await hand.fill(page.getByLabel('Name of the tent'), 'First tent');
  await hand.press(page.getByRole('button', { name: 'Add the tent' }));
  await page.waitForURL(/\/tents\/[0-9a-f-]{36}\/[0-9a-f-]{36}/);
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
}

/** Hangs the copy's lamp lower: its figure follows, and it is kept without a word. */
async function lowerLamp(page: Page, hand: Hand) {
  const lamp = page.getByRole('slider', { name: /height above the leaves/ }).first();
  const before = Number(await lamp.getAttribute('aria-valuenow'));
  await hand.lower(lamp);
  await expect.poll(async () => Number(await lamp.getAttribute('aria-valuenow'))).toBeLessThan(before);
  await expect(page.getByRole('status').filter({ hasText: 'Saved' })).toBeVisible();
  await page.reload();
  await expect.poll(async () => Number(await lamp.getAttribute('aria-valuenow'))).toBeLessThan(before);
}

for (const { name, colorScheme, width, height, keys } of ways) {
  test.describe(name, () => {
    test.use({ colorScheme, viewport: { width, height } });

    test('a newcomer signs up, draws a lit tent, tries another layout, compares the two and signs out', async ({
      page,
      baseURL,
    }) => {
      test.setTimeout(150_000);
      const hand = keys ? keyboard(page) : mouse;
      const elsewhere: string[] = [];
      page.on('request', (request) => {
        if (!request.url().startsWith(baseURL!) && !/^(data|blob):/.test(request.url())) elsewhere.push(request.url());
      });
      await signUp(page, hand);
      const gardenId = await makeGarden(page, hand);
      const garden = `/gardens/${gardenId}`;
      await addRoom(page, hand, garden);
      await addLamp(page, hand, garden);
      await addTent(page, hand, garden);
      await isAccessible(page, 'the section of an empty tent');
      await hand.press(page.getByRole('button', { name: /Hang .*lamp/ }).first());
      await expect(page.getByText('Nothing to save yet')).toHaveCount(0);
      await isAccessible(page, 'the section with a lamp');
      await hand.press(page.getByRole('button', { name: 'A heater', exact: true }));
      await expect(page.getByLabel('Rated power, on its label')).toBeVisible();

      const first = page.url();
      await hand.press(page.getByRole('button', { name: 'Try another' }).first());
      await page.waitForURL((url) => url.href !== first);
      await lowerLamp(page, hand);

      await page.goto(`${garden}/compare`);
      await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
      await expect(page.getByRole('checkbox')).toHaveCount(2);
      // The lamp hung lower and nothing else: a tier's light differs, with its sign.
      await expect(page.getByRole('row', { name: /^Light/ })).toContainText(/[+−]\d+\.\d/);
      await isAccessible(page, 'compare');

      await page.goto('/sign-out');
      await hand.press(page.getByRole('button', { name: 'Sign out' }));
      await page.waitForURL((url) => !url.pathname.includes('sign-out'));
      await page.goto('/gardens');
      await expect(page).toHaveURL(/sign-in/);
      expect(elsewhere).toEqual([]);
    });
  });
}

test('a stranger’s drawing is kept as it was, with the price typed into it', async ({ page }) => {
  test.setTimeout(90_000);
  await page.goto('/');
  const lamp = page.getByRole('slider', { name: /height above the leaves/ }).first();
  const before = Number(await lamp.getAttribute('aria-valuenow'));
  await mouse.lower(lamp);
  await expect.poll(async () => Number(await lamp.getAttribute('aria-valuenow'))).toBeLessThan(before);
  const drawn = await lamp.getAttribute('aria-valuenow');
  await mouse.fill(page.getByLabel('A kWh costs'), '0.37');
  await page.keyboard.press('Enter');
  await page.getByRole('link', { name: 'Keep this tent' }).click();
  await page.waitForURL(/sign-up/);
  await fillSignUp(page, mouse);
  await page.waitForURL(/keep=drawing/);
  await mouse.fill(page.getByLabel('Name of the garden'), 'Under the stairs');
  await page.getByRole('button', { name: 'Make the garden and keep the drawing' }).click();
  await page.waitForURL(/\/tents\/[0-9a-f-]{36}\/[0-9a-f-]{36}/);
  await expect(lamp).toHaveAttribute('aria-valuenow', drawn!);
  await expect(page.getByRole('link', { name: /As I drew it/ })).toHaveCount(1);
  await expect(page.getByText('First layout')).toHaveCount(0);
  await expect(page.getByText('€ 0.37 a kWh').first()).toBeVisible();
});

test.describe('by finger', () => {
  test.use({ viewport: { width: 360, height: 740 }, hasTouch: true, isMobile: true });

  test('a lamp that was tapped follows the finger, and the page stays where it is', async ({ page }) => {
    await page.goto('/');
    const lamp = page.getByRole('slider', { name: /height above the leaves/ }).first();
    const height = async () => Number(await lamp.getAttribute('aria-valuenow'));
    const before = await height();
    await lamp.tap();
    const box = (await lamp.boundingBox())!;
    const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
    const scrolledFrom = await page.evaluate(() => scrollY);
    // Chromium's own touches: a synthetic event would be trusted less than a finger.
    const finger = await page.context().newCDPSession(page);
    const touch = (type: 'touchStart' | 'touchMove' | 'touchEnd', downPx: number) =>
      finger.send('Input.dispatchTouchEvent', {
        type,
        touchPoints: type === 'touchEnd' ? [] : [{ x, y: y + downPx }],
      });
    await touch('touchStart', 0);
    for (const downPx of [4, 8, 12, 16, 20, 24]) await touch('touchMove', downPx);
    await touch('touchEnd', 24);
    await expect.poll(height).toBeLessThan(before);
    expect(await page.evaluate(() => scrollY)).toBe(scrolledFrom);
  });
});
