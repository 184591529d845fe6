import { expect, type Browser, type Page } from '@playwright/test';
import { watchConsole } from './console-watch';
import { password } from './environment';

/** Demo people to sign in as; what they have made is never asserted on. */
export const people = {
  nutritionist: { email: 'nora@greasewood.example', name: 'Nora Aldous' },
  veterinarian: { email: 'rosa@greasewood.example', name: 'Rosa Villasana DVM' },
  compliance: { email: 'jonah@greasewood.example', name: 'Jonah Ferris' },
  yardManager: { email: 'wade@greasewood.example', name: 'Wade Tillery' },
  administrator: { email: 'ingrid@greasewood.example', name: 'Ingrid Mosely' },
  nutritionistElsewhere: { email: 'petra@saltgrass.example', name: 'Petra Lundgren' },
} as const;

export type Person = keyof typeof people;

/** The yard that all of them but the last work at; the veterinarian serves yards of another firm as well. */
export const YARD = 'Tamarack Draw';
export const YARD_ADDRESS = 'office@tamarack-draw.example';
export const FIRM = 'Greasewood Ration Works';

export async function signIn(page: Page, person: Person): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail address').fill(people[person].email);
  await page.getByLabel('Password').fill(password());
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('navigation', { name: 'Main' }).first()).toBeAttached();
  await expect(page).not.toHaveURL(/sign-in/);
}

/** A browser of one's own for each person, watched for what goes wrong in it. */
export async function openAs(browser: Browser, person: Person): Promise<Page> {
  const context = await browser.newContext();
  const page = await context.newPage();
  watchConsole(page);
  await signIn(page, person);
  return page;
}
