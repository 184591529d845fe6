import { expect, type Page } from '@playwright/test';
import { YARD } from './people';

/** A load of wet distillers grains as its laboratory sheet says. */
export const grainsAsAnalysed: readonly [box: string, typed: string][] = [
  ['Dry matter, % as fed', '32'],
  ['Roughage share, % of DM', '0'],
  ['Crude protein, % of DM', '30'],
  ['NPN, as protein equivalent, % of DM', '0'],
  ['Urea, % of DM', '0'],
  ['Fat, % of DM', '10'],
  ['Fat added as fat or oil, % of DM', '0'],
  ['Fat from solubles fed as such, % of DM', '0'],
  // As a laboratory of another country prints it.
  ['Sulfur, % of DM', '0,70'],
  ['Phosphorus, % of DM', '0.80'],
  ['Calcium, % of DM', '0.05'],
  ['Potassium, % of DM', '1.0'],
];

export async function enterFeedstuff(page: Page, name: string): Promise<void> {
  await page.goto('/feedstuffs/new');
  await page.getByLabel('Name', { exact: true }).fill(name);
  await page.getByLabel('Analysed on').fill('2026-06-20');
  for (const [box, typed] of grainsAsAnalysed) {
    // The unit is read after the label, with or without a space between.
    await page.getByRole('textbox', { name: new RegExp(`^${box.replace(/, (?=%)/, ' ?, ')}$`) }).fill(typed);
  }
  await page.getByRole('button', { name: 'Save the feedstuff' }).click();
  await expect(page.getByRole('heading', { level: 1, name })).toBeVisible();
}

export async function enterWater(page: Page, name: string, sulfateMgPerL: string): Promise<void> {
  await page.goto('/water');
  await page.getByRole('button', { name: 'Add a water' }).click();
  const dialog = page.getByRole('dialog', { name: 'Add a water' });
  await dialog.getByLabel('Yard of the water').selectOption({ label: YARD });
  await dialog.getByLabel('Name of the water').fill(name);
  await dialog.getByRole('button', { name: 'Add the water' }).click();
  await page.getByRole('button', { name: `Add an analysis of ${name}` }).click();
  await page.getByLabel('Sampled on').fill('2026-06-12');
  await page.getByLabel('Sulfate, figure').fill(sulfateMgPerL);
  await page.getByLabel('Sulfate, given as').selectOption('SO4');
  await page.getByRole('button', { name: 'Enter the analysis' }).click();
  await expect(page.getByRole('table', { name: `Analyses of ${name}, newest first` })).toBeVisible();
}

export async function openNewRation(page: Page, name: string, yard: string = YARD): Promise<void> {
  await page.goto('/rations/new');
  await page.getByLabel('Yard', { exact: true }).selectOption({ label: yard });
  await page.getByLabel('Name', { exact: true }).fill(name);
  await page.getByLabel('Stage of the cattle').selectOption({ label: 'Finishing' });
  await page.getByRole('button', { name: 'Open the ration' }).click();
  await expect(page.getByRole('heading', { level: 1, name })).toBeVisible();
}

/** One line of the sheet, by keyboard: a part of the name, Enter, the share. */
export async function addLine(page: Page, line: number, feedstuff: string, sharePctDm: string): Promise<void> {
  await page.getByRole('button', { name: 'Add a feedstuff' }).click();
  const box = page.getByRole('combobox', { name: `Feedstuff, line ${line}` });
  await box.fill(feedstuff);
  await expect(page.getByRole('option', { name: feedstuff })).toBeVisible();
  await box.press('Enter');
  await page.getByLabel(`Share, line ${line}`).fill(sharePctDm);
}

export async function addWater(page: Page, water: string): Promise<void> {
  await page.getByRole('button', { name: 'Add a water' }).click();
  const choices = page.getByLabel('Water analysis, water 1');
  const value = await choices.locator('option', { hasText: water }).getAttribute('value');
  await choices.selectOption(value);
}

export async function setCattleAndDrink(
  page: Page,
  { intakeKg, litres }: { intakeKg: string; litres: string },
): Promise<void> {
  await page.getByLabel('Body weight').fill('454');
  await page.getByRole('textbox', { name: 'Dry matter intake' }).fill(intakeKg);
  await page.getByLabel('Water intake').selectOption('metered');
  await page.getByLabel('Drinking water').fill(litres);
}
