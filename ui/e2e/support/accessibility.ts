import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import type { Page } from '@playwright/test';
import type axe from 'axe-core';

const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

/** What axe finds on the page as it stands, each with the first element at fault. */
export async function violationsOf(page: Page): Promise<string[]> {
  // Evaluated by the browser's own debugger, so the page's policy against foreign scripts stays as it is.
  await page.evaluate(axeSource);
  return page.evaluate(async () => {
    const { violations } = await (globalThis as unknown as { axe: typeof axe }).axe.run();
    return violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html.slice(0, 160)} (${nodes[0]?.failureSummary})`);
  });
}

/** How far the page is wider than the window. [px] */
export const overflowOf = (page: Page): Promise<number> =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
