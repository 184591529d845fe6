import type { Finding, ScreeningView } from '@brimgate/rules';

/** A finding that is within its limit. */
export function aFinding(overrides: Partial<Finding> = {}): Finding {
  return {
    rule: 'total-sulfur',
    applies: true,
    status: 'within',
    signOff: 'none',
    standingAllowed: true,
    value: 0.2,
    atLeast: null,
    limit: 0.3,
    unit: '% of DM',
    direction: 'max',
    percentOfLimit: 67,
    limitStatus: 'published',
    limitLocator: 'a table of the source',
    markers: [],
    interval90: null,
    chanceBeyondLimit: null,
    contributors: [],
    missing: [],
    basis: [],
    why: 'Total sulfur is 0.20 % of DM.',
    cautions: [],
    ...overrides,
  };
}

/** A stored screening of one feedstuff without water, in which no total is known. */
export function aScreeningView(overrides: Partial<ScreeningView> = {}): ScreeningView {
  return {
    id: '7c9e6679-7425-40de-944b-e07fc1f90ae7',
    rationId: '1b4e28ba-2fa1-4d2b-883f-0016d3cca427',
    rationName: 'Finisher 4',
    versionNumber: 6,
    contentHash: '5f2c91ab'.padEnd(64, '0'),
    request: {
      cattle: { stage: 'finishing', bodyWeightKg: 454 },
      lines: [{ feedstuff: 'Corn, high-moisture', sharePctDm: 100, composition: {} }],
      waters: [],
    },
    screening: {
      rulesVersion: '0.1.0',
      edition: '2026-12',
      totals: {
        dryMatterIntakeKgPerDay: null,
        drinkingWaterLitresPerDay: null,
        sulfurPctDm: null,
        feedSulfurPctDm: null,
        waterSulfurPctDm: null,
        fatPctDm: null,
        addedFatPctDm: null,
        solublesFatPctDm: null,
        crudeProteinPctDm: null,
        npnProteinEquivalentPctDm: null,
        npnSharePctOfNitrogen: null,
        ureaPctDm: null,
        roughagePctDm: null,
        roughageNdfPctDm: null,
        phosphorusPctDm: null,
        calciumPctDm: null,
        calciumToPhosphorus: null,
        totalNitrateNitrogenMgPerKgDm: null,
        netEnergyMaintenanceMcalPerKgDm: null,
        netEnergyGainMcalPerKgDm: null,
        averageDailyGainKg: null,
        asFedKgPerDay: null,
      },
      verdict: 'within',
      signOff: 'none',
      findings: [aFinding()],
      excretion: { perHeadPerDay: null, perFinishedHead: null, basis: [] },
      assumptions: [],
    },
    screenedAt: '2026-07-12T15:44:00.000Z',
    screenedBy: 'N. Example',
    ...overrides,
  };
}
