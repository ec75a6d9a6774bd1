import AxeBuilder from '@axe-core/playwright';
import { expect, type Locator, type Page } from '@playwright/test';

/** Nothing for axe to find, and nothing that scrolls the page sideways. */
export async function isAccessible(page: Page, where: string) {
  const tags = ['wcag2a', 'wcag2aa', 'wcag21aa', 'wcag22aa'];
  const { violations } = await new AxeBuilder({ page }).withTags(tags).analyze();
  const words = violations.map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.target.join(' ')).join(', ')}`);
  expect(words, where).toEqual([]);
  const wide = await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
  expect(wide, `${where} scrolls sideways`).toBeLessThanOrEqual(0);
}

/** How a person gets at things: with a pointer, or with the keys alone. */
export interface Hand {
  fill: (field: Locator, text: string) => Promise<void>;
  press: (control: Locator) => Promise<void>;
}

export const mouse: Hand = {
  fill: (field, text) => field.fill(text),
  press: (control) => control.click(),
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
});
