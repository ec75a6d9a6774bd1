import AxeBuilder from '@axe-core/playwright';
import { expect, type Locator, type Page } from '@playwright/test';

/** Nothing for axe to find, and nothing that scrolls the page sideways. */
export async function isAccessible(page: Page, where: string) {
  // At the end of the page a bar that sticks to the foot stands in its own place and covers no target.
  await page.evaluate(() => scrollTo({ top: document.documentElement.scrollHeight, behavior: 'instant' }));
  const tags = ['wcag2a', 'wcag2aa', 'wcag21aa', 'wcag22aa'];
  // Without frames in the page there is nothing to gather from them in a second one: "legacy" is the same check, twice as fast.
  const { violations } = await new AxeBuilder({ page }).setLegacyMode().withTags(tags).analyze();
  const words = violations.map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.target.join(' ')).join(', ')}`);
  expect(words, where).toEqual([]);
  const wide = await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
  expect(wide, `${where} scrolls sideways`).toBeLessThanOrEqual(0);
}

/** How a person gets at things: with a pointer, or with the keys alone. */
export interface Hand {
  fill: (field: Locator, text: string) => Promise<void>;
  press: (control: Locator) => Promise<void>;
  /** Moves a thing of the drawing down a little. */
  lower: (slider: Locator) => Promise<void>;
}

const LOWER_PX = 24;

export const mouse: Hand = {
  fill: (field, text) => field.fill(text),
  press: (control) => control.click(),
  async lower(slider) {
    // Waits until it stands still, in view and uncovered, also while the page before it is still going away.
    await slider.hover();
    const box = (await slider.boundingBox())!;
    const { mouse: pointer } = slider.page();
    const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
    await pointer.move(x, y);
    await pointer.down();
    await pointer.move(x, y + LOWER_PX, { steps: 6 });
    await pointer.up();
  },
};

const MOST_TABS = 220;

/** Walks with Tab until the control has the focus; fails where Tab never reaches it. */
async function tabTo(page: Page, control: Locator): Promise<void> {
  await expect(control).toBeVisible();
  for (let tabs = 0; tabs < MOST_TABS; tabs += 1) {
    if (await control.evaluate((node) => node === document.activeElement)) return;
    await page.keyboard.press('Tab');
  }
  throw new Error(`Tab never reached ${String(control)}`);
}

export const keyboard = (page: Page): Hand => ({
  async fill(field, text) {
    await tabTo(page, field);
    await page.keyboard.press('ControlOrMeta+a');
    await page.keyboard.type(text);
  },
  async press(control) {
    await tabTo(page, control);
    await page.keyboard.press('Enter');
  },
  async lower(slider) {
    await tabTo(page, slider);
    for (let times = 0; times < 4; times += 1) await page.keyboard.press('ArrowDown');
  },
});
