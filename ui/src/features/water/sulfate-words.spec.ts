import { describe, expect, it } from 'vitest';
import { asSulfate, resultAsEntered } from './sulfate-words';

const sulfate = { value: 213, as: 'SO4-S', unit: 'ppm', qualifier: null } as const;

describe('a water result', () => {
  it('is shown as the laboratory printed it', () => {
    expect(resultAsEntered(sulfate)).toMatch(/^213\s?ppm as SO4-S$/u);
    expect(resultAsEntered({ ...sulfate, value: 5, qualifier: '<' })).toMatch(/^<5\s?ppm as SO4-S$/u);
  });

  it('is shown as sulfate too, about three times the sulfur in it', () => {
    // SO4 is 96.06 g/mol and S 32.06: 213 × 96.06 / 32.06 = 638.2
    expect(asSulfate(sulfate)).toBe('638');
    expect(asSulfate({ ...sulfate, value: 640, as: 'SO4' })).toBe('640');
  });

  it('stays below what can be measured', () => {
    // 5 × 2.996 = 15.0
    expect(asSulfate({ ...sulfate, value: 5, qualifier: '<' })).toBe('<15.0');
  });

  it('is not determined when it was not analysed, never 0', () => {
    expect(asSulfate(null)).toBe('not determined');
    expect(resultAsEntered(null)).toBe('not analysed');
  });
});
