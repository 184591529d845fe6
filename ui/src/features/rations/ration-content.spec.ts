import { describe, expect, it } from 'vitest';
import { aDraft } from '../../../test/builders/rations';
import { contentFromValues, draftFromValues, sharesAddUp, typedSum } from './ration-content';
import { type RationValues, rationValues } from './ration-values';

const values = (overrides: Partial<RationValues> = {}): RationValues => ({
  ...rationValues('Finisher 9', aDraft()),
  ...overrides,
});

const faultsOf = (form: RationValues): Record<string, string> => {
  const content = contentFromValues(form);
  return content.isValid ? {} : Object.fromEntries(content.faults.map(({ path, message }) => [path, message]));
};

describe('the form as content', () => {
  it('gives back the draft it was filled from', () => {
    const draft = draftFromValues(values());
    expect(draft.isValid && draft.output.draft).toEqual(aDraft());
  });

  it.each([
    { litresPerDay: 40, spread: 5 },
    { model: 'nrc-winchester-morris-table', temperatureC: 32, cattleClass: 'finishing' },
    { model: 'arias-mader-2011-1', solarRadiationWPerM2: 250, minimumTemperatureC: 14 },
    { model: 'arias-mader-2011-2', solarRadiationWPerM2: 250, temperatureHumidityIndex: 71 },
    null,
  ] as const)('keeps the water intake %j', (waterIntake) => {
    const content = contentFromValues(rationValues('Finisher 9', aDraft({ waterIntake })));
    expect(content.isValid && content.output.waterIntake).toEqual(waterIntake);
  });

  it('reads a decimal comma', () => {
    const lines = [
      { feedstuffId: 'corn', sharePctDm: '89,5' },
      { feedstuffId: 'straw', sharePctDm: '10.5' },
    ];
    const content = contentFromValues(values({ lines }));
    expect(content.isValid && content.output.lines.map((line) => line.sharePctDm)).toEqual([89.5, 10.5]);
  });

  it('leaves an empty box absent, never zero', () => {
    const form = values();
    form.cattle.dryMatterIntakeKgPerDay = '';
    const content = contentFromValues(form);
    expect(content.isValid && content.output.cattle.dryMatterIntakeKgPerDay).toBeUndefined();
  });

  it('names every gap at its own field, all at once', () => {
    const form = values({
      lines: [{ feedstuffId: '', sharePctDm: '' }],
      waterIntake: { ...values().waterIntake, litresPerDay: '' },
    });
    form.cattle.stage = '';
    form.cattle.bodyWeightKg = '';
    expect(Object.keys(faultsOf(form)).sort()).toEqual([
      'cattle.bodyWeightKg',
      'cattle.stage',
      'lines',
      'lines.0.feedstuffId',
      'lines.0.sharePctDm',
      'waterIntake.litresPerDay',
    ]);
  });

  it('says of text that it is no number', () => {
    const form = values();
    form.cattle.bodyWeightKg = 'heavy';
    expect(faultsOf(form)['cattle.bodyWeightKg']).toContain('“heavy” is not a number');
  });

  it.each([
    ['-5', 'A share cannot be below 0'],
    ['150', 'A share cannot be above 100'],
  ])('refuses a share of %s', (sharePctDm, message) => {
    const lines = [{ feedstuffId: 'corn', sharePctDm }];
    expect(faultsOf(values({ lines }))['lines.0.sharePctDm']).toBe(message);
  });

  it('says what shares add to when they miss 100', () => {
    const lines = [
      { feedstuffId: 'corn', sharePctDm: '90' },
      { feedstuffId: 'straw', sharePctDm: '9.5' },
    ];
    expect(faultsOf(values({ lines })).lines).toBe('Shares add to 99.5, not 100');
  });
});

describe('the form as a draft', () => {
  it('may lack anything', () => {
    const empty = rationValues('Finisher 9', { cattle: {}, lines: [], waters: [], waterIntake: null });
    expect(draftFromValues(empty).isValid).toBe(true);
  });

  it('keeps a line that has no share yet', () => {
    const draft = draftFromValues(values({ lines: [{ feedstuffId: 'corn', sharePctDm: '' }] }));
    expect(draft.isValid && draft.output.draft.lines).toEqual([{ feedstuffId: 'corn' }]);
  });

  it('keeps the water intake unknown until its figure is typed', () => {
    const form = values();
    form.waterIntake = { ...form.waterIntake, litresPerDay: '' };
    const draft = draftFromValues(form);
    expect(draft.isValid && draft.output.draft.waterIntake).toBeNull();
  });

  it('is not made of text that cannot be read', () => {
    const draft = draftFromValues(values({ lines: [{ feedstuffId: 'corn', sharePctDm: 'ten' }] }));
    expect(draft.isValid ? [] : draft.faults.map(({ path }) => path)).toEqual(['lines.0.sharePctDm']);
  });
});

describe('the sum of shares', () => {
  it('counts what can be read', () => {
    // 52 + 30.5 = 82.5; the empty box and the word add nothing
    expect(typedSum(['52', '30,5', '', 'ten'])).toBe(82.5);
  });

  it.each([
    ['99.98', false],
    ['99.99', true],
    ['100', true],
    ['100.01', true],
    ['100.02', false],
  ])('of %s adds up: %s', (sharePctDm, adds) => {
    expect(sharesAddUp(values({ lines: [{ feedstuffId: 'corn', sharePctDm }] }))).toBe(adds);
  });

  it('asks the same of the waters, but takes none at all for an answer', () => {
    expect(sharesAddUp(values({ waters: [{ waterAnalysisId: 'x', sharePct: '60' }] }))).toBe(false);
    expect(sharesAddUp(values({ waters: [] }))).toBe(true);
  });
});
