import type { NutrientName } from '../screenings/composition.schema';
import type { ScreeningRequest } from '../screenings/screening-request.schema';

const nutrientWords: Readonly<Record<NutrientName, string>> = {
  dryMatterPctAsFed: 'dry matter',
  roughageSharePctDm: 'roughage share',
  crudeProteinPctDm: 'crude protein',
  npnProteinEquivalentPctDm: 'NPN',
  ureaPctDm: 'urea',
  rumenDegradableProteinPctCp: 'degradable protein',
  fatPctDm: 'fat',
  addedFatPctDm: 'added fat',
  solublesFatPctDm: 'solubles fat',
  sulfurPctDm: 'sulfur',
  phosphorusPctDm: 'phosphorus',
  calciumPctDm: 'calcium',
  potassiumPctDm: 'potassium',
  magnesiumPctDm: 'magnesium',
  ndfPctDm: 'NDF',
  tdnPctDm: 'TDN',
  netEnergyMaintenanceMcalPerKgDm: 'net energy for maintenance',
  netEnergyGainMcalPerKgDm: 'net energy for gain',
  copperMgPerKgDm: 'copper',
  molybdenumMgPerKgDm: 'molybdenum',
  nitrateNitrogenMgPerKgDm: 'nitrate nitrogen',
};

const fieldWords: Readonly<Record<string, string>> = {
  waters: 'the analysis of the water',
  waterIntake: 'how much the cattle drink',
  'waterIntake.litresPerDay': 'how much the cattle drink',
  'waterIntake.temperatureC': 'how much the cattle drink',
  'waterIntake.cattleClass': 'how much the cattle drink',
  'cattle.bodyWeightKg': 'how much cattle of this weight drink',
  'cattle.stage': 'how much cattle of this stage drink',
  'cattle.dryMatterIntakeKgPerDay': 'dry matter intake',
  'cattle.entryWeightKg': 'entry weight',
  'cattle.exitWeightKg': 'exit weight',
  'cattle.daysOnFeed': 'days on feed',
};

const isNutrient = (name: string): name is NutrientName => name in nutrientWords;

/** A missing figure in the words of the trade: "sulfur of alfalfa hay". */
export function missingInWords(path: string, request: ScreeningRequest): string {
  const [list, index, , field = ''] = path.split('.');
  if (list === 'lines' && isNutrient(field)) {
    return `${nutrientWords[field]} of ${request.lines[Number(index)]?.feedstuff ?? 'a feedstuff'}`;
  }
  if (list === 'waters' && index !== undefined)
    return `sulfate of ${request.waters?.[Number(index)]?.name ?? 'a water'}`;
  return fieldWords[path] ?? path;
}

/** Several missing figures as one phrase; long lists name the first and count the rest. */
export function listMissing(paths: readonly string[], request: ScreeningRequest): string {
  const words = [...new Set(paths.map((path) => missingInWords(path, request)))];
  const shown = words.length > 4 ? [...words.slice(0, 3), `${words.length - 3} more figures`] : words;
  return joinWords(shown);
}

export function joinWords(words: readonly string[]): string {
  if (words.length < 2) return words.join('');
  return `${words.slice(0, -1).join(', ')} and ${words.at(-1) ?? ''}`;
}
