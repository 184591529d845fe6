import { type Browser, expect, type Page, test } from '@playwright/test';
import { complaintsOf } from './support/console-watch';
import { baseUrl, password } from './support/environment';
import { addLine, openNewRation, setCattleAndDrink } from './support/nutritionist';
import { openAs, YARD } from './support/people';
import { compositions, create, ownFeedstuff, unique, yardIdOf } from './support/set-up';

/** A ration of corn alone, typed into the sheet by the nutritionist. */
async function rationOfCorn(page: Page, sharePctDm: string): Promise<string> {
  const corn = unique('Corn');
  const name = unique('Trial ration');
  await create(page, '/feedstuffs', ownFeedstuff(corn, compositions.corn));
  await openNewRation(page, name);
  await setCattleAndDrink(page, { intakeKg: '10', litres: '40' });
  await addLine(page, 1, corn, sharePctDm);
  return name;
}

test.describe('a ration that cannot be screened', () => {
  test('shares that do not add to 100 are named with their sum, and what was typed stays', async ({ browser }) => {
    const page = await openAs(browser, 'nutritionist');
    await rationOfCorn(page, '90');
    await page.getByRole('button', { name: 'Screen and keep' }).click();
    await expect(page.getByRole('alert')).toContainText(/add to 90/);
    await expect(page.getByLabel('Share, line 1')).toHaveValue('90');
    await page.getByLabel('Share, line 1').fill('100');
    await page.getByRole('button', { name: 'Screen and keep' }).click();
    await expect(page.getByRole('button', { name: 'Send for review' })).toBeVisible();
    await page.context().close();
  });

  test('a share below 0 is refused at its field, and no figure is made of it', async ({ browser }) => {
    const page = await openAs(browser, 'nutritionist');
    await rationOfCorn(page, '-5');
    await page.getByRole('button', { name: 'Screen and keep' }).click();
    await expect(page.getByLabel('Share, line 1')).toHaveAccessibleDescription(/below 0/);
    await expect(page.getByLabel('Share, line 1')).toHaveValue('-5');
    await page.context().close();
  });

  test('text that is no number is answered in words at its field', async ({ browser }) => {
    const page = await openAs(browser, 'nutritionist');
    await rationOfCorn(page, 'a lot');
    await page.getByRole('button', { name: 'Screen and keep' }).click();
    await expect(page.getByLabel('Share, line 1')).toHaveAccessibleDescription(/is not a number/);
    await page.context().close();
  });
});

test('without a water analysis the sulfur is not determined, which the veterinarian signs for', async ({ browser }) => {
  const page = await openAs(browser, 'nutritionist');
  await rationOfCorn(page, '100');
  await expect(page.getByText('Not determined: total sulfur.')).toBeVisible();
  await page.getByRole('button', { name: 'Screen and keep' }).click();
  await page.getByRole('button', { name: 'Send for review' }).click();
  const dialog = page.getByRole('dialog', { name: 'Send for review' });
  await expect(dialog).toContainText(/veterinarian/);
  await page.context().close();
});

test('a sulfate figure without its species is not taken: the wrong one is a threefold error', async ({ browser }) => {
  const page = await openAs(browser, 'nutritionist');
  const name = unique('Trial well');
  await create(page, '/water-sources', { yardId: await yardIdOf(page, YARD), name });
  await page.goto('/water');
  await page.getByRole('button', { name: `Add an analysis of ${name}` }).click();
  await page.getByLabel('Sampled on').fill('2026-06-12');
  await page.getByLabel('Sulfate, figure').fill('300');
  await page.getByRole('button', { name: 'Enter the analysis' }).click();
  await expect(page.getByLabel('Sulfate, given as')).toHaveAccessibleDescription(/SO4, SO4-S or S/);
  await expect(page.getByLabel('Sulfate, figure')).toHaveValue('300');
  await page.context().close();
});

/** A lot on feed, as compliance staff have entered it. */
async function aLotOnFeed(page: Page): Promise<{ id: string; name: string }> {
  return create(page, '/lots', {
    yardId: await yardIdOf(page, YARD),
    name: unique('Trial lot'),
    head: 50,
    startedOn: '2002-03-04',
    endedOn: null,
    entryWeightKg: 320,
    exitWeightKg: null,
    weightBasis: 'full',
    dryMatterIntakeKgPerDay: null,
    releaseId: null,
  });
}

async function openLotForm(page: Page, lotId: string): Promise<void> {
  await page.goto(`/lots/${lotId}`);
  await page.getByRole('button', { name: 'Change the lot' }).click();
}

test('of two tabs the second to save sees both versions and loses neither', async ({ browser }) => {
  const first = await openAs(browser, 'compliance');
  const lot = await aLotOnFeed(first);
  const second = await first.context().newPage();
  await openLotForm(first, lot.id);
  await openLotForm(second, lot.id);
  await first.getByLabel('Head', { exact: true }).fill('51');
  await first.getByRole('button', { name: 'Save the lot' }).click();
  await expect(first.getByText(/The lot is saved/)).toBeVisible();
  await second.getByLabel('Head', { exact: true }).fill('52');
  await second.getByRole('button', { name: 'Save the lot' }).click();
  await expect(second.getByText('Somebody else has saved the lot since you opened it')).toBeVisible();
  await expect(second.getByRole('row', { name: /^Head/ })).toContainText(/52.*51/);
  await second.getByRole('button', { name: 'Keep mine, to save over it' }).click();
  await second.getByRole('button', { name: 'Save the lot' }).click();
  await expect(second.getByText(/The lot is saved/)).toBeVisible();
  await expect(second.getByText('52 head', { exact: true })).toBeVisible();
  await first.context().close();
});

test('a session that ends while somebody types takes nothing from them', async ({ browser }) => {
  const page = await openAs(browser, 'compliance');
  const lot = await aLotOnFeed(page);
  await openLotForm(page, lot.id);
  await page.getByLabel('Head', { exact: true }).fill('57');
  await page.context().clearCookies();
  await page.getByRole('button', { name: 'Save the lot' }).click();
  const dialog = page.getByRole('dialog', { name: 'Your session has ended' });
  await dialog.getByLabel('Password').fill(password());
  await dialog.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByText(/The lot is saved/)).toBeVisible();
  await expect(page.getByText('57 head', { exact: true })).toBeVisible();
  expect(complaintsOf(page, { refusalsExpected: true })).toEqual([]);
  await page.context().close();
});

test('a role that may not enter lots is told who does, and the server refuses it as well', async ({ browser }) => {
  const page = await openAs(browser, 'yardManager');
  await page.goto('/lots/new');
  await expect(page.getByText('Only compliance staff enter lots')).toBeVisible();
  const refused = await page.request.post('/api/lots', { data: {}, headers: { Origin: new URL(baseUrl()).origin } });
  expect(refused.status()).toBe(403);
  await page.context().close();
});

/** What somebody of another firm gets to see at an address that is not theirs. */
async function expectNothingThere(browser: Browser, address: string, apiPath: string): Promise<void> {
  const page = await openAs(browser, 'nutritionistElsewhere');
  await page.goto(address);
  await expect(page.getByRole('heading', { level: 1, name: 'There is no such page' })).toBeVisible();
  expect((await page.request.get(apiPath)).status()).toBe(404);
  await page.context().close();
}

test('another firm finds nothing at the address of a lot', async ({ browser }) => {
  const page = await openAs(browser, 'compliance');
  const lot = await aLotOnFeed(page);
  await page.context().close();
  await expectNothingThere(browser, `/lots/${lot.id}`, `/api/lots/${lot.id}`);
});

test('a password that is wrong signs nobody in and says no more than that', async ({ page }) => {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail address').fill('nobody@greasewood.example');
  await page.getByLabel('Password').fill('not the right password at all');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('alert')).toBeVisible();
  await expect(page.getByLabel('E-mail address')).toHaveValue('nobody@greasewood.example');
  await expect(page).toHaveURL(/sign-in/);
});
