import AxeBuilder from '@axe-core/playwright';
import type { Page } from 'playwright-core';

const tags = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];

/** What axe finds wrong with the page once nothing moves: rule and the elements it is about. */
export async function axeFaults(page: Page) {
  await page.evaluate(() =>
    Promise.allSettled(document.getAnimations().map(({ finished }) => finished)),
  );
  const { violations } = await new AxeBuilder({ page }).withTags(tags).analyze();
  return violations.map(({ id, nodes }) => ({
    id,
    at: nodes.map(({ html }) => html.slice(0, 160)),
  }));
}
