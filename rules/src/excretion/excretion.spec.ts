import { describe, expect, it } from 'vitest';
import type { LotView } from '../lots/lot.schema';
import { screen } from '../screenings/screen';
import { aLine, aLot, aRequest } from '../testing';
import { excretionSummary, NOT_DETERMINED, summaryColumns } from './excretion-summary';
import { lotExcretion } from './lot-excretion';

describe('excretion of a lot', () => {
  it('keeps nothing back: eaten is kept and excreted', () => {
    const { perHead } = lotExcretion(aLot());
    for (const { intakeKg, retainedKg, excretedKg } of Object.values(perHead)) {
      expect((retainedKg ?? Number.NaN) + (excretedKg ?? Number.NaN)).toBeCloseTo(intakeKg ?? Number.NaN, 12);
    }
  });

  it('finds about 25 kg nitrogen and 3.2 kg phosphorus for the average steer', () => {
    // eaten: 8.84 × 153 × 13.3 % ÷ 6.25 = 28.78 kg N and 8.84 × 153 × 0.31 % = 4.193 kg P
    // X = 153 × 446^0.75 × (478 ÷ (0.96 × 554))^0.75 × (216 ÷ 153)^1.097 = 20,008; N kept = (41.2 × 216 − 0.243 X) ÷ 1000
    const { perHead } = lotExcretion(aLot());
    expect(perHead.nitrogen.intakeKg).toBeCloseTo(28.78, 2);
    expect(perHead.nitrogen.excretedKg).toBeCloseTo(24.74, 2);
    expect(perHead.phosphorus.excretedKg).toBeCloseTo(3.217, 2);
  });

  it('leaves a tenth of the potassium in the animal', () => {
    const { potassium } = lotExcretion(aLot()).perHead;
    expect(potassium.retainedKg).toBeCloseTo((potassium.intakeKg ?? 0) / 10, 12);
  });

  it('multiplies by the head of the lot', () => {
    const { perHead, wholeLot } = lotExcretion(aLot({ head: 137 }));
    expect(wholeLot.nitrogen.excretedKg).toBeCloseTo((perHead.nitrogen.excretedKg ?? 0) * 137, 9);
  });

  it('makes live weights of shrunk ones first, and shows the step', () => {
    const shrunk = lotExcretion(aLot({ weightBasis: 'shrunk', entryWeightKg: 338 * 0.96, exitWeightKg: 554 * 0.96 }));
    expect(shrunk.perHead.nitrogen.excretedKg).toBeCloseTo(lotExcretion(aLot()).perHead.nitrogen.excretedKg ?? 0, 9);
    expect(shrunk.steps.map(({ id }) => id).slice(0, 2)).toEqual(['live-entry-weight', 'live-exit-weight']);
    expect(shrunk.steps[0]).toMatchObject({ formula: 'shrunk entry weight ÷ 0.96', sourceId: 'arkansas-mp391' });
  });

  it('shows every step with its source and status', () => {
    const { steps } = lotExcretion(aLot());
    expect(steps.map(({ id }) => id)).toEqual([
      'gain',
      'x',
      'dry-matter',
      'nitrogen-eaten',
      'nitrogen-retained',
      'nitrogen-excreted',
      'phosphorus-eaten',
      'phosphorus-retained',
      'phosphorus-excreted',
      'potassium-eaten',
      'potassium-retained',
      'potassium-excreted',
    ]);
    expect(steps.find(({ id }) => id === 'nitrogen-retained')).toMatchObject({
      formula: '(41.2 × gain − 0.243 × X) ÷ 1000',
      sourceId: 'asabe-d384-2-2005',
      status: 'memory',
    });
  });

  it.each([
    ['no exit weight', { exitWeightKg: null }, /exit weight is not known/],
    ['no end', { daysOnFeed: null }, /days on feed are not known/],
    ['no days', { daysOnFeed: 0 }, /at least one day/],
    ['no gain', { exitWeightKg: 338 }, /did not gain/],
    ['a loss', { exitWeightKg: 300 }, /did not gain/],
    ['no intake', { dryMatterIntakeKgPerDay: null }, /dry matter eaten is not known/],
    ['no ration', { rationFed: null }, /Which ration was fed/],
    [
      'no crude protein',
      { rationFed: { crudeProteinPctDm: null, phosphorusPctDm: 0.3, potassiumPctDm: 0.7 } },
      /crude protein of the ration/,
    ],
  ])('is not determined with %s, and says why', (_what, overrides, reason) => {
    const { perHead, wholeLot, reasons } = lotExcretion(aLot(overrides));
    expect(perHead.nitrogen.excretedKg).toBeNull();
    expect(wholeLot.nitrogen.excretedKg).toBeNull();
    expect(reasons.join(' ')).toMatch(reason);
  });
});

describe('excretion of a ration', () => {
  const finished = {
    stage: 'finishing' as const,
    bodyWeightKg: 450,
    dryMatterIntakeKgPerDay: 8.84,
    entryWeightKg: 338,
    exitWeightKg: 554,
    daysOnFeed: 153,
  };
  const lines = [aLine('mix', 100, { crudeProteinPctDm: 13.3, phosphorusPctDm: 0.31 })];

  it('agrees with the excretion of a lot of the same cattle', () => {
    const { perFinishedHead } = screen(aRequest({ cattle: finished, lines })).excretion;
    const { perHead } = lotExcretion(aLot());
    expect(perFinishedHead?.nitrogenExcretedKg).toBeCloseTo(perHead.nitrogen.excretedKg ?? 0, 12);
    expect(perFinishedHead?.phosphorusExcretedKg).toBeCloseTo(perHead.phosphorus.excretedKg ?? 0, 12);
  });

  it('of a day is that of the finished head over its days', () => {
    const { perHeadPerDay, perFinishedHead } = screen(aRequest({ cattle: finished, lines })).excretion;
    expect((perHeadPerDay?.nitrogenG ?? 0) * 153).toBeCloseTo((perFinishedHead?.nitrogenExcretedKg ?? 0) * 1000, 6);
  });

  it('of a dry cow is all she eats of nitrogen and phosphorus', () => {
    // 11 kg × 13.3 % ÷ 6.25 = 234 g
    const cow = { stage: 'cow-dry' as const, bodyWeightKg: 550, dryMatterIntakeKgPerDay: 11 };
    expect(screen(aRequest({ cattle: cow, lines })).excretion.perHeadPerDay?.nitrogenG).toBeCloseTo(234.1, 1);
  });

  it('does not guess what milk or growth keep', () => {
    const cow = { stage: 'cow-lactating' as const, bodyWeightKg: 550, dryMatterIntakeKgPerDay: 13 };
    const { perHeadPerDay, perFinishedHead } = screen(aRequest({ cattle: cow, lines })).excretion;
    expect(perHeadPerDay).toMatchObject({ nitrogenG: null, phosphorusG: null });
    expect(perFinishedHead).toBeNull();
  });
});

describe('the excretion summary', () => {
  const lot = (overrides: Partial<LotView> = {}): LotView => ({
    id: '5f2f7f0e-5f6c-4a39-9d0e-0d6f1f6c7a03',
    yard: { id: 'y', name: 'East yard' },
    name: 'Lot 12',
    head: 100,
    startedOn: '2026-05-01',
    endedOn: '2026-10-01',
    daysOnFeed: 153,
    entryWeightKg: 338,
    exitWeightKg: 554,
    weightBasis: 'full',
    dryMatterIntakeKgPerDay: 8.84,
    release: null,
    excretion: lotExcretion(aLot()),
    rulesVersion: '1.0.0',
    edition: '2026-12',
    version: 1,
    ...overrides,
  });

  it('has a unit in every heading of a figure, and as many cells as headings', () => {
    const { titles, rows } = excretionSummary([lot()]);
    expect(rows[0]).toHaveLength(titles.length);
    const figures = summaryColumns.filter(({ key }) => key.endsWith('Kg')).map(({ title }) => title);
    expect(figures).toHaveLength(20);
    expect(figures.filter((title) => !title.includes('kg'))).toEqual([]);
  });

  it('writes what is null as not determined and never as zero', () => {
    const open = lot({ exitWeightKg: null, excretion: lotExcretion(aLot({ exitWeightKg: null })) });
    const { titles, rows } = excretionSummary([open]);
    expect(rows[0]?.[titles.indexOf('N excreted, kg per head')]).toBe(NOT_DETERMINED);
    expect(rows[0]?.[titles.indexOf('Exit weight, kg')]).toBe(NOT_DETERMINED);
  });

  it('names the documents and editions for the footer', () => {
    const { sourceIds, editions } = excretionSummary([lot(), lot()]);
    expect(sourceIds).toContain('asabe-d384-2-2005');
    expect(editions).toEqual(['2026-12']);
  });
});
