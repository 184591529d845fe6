import { defineLimit } from './define-limit';

/**
 * Sulfur eaten and drunk in a day, over the dry matter eaten. [% of DM]
 *
 * Water brings sulfur but no dry matter, so salty water raises the result undiluted.
 * A mass balance: it needs no source and holds for any dry matter above zero.
 */
export function totalSulfurPctDm(diet: { feedSulfurPctDm: number; waterSulfurPctDm: number }): number {
  return diet.feedSulfurPctDm + diet.waterSulfurPctDm;
}

/** Sulfur of the dry matter eaten in a day. [kg per head and day] A mass balance. */
export const sulfurIntakeKgPerDay = (dryMatterIntakeKgPerDay: number, sulfurPctDm: number): number =>
  (dryMatterIntakeKgPerDay * sulfurPctDm) / 100;

export const totalSulfur = defineLimit({
  id: 'total-sulfur',
  subject: 'Sulfur of feed and drinking water together',
  needs: { feedSulfurPctDm: 'raises', waterSulfurPctDm: 'raises' },
  measure: totalSulfurPctDm,
  partsFrom: ['feedSulfurPctDm', 'waterSulfurPctDm'],
});
