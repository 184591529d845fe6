import { describe, expect, it } from 'vitest';
import {
  celsiusFromFahrenheit,
  fahrenheitFromCelsius,
  gallonsFromLitres,
  kgFromLb,
  lbFromKg,
  litresFromGallons,
  mgPerKgFromPct,
  pctFromMgPerKg,
} from './units';

describe('units', () => {
  it.each([
    [-40, -40],
    [32, 0],
    [212, 100],
  ])('read %s °F as %s °C and back', (degreesF, degreesC) => {
    expect(celsiusFromFahrenheit(degreesF)).toBeCloseTo(degreesC, 12);
    expect(fahrenheitFromCelsius(degreesC)).toBeCloseTo(degreesF, 12);
  });

  it('weigh a hundredweight of 100 lb as 45.36 kg and back', () => {
    expect(kgFromLb(100)).toBeCloseTo(45.359237, 9);
    expect(lbFromKg(45.359237)).toBeCloseTo(100, 9);
  });

  it('hold 231 cubic inches in a gallon', () => {
    // 231 × 2.54³ cm³
    expect(litresFromGallons(1)).toBeCloseTo((231 * 2.54 ** 3) / 1000, 12);
    expect(gallonsFromLitres(litresFromGallons(12.6))).toBeCloseTo(12.6, 12);
  });

  it('count 10,000 mg/kg as one per cent', () => {
    expect(pctFromMgPerKg(10_000)).toBe(1);
    expect(mgPerKgFromPct(0.25)).toBe(2500);
  });
});
