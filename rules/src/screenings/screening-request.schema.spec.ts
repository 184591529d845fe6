import { describe, expect, it } from 'vitest';
import { aLine, aRequest } from '../testing';
import { parseScreeningRequest } from './request-problems';

const problemsOf = (request: unknown) => parseScreeningRequest(request).problems ?? [];
const messageAt = (path: string, request: unknown) =>
  problemsOf(request).find((problem) => problem.path === path)?.message;

describe('a screening request', () => {
  it('is accepted when all is well', () => {
    expect(problemsOf(aRequest())).toEqual([]);
  });

  it('says what the shares add to', () => {
    const lines = [aLine('grain', 80), aLine('hay', 20.02)];
    expect(messageAt('lines', aRequest({ lines }))).toBe('Shares add to 100.02, not 100');
  });

  it.each([99.99, 100.01])('lets shares add to %s', (sum) => {
    expect(problemsOf(aRequest({ lines: [aLine('grain', 80), aLine('hay', sum - 80)] }))).toEqual([]);
  });

  it.each([99.98, 100.02, 0])('refuses shares that add to %s', (sum) => {
    const lines = [aLine('grain', sum / 2), aLine('hay', sum / 2)];
    expect(messageAt('lines', aRequest({ lines }))).toMatch(/not 100$/);
  });

  it('says what the shares of the waters add to', () => {
    const waters = [{ name: 'well', sharePct: 60 }];
    expect(messageAt('waters', aRequest({ waters }))).toBe('Shares add to 60, not 100');
  });

  it('accepts no waters at all', () => {
    expect(problemsOf(aRequest({ waters: [] }))).toEqual([]);
  });

  it.each([Number.NaN, Number.POSITIVE_INFINITY, -1, 101, '12', null])('refuses %s as a share', (share) => {
    expect(
      messageAt('lines.0.sharePctDm', aRequest({ lines: [{ ...aLine('grain', 100), sharePctDm: share as number }] })),
    ).toBeDefined();
  });

  it.each([
    ['cattle.bodyWeightKg', { cattle: { stage: 'finishing', bodyWeightKg: 4500 } }],
    ['cattle.stage', { cattle: { stage: 'calf', bodyWeightKg: 200 } }],
    ['cattle.dryMatterIntakeKgPerDay', { cattle: { stage: 'growing', bodyWeightKg: 300, dryMatterIntakeKgPerDay: 0 } }],
    ['cattle.surprise', { cattle: { stage: 'growing', bodyWeightKg: 300, surprise: true } }],
    ['waters.0.sulfate.as', { waters: [{ name: 'w', sharePct: 100, sulfate: { value: 1, as: 'sulfate' } }] }],
    ['waters.0.sulfate.value', { waters: [{ name: 'w', sharePct: 100, sulfate: { value: 1e6, as: 'SO4' } }] }],
    ['waterIntake.model', { waterIntake: { model: 'guess', temperatureC: 20 } }],
    ['waterIntake.temperatureC', { waterIntake: { model: 'nrc-winchester-morris-table', temperatureC: 90 } }],
    ['waterIntake.litresPerDay', { waterIntake: { litresPerDay: 500 } }],
    ['edition', { edition: '1999-01' }],
    ['limits.total-sulphur', { limits: { 'total-sulphur': { value: 0.3 } } }],
    ['limits.total-sulfur.value', { limits: { 'total-sulfur': { value: 0 } } }],
    ['yardCap.nitrogenKgPerHead', { yardCap: { nitrogenKgPerHead: -2 } }],
    ['draws', { draws: 1.5 }],
    ['lines', { lines: [] }],
  ])('refuses a bad %s and names it', (path, overrides) => {
    expect(problemsOf({ ...aRequest(), ...overrides }).map((problem) => problem.path)).toContain(path);
  });

  it('refuses a part that exceeds its whole', () => {
    const lines = [aLine('grain', 100, { fatPctDm: 4, addedFatPctDm: 3, solublesFatPctDm: 2 })];
    expect(messageAt('lines.0.composition.fatPctDm', aRequest({ lines }))).toMatch(/parts of total fat/);
  });

  it('refuses more than 60 lines', () => {
    const lines = Array.from({ length: 61 }, (_, index) => aLine(`feed ${index}`, 100 / 61));
    expect(messageAt('lines', aRequest({ lines }))).toMatch(/at most 60/);
  });

  it('says that a field is missing', () => {
    expect(messageAt('cattle', { ...aRequest(), cattle: undefined })).toBe('This field is missing');
  });
});
