/** Kilograms in one pound. [kg/lb] Exact by definition of the international pound. */
export const KG_PER_LB = 0.45359237;

/** Litres in one US liquid gallon of 231 cubic inches. [L/gal] Exact by definition. */
export const LITRES_PER_US_GALLON = 3.785411784;

/** Hectares in one acre. [ha/ac] Exact by definition from the foot of 0.3048 m. */
export const HECTARES_PER_ACRE = 0.40468564224;

/** Pounds in one US short ton. [lb/ton] Exact by definition. */
export const LB_PER_SHORT_TON = 2000;

export const kgFromLb = (lb: number): number => lb * KG_PER_LB;
export const lbFromKg = (kg: number): number => kg / KG_PER_LB;
export const litresFromGallons = (gallons: number): number => gallons * LITRES_PER_US_GALLON;
export const gallonsFromLitres = (litres: number): number => litres / LITRES_PER_US_GALLON;
export const celsiusFromFahrenheit = (degreesF: number): number => ((degreesF - 32) * 5) / 9;
export const fahrenheitFromCelsius = (degreesC: number): number => (degreesC * 9) / 5 + 32;

/** Mass per volume of water that a mass per kilogram equals. [mg/L] Parts per million in water of one kilogram a litre. */
export const mgPerLFromPpm = (ppm: number): number => ppm;

/** Per cent that a mass per kilogram is. [%] */
export const pctFromMgPerKg = (mgPerKg: number): number => mgPerKg / 10_000;
export const mgPerKgFromPct = (pct: number): number => pct * 10_000;
