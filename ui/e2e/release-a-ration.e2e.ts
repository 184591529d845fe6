import { readFile } from 'node:fs/promises';
import { type Browser, expect, test, type Page } from '@playwright/test';
import { parse } from 'csv-parse/sync';
import { complaintsOf } from './support/console-watch';
import { password } from './support/environment';
import { theMail } from './support/mails';
import {
  addLine,
  addWater,
  enterFeedstuff,
  enterWater,
  openNewRation,
  setCattleAndDrink,
} from './support/nutritionist';
import { openAs, people, YARD, YARD_ADDRESS } from './support/people';
import { compositions, create, ownFeedstuff, unique } from './support/set-up';

/**
 * What the story feeds, in figures that can be checked by hand (dry matter basis):
 * corn 60 %, silage 10 %, wet distillers grains 30 %.
 * Sulfur of the feed: 0.60 × 0.14 + 0.10 × 0.12 + 0.30 × 0.70 = 0.084 + 0.012 + 0.210 = 0.306 %.
 * Water: 40 L × 900 mg/L = 36 g sulfate = 12.02 g sulfur (× 0.3338) in 10 kg of dry matter = 0.120 %.
 * Together 0.426 %: above the class maximum of 0.30 and above 0.40, so the veterinarian signs.
 */
const story = {
  ration: unique('Story finisher'),
  corn: unique('Story corn'),
  silage: unique('Story silage'),
  grains: unique('Story wet grains'),
  water: unique('Story well'),
  lot: unique('Story lot'),
  reason: 'The other well is under repair until Thursday, and the pens are looked at twice a day.',
  condition: 'Look at the pens twice a day and go back to the other well on Thursday',
};

test('a ration goes from its first line to the audit trail, through all five roles', async ({ browser }) => {
  await test.step('the administrator lets compliance staff sign at the yard', () => setComplianceGate(browser));
  await test.step('the nutritionist enters, screens and sends it for review', () => sendForReview(browser));
  await test.step('the veterinarian concurs with conditions and signs', () => signAsVeterinarian(browser));
  await test.step('compliance staff sign', () => signAsCompliance(browser));
  await test.step('the nutritionist releases it', () => release(browser));
  await test.step('the yard is mailed what to feed and what to watch for', () => readMail());
  await test.step('the yard manager acknowledges the advisory', () => acknowledge(browser));
  await test.step('compliance staff enter a lot and export the ledger', () => exportLedger(browser));
  await test.step('the administrator finds all of it in the audit trail', () => readAuditTrail(browser));
});

/** Does what a person does, then closes their browser; nothing may have gone wrong in it unseen. */
async function as(browser: Browser, person: keyof typeof people, act: (page: Page) => Promise<void>): Promise<void> {
  const page = await openAs(browser, person);
  await act(page);
  expect(complaintsOf(page)).toEqual([]);
  await page.context().close();
}

const setComplianceGate = (browser: Browser) =>
  as(browser, 'administrator', async (page) => {
    await page.getByRole('link', { name: 'Yards' }).click();
    await page.getByRole('link', { name: YARD }).click();
    const gate = page.getByLabel('Compliance staff sign every version before release');
    await gate.focus();
    if (!(await gate.isChecked())) await page.keyboard.press('Space');
    await page.getByRole('button', { name: 'Save the yard' }).press('Enter');
    await expect(page.getByText(`${YARD} is saved.`)).toBeVisible();
    await page.reload();
    await expect(gate).toBeChecked();
  });

const sendForReview = (browser: Browser) =>
  as(browser, 'nutritionist', async (page) => {
    await create(page, '/feedstuffs', ownFeedstuff(story.corn, compositions.corn));
    await create(page, '/feedstuffs', ownFeedstuff(story.silage, compositions.silage));
    await enterFeedstuff(page, story.grains);
    await enterWater(page, story.water, '900');
    await openNewRation(page, story.ration);
    await setCattleAndDrink(page, { intakeKg: '10', litres: '40' });
    await addLine(page, 1, story.corn, '60');
    await addLine(page, 2, story.silage, '10');
    await addLine(page, 3, story.grains, '30');
    await addWater(page, story.water);
    // The findings follow the typing; nobody has asked the server yet.
    await expect(page.getByText(/Over on total sulfur: 0\.43.% of DM, limit 0\.30/)).toBeVisible();
    await page.getByRole('button', { name: 'Screen and keep' }).click();
    await page.getByRole('button', { name: 'Send for review' }).click();
    await expect(page.getByText('Above 0.40 the veterinarian signs.')).toBeVisible();
    const dialog = page.getByRole('dialog', { name: 'Send for review' });
    await dialog.getByLabel('Why it should be fed all the same').fill(story.reason);
    await dialog.getByRole('button', { name: 'Send for review' }).click();
    const standing = page.getByText(/^In review: it waits for/);
    await expect(standing).toContainText('the veterinarian');
    await expect(standing).toContainText('compliance staff');
  });

/** Opens the review from the desk, as somebody who sits down to their queue. */
async function openReview(page: Page): Promise<void> {
  await page.getByRole('link', { name: 'Review desk' }).first().click();
  await page
    .getByRole('table', { name: /^Reviews/ })
    .getByRole('link', { name: story.ration })
    .click();
  await expect(page.getByRole('heading', { level: 1, name: `${story.ration}, ${YARD}` })).toBeVisible();
  await expect(page.getByText(story.reason)).toBeVisible();
}

const signAsVeterinarian = (browser: Browser) =>
  as(browser, 'veterinarian', async (page) => {
    await openReview(page);
    await expect(page.getByText(/Over on total sulfur: 0\.43.% of DM, limit 0\.30/)).toBeVisible();
    // The decision by keyboard alone, from the first choice to the signature.
    await page.getByRole('radio', { name: 'Concur', exact: true }).focus();
    await page.keyboard.press('Space');
    await page.keyboard.press('ArrowDown');
    await expect(page.getByRole('radio', { name: 'Concur with conditions' })).toBeChecked();
    await page.keyboard.press('Tab');
    await page.keyboard.press('Enter');
    // A new condition takes the focus.
    await expect(page.getByRole('textbox', { name: 'Condition 1' })).toBeFocused();
    await page.keyboard.insertText(story.condition);
    await expect(
      page.getByText(/^Signs as Rosa Villasana DVM, Licence .*veterinarian, .*for exactly this content: [0-9a-f]{4} /),
    ).toBeVisible();
    await page.getByLabel('Password, to sign').focus();
    await page.keyboard.insertText(password());
    await page.keyboard.press('Enter');
    await expect(page.getByText(/concurred with conditions\./)).toBeVisible();
    await expect(page.getByText(/It waits for: compliance staff\./)).toBeVisible();
    await expect(page.getByRole('button', { name: 'Sign', exact: true })).toHaveCount(0);
  });

const signAsCompliance = (browser: Browser) =>
  as(browser, 'compliance', async (page) => {
    await openReview(page);
    await expect(page.getByText(story.condition)).toBeVisible();
    await page.getByRole('radio', { name: 'Concur', exact: true }).check();
    await page.getByLabel('Password, to sign').fill(password());
    await page.getByRole('button', { name: 'Sign', exact: true }).click();
    await expect(page.getByText('Everything that the review desk signs is signed.', { exact: false })).toBeVisible();
  });

const release = (browser: Browser) =>
  as(browser, 'nutritionist', async (page) => {
    await page.getByRole('link', { name: 'Rations' }).first().click();
    await page.getByRole('table').getByRole('link', { name: story.ration }).click();
    await page.getByRole('link', { name: 'Go to release' }).click();
    const mail = page.frameLocator('iframe').first();
    await expect(mail.getByText(story.condition).first()).toBeVisible();
    await page.getByRole('button', { name: 'Release', exact: true }).click();
    await expect(page.getByText('Released: this version is fed.')).toBeVisible();
  });

async function readMail(): Promise<void> {
  const mail = await theMail(YARD_ADDRESS, story.ration);
  const text = (mail.text ?? '').replaceAll(/\s+/g, ' ');
  const html = mail.html === false ? '' : mail.html;
  for (const part of [text, html.replaceAll(/<[^>]+>/g, ' ').replaceAll(/\s+/g, ' ')]) {
    for (const feedstuff of [story.corn, story.silage, story.grains]) expect(part).toContain(feedstuff);
    expect(part).toContain(story.water);
    expect(part).toContain(story.condition);
    expect(part).toContain(people.veterinarian.name);
    expect(part).toMatch(/polioencephalomalacia/i);
    expect(part).toMatch(/herd.s veterinarian/i);
    expect(part).toMatch(/nutrient-management rules/i);
    expect(part).not.toMatch(/\bsafe\b/i);
  }
  // 60 % of 10 kg is 6 kg of dry matter; at 88 % dry matter 6.8 kg as fed.
  expect(text).toContain(`${story.corn}: 6.8 kg as fed (60 % of dry matter)`);
  expect(text).toContain('Value 0.43 % of DM, limit 0.3 % of DM');
}

const acknowledge = (browser: Browser) =>
  as(browser, 'yardManager', async (page) => {
    await page.setViewportSize({ width: 360, height: 740 });
    await page.getByRole('button', { name: 'Menu' }).click();
    await page.getByRole('link', { name: 'Advisories' }).click();
    await page
      .getByRole('table', { name: /^Advisories/ })
      .getByRole('link', { name: new RegExp(story.ration) })
      .click();
    await expect(page.getByText('Sent', { exact: true }).first()).toBeVisible();
    // The mail is read on a phone: nothing of it lies beyond the right edge.
    const mail = page.frameLocator('iframe').locator('html');
    expect(await mail.evaluate((html) => html.scrollWidth - html.clientWidth)).toBeLessThanOrEqual(0);
    await page.getByRole('button', { name: 'Acknowledge' }).click();
    await expect(page.getByText(/^Acknowledged by Wade Tillery/)).toBeVisible();
  });

/**
 * 100 head, 340 to 580 kg (full) in 150 days (10 January to 9 June), 10 kg of dry matter a head and day: 1,500 kg DM.
 * Crude protein: 0.60 × 9 + 0.10 × 8 + 0.30 × 30 = 15.2 %; nitrogen eaten 1,500 × 0.152 / 6.25 = 36.48 kg a head.
 * Phosphorus: 0.60 × 0.30 + 0.10 × 0.22 + 0.30 × 0.80 = 0.442 %; eaten 1,500 × 0.00442 = 6.63 kg a head.
 * Kept in the body: X = 150 × 460^0.75 × (478 / (0.96 × 580))^0.75 × (240 / 150)^1.097 = 22,252.3;
 *   nitrogen (41.2 × 240 − 0.243 × X) / 1000 = 4.4807 kg, phosphorus (10.0 × 240 − 0.0592 × X) / 1000 = 1.0827 kg.
 * Excreted a head: nitrogen 36.48 − 4.4807 = 31.9993 kg, phosphorus 6.63 − 1.0827 = 5.5473 kg; the lot hundredfold.
 */
const expected: readonly [column: string, value: number][] = [
  ['Head', 100],
  ['Days on feed', 150],
  ['N intake, kg per head', 36.48],
  ['N retained, kg per head', 4.4807],
  ['N excreted, kg per head', 31.9993],
  ['N excreted, kg whole lot', 3199.93],
  ['P intake, kg per head', 6.63],
  ['P excreted, kg per head', 5.5473],
  ['P excreted, kg whole lot', 554.73],
];

const exportLedger = (browser: Browser) =>
  as(browser, 'compliance', async (page) => {
    await enterLot(page);
    // Long before the demo's own lots, so that only the story's stand in the period.
    await page.goto('/ledger?from=2001-01-01&to=2001-12-31');
    await expect(
      page.getByText(/Nitrogen excreted .*31\.999 kg a head|Nitrogen excreted .*32\.0.kg a head/),
    ).toBeVisible();
    const downloading = page.waitForEvent('download');
    await page.getByRole('link', { name: 'Export CSV' }).click();
    const file = await readFile(await (await downloading).path(), 'utf8');
    expect(file.startsWith('\uFEFF')).toBe(true);
    const rows = parse(file, { bom: true, relax_column_count: true, skip_empty_lines: true });
    const headings = rows.find((row) => row.includes('Lot') && row.includes('Head'));
    const lot = rows.find((row) => row.includes(story.lot));
    const figure = (column: string) => Number(lot?.[headings?.indexOf(column) ?? -1]);
    for (const [column, value] of expected) {
      expect(figure(column), column).toBeCloseTo(value, value > 100 ? 1 : 3);
    }
    expect(rows.flat().join(' ')).toContain('Estimate, not analysis');
    expect(rows.flat()).toContain(YARD);
  });

async function enterLot(page: Page): Promise<void> {
  await page.getByRole('link', { name: 'Lots' }).first().click();
  await page.getByRole('link', { name: 'Enter a lot' }).click();
  await page.getByLabel('Name', { exact: true }).fill(story.lot);
  await page.getByLabel('Head', { exact: true }).fill('100');
  await page.getByLabel('First day on feed').fill('2001-01-10');
  await page.getByLabel('Last day on feed').fill('2001-06-09');
  await page.getByLabel('Weight in').fill('340');
  await page.getByLabel('Weight out').fill('580');
  await page.getByLabel('Weights are').selectOption({ label: 'Full, as on the scale' });
  await page.getByLabel('Dry matter eaten').fill('10');
  const releases = page.getByLabel('Ration fed');
  const choice = releases.locator('option', { hasText: story.ration });
  await expect(choice).toBeAttached();
  await releases.selectOption(await choice.getAttribute('value'));
  await page.getByRole('button', { name: 'Enter the lot' }).click();
  await expect(page.getByRole('heading', { level: 1, name: story.lot })).toBeVisible();
  await expect(page.getByRole('row', { name: /^Nitrogen 36\.48 .*4\.48 .*32\.00/ })).toBeVisible();
}

const readAuditTrail = (browser: Browser) =>
  as(browser, 'administrator', async (page) => {
    await page.getByRole('link', { name: 'Audit' }).first().click();
    const acts: readonly [person: string, subject: string, act: RegExp][] = [
      [people.compliance.name, story.lot, /entered|added|saved|lot/i],
      [people.yardManager.name, story.ration, /acknowledged/i],
      [people.nutritionist.name, story.ration, /released/i],
      [people.compliance.name, story.ration, /concur|signed/i],
      [people.veterinarian.name, story.ration, /concur|signed/i],
      [people.nutritionist.name, story.ration, /review/i],
    ];
    for (const [person, subject, act] of acts) {
      const entry = page
        .getByRole('listitem')
        .filter({ hasText: person })
        .filter({ hasText: subject })
        .filter({ hasText: act });
      await expect(entry.first()).toBeVisible();
    }
  });
