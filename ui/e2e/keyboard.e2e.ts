import { expect, type Page, test } from '@playwright/test';
import { password } from './support/environment';
import { openAs, people, YARD } from './support/people';
import { unique } from './support/set-up';

/** Moves on by Tab until the control has the focus, as somebody without a mouse does; never more than a page's worth. */
async function tabTo(
  page: Page,
  name: string | RegExp,
  role: 'textbox' | 'button' | 'combobox' = 'textbox',
): Promise<void> {
  const control = page.getByRole(role, { name, exact: typeof name === 'string' });
  for (let presses = 0; presses < 80; presses += 1) {
    if (await control.evaluate((element) => element === document.activeElement)) return;
    await page.keyboard.press('Tab');
  }
  throw new Error(`Tab does not lead to ${String(name)}`);
}

/** The focused control is drawn with an outline and lies within what is seen of the page. */
async function expectFocusSeen(page: Page): Promise<void> {
  const seen = await page.evaluate(() => {
    const focused = document.activeElement;
    if (!focused) return null;
    const box = focused.getBoundingClientRect();
    const top = document.elementFromPoint(box.left + box.width / 2, box.top + box.height / 2);
    return {
      outline: getComputedStyle(focused).outlineStyle,
      isCovered: !(top && (focused.contains(top) || top.contains(focused))),
    };
  });
  expect(seen).toEqual({ outline: 'solid', isCovered: false });
}

test('somebody signs in without a mouse', async ({ page }) => {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail address').waitFor();
  await tabTo(page, 'E-mail address');
  await page.keyboard.insertText(people.compliance.email);
  await page.keyboard.press('Tab');
  await page.keyboard.insertText(password());
  await page.keyboard.press('Enter');
  await expect(page.getByRole('navigation', { name: 'Main' }).first()).toBeAttached();
});

test('compliance staff enter a lot without a mouse', async ({ browser }) => {
  const page = await openAs(browser, 'compliance');
  const name = unique('Keyboard lot');
  await page.goto('/lots/new');
  await page.getByLabel('Name', { exact: true }).waitFor();
  await tabTo(page, 'Name');
  await expectFocusSeen(page);
  await page.keyboard.insertText(name);
  await tabTo(page, /^Head/);
  await page.keyboard.insertText('12');
  await page.keyboard.press('Tab');
  // A date is typed month, day, year in this browser's language.
  await page.keyboard.type('02032001');
  await tabTo(page, /^Weight in/);
  await page.keyboard.insertText('300');
  await tabTo(page, 'Weights are', 'combobox');
  await page.keyboard.press('s');
  await tabTo(page, 'Enter the lot', 'button');
  await expectFocusSeen(page);
  await page.keyboard.press('Enter');
  await expect(page.getByRole('heading', { level: 1, name })).toBeVisible();
  await expect(page.getByText('3 February 2001')).toBeVisible();
  await page.context().close();
});

test('an administrator reaches a yard and mends a refused field without a mouse', async ({ browser }) => {
  const page = await openAs(browser, 'administrator');
  await page.goto('/yards');
  await page.getByRole('link', { name: YARD }).press('Enter');
  await page.getByLabel('Advisories go to').waitFor();
  await tabTo(page, 'Advisories go to');
  const address = await page.getByLabel('Advisories go to').inputValue();
  await page.keyboard.press('ControlOrMeta+a');
  await page.keyboard.insertText('office');
  await page.keyboard.press('Enter');
  const summary = page.getByRole('alert').filter({ hasText: 'Enter the e-mail address in full' });
  await expect(summary).toBeFocused();
  await page.keyboard.press('Tab');
  await page.keyboard.press('Enter');
  await expect(page.getByLabel('Advisories go to')).toBeFocused();
  await page.keyboard.press('ControlOrMeta+a');
  await page.keyboard.insertText(address);
  await page.keyboard.press('Enter');
  await expect(page.getByText(`${YARD} is saved.`)).toBeVisible();
  await page.context().close();
});

test('the veterinarian moves through the desk with j and k, and can switch that off', async ({ browser }) => {
  const page = await openAs(browser, 'veterinarian');
  await page.goto('/review-desk');
  const links = page.getByRole('table').getByRole('link');
  await expect(links.first()).toBeVisible();
  await page.keyboard.press('j');
  await expect(links.first()).toBeFocused();
  await page.getByLabel(/Keys j and k/).uncheck();
  await page.getByRole('heading', { level: 1 }).focus();
  await page.keyboard.press('j');
  await expect(links.first()).not.toBeFocused();
  await page.context().close();
});
