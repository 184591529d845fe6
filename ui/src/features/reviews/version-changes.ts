import type { ScreeningRequest, ScreeningTotals, ScreeningView } from '@brimgate/rules';
import { formatWithUnit } from '../../lib/format';

export interface VersionChange {
  id: string;
  label: string;
  before: string;
  after: string;
}

export interface VersionChanges {
  fed: VersionChange[];
  drunk: VersionChange[];
  cattle: VersionChange[];
  totals: VersionChange[];
}

const ABSENT = 'not in it';

const comparedTotals: readonly { key: keyof ScreeningTotals; label: string; unit: string; decimals: number }[] = [
  { key: 'sulfurPctDm', label: 'Total sulfur', unit: '% of DM', decimals: 2 },
  { key: 'fatPctDm', label: 'Total fat', unit: '% of DM', decimals: 1 },
  { key: 'addedFatPctDm', label: 'Added fat', unit: '% of DM', decimals: 1 },
  { key: 'npnSharePctOfNitrogen', label: 'NPN, share of nitrogen', unit: '%', decimals: 1 },
  { key: 'ureaPctDm', label: 'Urea', unit: '% of DM', decimals: 2 },
  { key: 'roughagePctDm', label: 'Roughage', unit: '% of DM', decimals: 1 },
  { key: 'crudeProteinPctDm', label: 'Crude protein', unit: '% of DM', decimals: 1 },
  { key: 'phosphorusPctDm', label: 'Phosphorus', unit: '% of DM', decimals: 2 },
  { key: 'dryMatterIntakeKgPerDay', label: 'Dry matter eaten', unit: 'kg a head and day', decimals: 1 },
  { key: 'drinkingWaterLitresPerDay', label: 'Water drunk', unit: 'L a head and day', decimals: 0 },
];

/** What differs between the version that is fed and the one up for review; rows that read alike are left out. */
export function versionChanges(fed: ScreeningView, reviewed: ScreeningView): VersionChanges {
  return {
    fed: changed(linesOf(fed.request), linesOf(reviewed.request)),
    drunk: changed(watersOf(fed.request), watersOf(reviewed.request)),
    cattle: changed(cattleOf(fed.request), cattleOf(reviewed.request)),
    totals: changed(totalsOf(fed.screening.totals), totalsOf(reviewed.screening.totals)),
  };
}

export function hasChanges(changes: VersionChanges): boolean {
  return Object.values(changes).some((rows: VersionChange[]) => rows.length > 0);
}

function changed(before: Map<string, string>, after: Map<string, string>): VersionChange[] {
  return [...new Set([...before.keys(), ...after.keys()])]
    .map((label) => ({ id: label, label, before: before.get(label) ?? ABSENT, after: after.get(label) ?? ABSENT }))
    .filter((row) => row.before !== row.after);
}

function linesOf(request: ScreeningRequest): Map<string, string> {
  // The same feedstuff may stand on two lines: their shares belong together.
  const shares = new Map<string, number>();
  for (const line of request.lines) {
    shares.set(line.feedstuff, (shares.get(line.feedstuff) ?? 0) + line.sharePctDm);
  }
  return new Map([...shares].map(([feedstuff, share]) => [feedstuff, formatWithUnit(share, 1, '% of DM')]));
}

function watersOf(request: ScreeningRequest): Map<string, string> {
  return new Map(
    (request.waters ?? []).map((water) => {
      const sulfate = water.sulfate
        ? `${formatWithUnit(water.sulfate.value, 0, 'mg/L')} ${water.sulfate.as}`
        : 'sulfate not determined';
      return [water.name, `${formatWithUnit(water.sharePct, 0, '%')} of the water, ${sulfate}`];
    }),
  );
}

function cattleOf({ cattle }: ScreeningRequest): Map<string, string> {
  return new Map([
    ['Stage', cattle.stage.replace('-', ', ')],
    ['Body weight', formatWithUnit(cattle.bodyWeightKg, 0, 'kg')],
  ]);
}

function totalsOf(totals: ScreeningTotals): Map<string, string> {
  return new Map(
    comparedTotals.map(({ key, label, unit, decimals }) => [label, formatWithUnit(totals[key], decimals, unit)]),
  );
}
