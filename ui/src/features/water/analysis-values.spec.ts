import { describe, expect, it } from 'vitest';
import { analysisInput, type AnalysisValues, newAnalysisValues } from './analysis-values';

const values = (overrides: Partial<AnalysisValues> = {}): AnalysisValues => ({
  ...newAnalysisValues(),
  sampledOn: '2026-06-12',
  ...overrides,
});
const faultsOf = (form: AnalysisValues) => {
  const input = analysisInput(form);
  return input.isValid ? {} : Object.fromEntries(input.faults.map(({ path, message }) => [path, message]));
};

describe('a water analysis', () => {
  it('keeps value, species and unit as the laboratory printed them', () => {
    const input = analysisInput(values({ sulfate: { value: '640,5', as: 'SO4', unit: 'ppm' } }));
    expect(input.isValid && input.output.sulfate).toEqual({ value: 640.5, as: 'SO4', unit: 'ppm', qualifier: null });
  });

  it('keeps “less than” apart from the number', () => {
    const input = analysisInput(values({ sulfate: { value: '< 5', as: 'SO4', unit: 'mg/L' } }));
    expect(input.isValid && input.output.sulfate).toMatchObject({ value: 5, qualifier: '<' });
  });

  it('takes an empty box for not analysed, never for zero', () => {
    const input = analysisInput(values());
    expect(
      input.isValid && [input.output.sulfate, input.output.nitrate, input.output.totalDissolvedSolidsMgPerL],
    ).toEqual([null, null, null]);
  });

  it('never guesses the species of a figure', () => {
    expect(faultsOf(values({ sulfate: { value: '640', as: '', unit: 'mg/L' } }))).toEqual({
      'sulfate.as': 'Sulfate: Say whether the figure is SO4, SO4-S or S',
    });
  });

  it.each([
    ['sulfate.value', { sulfate: { value: 'high', as: 'SO4', unit: 'mg/L' } }],
    ['sulfate.value', { sulfate: { value: '<', as: 'SO4', unit: 'mg/L' } }],
    ['sulfate.value', { sulfate: { value: '-3', as: 'SO4', unit: 'mg/L' } }],
    ['sulfate.value', { sulfate: { value: '640000', as: 'SO4', unit: 'mg/L' } }],
    ['sulfate.unit', { sulfate: { value: '640', as: 'SO4', unit: 'gpg' } }],
    ['totalDissolvedSolidsMgPerL', { totalDissolvedSolidsMgPerL: '1,234' }],
    ['sampledOn', { sampledOn: '' }],
  ] as [string, Partial<AnalysisValues>][])('refuses a fault in %s at its own field', (path, overrides) => {
    expect(Object.keys(faultsOf(values(overrides)))).toEqual([path]);
  });
});
