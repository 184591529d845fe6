import { expect, type Page, test } from '@playwright/test';
import { overflowOf, violationsOf } from './support/accessibility';
import { complaintsOf } from './support/console-watch';
import { openAs, type Person } from './support/people';

/** Every address of the product, by a person who may read it; those with an id take the first that the list answers with. */
const places: Readonly<Partial<Record<Person, readonly string[]>>> = {
  nutritionist: [
    '/',
    '/rations',
    '/rations/new',
    '/rations/{rations}',
    '/rations/{rations}/release',
    '/screenings/{screenings}',
    '/feedstuffs',
    '/feedstuffs/new',
    '/feedstuffs/{feedstuffs}',
    '/water',
    '/advisories',
    '/advisories/{advisories}',
    '/sources',
    '/no-such-page',
  ],
  veterinarian: ['/', '/review-desk', '/review-desk/{reviews}'],
  compliance: ['/', '/lots', '/lots/new', '/lots/{lots}', '/ledger', '/review-desk/{reviews}'],
  yardManager: ['/', '/advisories/{advisories}'],
  administrator: ['/', '/yards', '/yards/{yards}', '/people', '/audit'],
};

async function firstIdOf(page: Page, list: string): Promise<string> {
  if (list === 'screenings') return screeningIdOf(page);
  const { items } = (await (await page.request.get(`/api/${list}`)).json()) as { items: { id: string }[] };
  const [first] = items;
  if (!first) throw new Error(`The demo has nothing under ${list}`);
  return first.id;
}

async function screeningIdOf(page: Page): Promise<string> {
  const { items } = (await (await page.request.get('/api/releases')).json()) as { items: { screeningId: string }[] };
  const [first] = items;
  if (!first) throw new Error('The demo has released nothing');
  return first.screeningId;
}

/** An address with its ids filled in, `{lots}` by the first lot. */
async function addressOf(page: Page, place: string): Promise<string> {
  const list = /\{(.+)\}/.exec(place)?.[1];
  return list ? place.replace(`{${list}}`, await firstIdOf(page, list)) : place;
}

async function arrive(page: Page, address: string): Promise<void> {
  await page.goto(address);
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
  await page.waitForLoadState('networkidle');
}

for (const [person, addresses] of Object.entries(places) as [Person, readonly string[]][]) {
  for (const colorScheme of ['light', 'dark'] as const) {
    test(`what the ${person} reads has no accessibility fault axe can find, ${colorScheme}, at 360 and 1280 px`, async ({
      browser,
    }) => {
      const page = await openAs(browser, person);
      await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' });
      for (const place of addresses) {
        const address = await addressOf(page, place);
        for (const width of [360, 1280]) {
          await page.setViewportSize({ width, height: 800 });
          await arrive(page, address);
          expect.soft(await violationsOf(page), `${place} at ${width} px`).toEqual([]);
        }
      }
      await page.context().close();
    });
  }

  test(`what the ${person} reads fits 320 and 360 px, and leaves the console clean`, async ({ browser }) => {
    const page = await openAs(browser, person);
    for (const place of addresses) {
      const address = await addressOf(page, place);
      for (const width of [320, 360]) {
        await page.setViewportSize({ width, height: 800 });
        await arrive(page, address);
        expect.soft(await overflowOf(page), `${place} at ${width} px`).toBeLessThanOrEqual(0);
      }
    }
    expect(complaintsOf(page)).toEqual([]);
    await page.context().close();
  });
}

test('the sign-in page has no accessibility fault axe can find', async ({ page }) => {
  for (const colorScheme of ['light', 'dark'] as const) {
    await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' });
    for (const width of [360, 1280]) {
      await page.setViewportSize({ width, height: 800 });
      await arrive(page, '/sign-in');
      expect.soft(await violationsOf(page), `${colorScheme} at ${width} px`).toEqual([]);
    }
  }
});
