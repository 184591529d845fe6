import { expect, type APIResponse, type Page } from '@playwright/test';
import { baseUrl } from './environment';

/** A name nobody else has used: tests share a database and never each other's data. */
export const unique = (name: string): string =>
  `${name} ${Date.now().toString(36)}${Math.random().toString(36).slice(2, 5)}`;

interface Made {
  id: string;
  name: string;
  version: number;
}

/** Makes what a test starts from, as the person who is signed in on this page. */
async function made(response: APIResponse): Promise<Made> {
  expect(response.status(), await response.text()).toBe(201);
  return (await response.json()) as Made;
}

export async function create(page: Page, path: string, data: object): Promise<Made> {
  const headers = { Origin: new URL(baseUrl()).origin, 'Idempotency-Key': crypto.randomUUID() };
  return made(await page.request.post(`/api${path}`, { data, headers }));
}

export async function yardIdOf(page: Page, name: string): Promise<string> {
  const { items } = (await (await page.request.get('/api/yards')).json()) as { items: Made[] };
  const yard = items.find((each) => each.name === name);
  if (!yard) throw new Error(`There is no yard ${name}`);
  return yard.id;
}

/** Figures of the tests' own: round, invented, complete, so that every step can be checked by hand. */
export const compositions = {
  corn: {
    dryMatterPctAsFed: 88,
    roughageSharePctDm: 0,
    crudeProteinPctDm: 9,
    npnProteinEquivalentPctDm: 0,
    ureaPctDm: 0,
    fatPctDm: 4,
    addedFatPctDm: 0,
    solublesFatPctDm: 0,
    sulfurPctDm: 0.14,
    phosphorusPctDm: 0.3,
    calciumPctDm: 0.03,
    potassiumPctDm: 0.4,
  },
  silage: {
    dryMatterPctAsFed: 35,
    roughageSharePctDm: 50,
    crudeProteinPctDm: 8,
    npnProteinEquivalentPctDm: 0,
    ureaPctDm: 0,
    fatPctDm: 3,
    addedFatPctDm: 0,
    solublesFatPctDm: 0,
    sulfurPctDm: 0.12,
    phosphorusPctDm: 0.22,
    calciumPctDm: 0.25,
    potassiumPctDm: 1.1,
  },
} as const;

export const ownFeedstuff = (name: string, analysed: object) => ({
  name,
  bookFeedstuffId: null,
  analysedOn: '2026-06-20',
  laboratory: 'Test laboratory',
  note: null,
  analysed,
});
