import type { FeedstuffInput, WaterAnalysisInput } from '@brimgate/rules';
import { daysAgo } from './demo-clock';
import { ALKALI_BENCH, SORREL_FLAT, TAMARACK_DRAW } from './demo-people';

export const WET_GRAINS = 'Wet distillers grains, Cinder Butte plant';
export const SUPPLEMENT_K4 = 'Supplement K4';

/** The firm's own feedstuffs, as its laboratory's reports and its supplier's label say. */
export const demoFeedstuffs = (): FeedstuffInput[] => [
  {
    name: WET_GRAINS,
    bookFeedstuffId: 'wdgs-partially-de-oiled',
    analysedOn: daysAgo(194),
    laboratory: 'Sagewater Laboratory (invented), report 4471',
    note: 'Load of 22 t; the plant takes out part of the oil.',
    analysed: {
      dryMatterPctAsFed: 34.6,
      crudeProteinPctDm: 31.4,
      fatPctDm: 7.2,
      sulfurPctDm: 0.66,
      phosphorusPctDm: 0.86,
      potassiumPctDm: 1.05,
      ndfPctDm: 32.8,
    },
  },
  {
    name: SUPPLEMENT_K4,
    bookFeedstuffId: null,
    analysedOn: null,
    laboratory: null,
    note: 'Typed from the label: 8 % urea, limestone and salt on a grain by-product.',
    analysed: {
      dryMatterPctAsFed: 91,
      roughageSharePctDm: 0,
      crudeProteinPctDm: 38,
      npnProteinEquivalentPctDm: 22.5,
      ureaPctDm: 8,
      rumenDegradableProteinPctCp: 85,
      fatPctDm: 1.8,
      addedFatPctDm: 0,
      solublesFatPctDm: 0,
      sulfurPctDm: 0.35,
      phosphorusPctDm: 0.5,
      calciumPctDm: 14,
      potassiumPctDm: 4.2,
      magnesiumPctDm: 0.9,
      ndfPctDm: 12,
      tdnPctDm: 42,
      netEnergyMaintenanceMcalPerKgDm: 0.9,
      netEnergyGainMcalPerKgDm: 0.45,
      copperMgPerKgDm: 260,
    },
  },
];

/** An analysis by how many days ago the sample was taken. */
export type DemoAnalysis = Omit<WaterAnalysisInput, 'sampledOn'> & { sampledDaysAgo: number };
type DemoWater = { yard: string; name: string; analyses: readonly DemoAnalysis[] };

const printed = { laboratory: 'Sagewater Laboratory (invented)', treatment: null };
const sulfate = (value: number) => ({ value, as: 'SO4', unit: 'mg/L', qualifier: null }) as const;
const nitrate = (value: number, qualifier: '<' | null = null) =>
  ({ value, as: 'NO3-N', unit: 'mg/L', qualifier }) as const;

/** Waters with their analyses, oldest first. */
export const demoWaters: readonly DemoWater[] = [
  {
    yard: TAMARACK_DRAW,
    name: 'North well',
    analyses: [
      {
        ...printed,
        sampledDaysAgo: 192,
        samplingPoint: 'Trough of pen 3',
        sulfate: sulfate(1085),
        nitrate: nitrate(4.1),
        totalDissolvedSolidsMgPerL: 2140,
      },
      {
        ...printed,
        sampledDaysAgo: 9,
        samplingPoint: 'Trough of pen 3',
        sulfate: sulfate(1150),
        nitrate: nitrate(4.6),
        totalDissolvedSolidsMgPerL: 2230,
      },
    ],
  },
  {
    yard: TAMARACK_DRAW,
    name: 'South well',
    analyses: [
      {
        ...printed,
        sampledDaysAgo: 192,
        samplingPoint: 'Storage tank',
        sulfate: sulfate(210),
        nitrate: nitrate(0.5, '<'),
        totalDissolvedSolidsMgPerL: 640,
      },
    ],
  },
  {
    yard: SORREL_FLAT,
    name: 'Creek dugout',
    analyses: [
      {
        ...printed,
        sampledDaysAgo: 12,
        samplingPoint: 'Intake of the pump',
        sulfate: sulfate(340),
        // The laboratory was not asked for it.
        nitrate: null,
        totalDissolvedSolidsMgPerL: 910,
      },
    ],
  },
];

export const benchWell: DemoWater = {
  yard: ALKALI_BENCH,
  name: 'Bench well',
  analyses: [
    {
      ...printed,
      sampledDaysAgo: 40,
      samplingPoint: 'Trough of pen 1',
      sulfate: sulfate(620),
      nitrate: nitrate(2.2),
      totalDissolvedSolidsMgPerL: 1480,
    },
  ],
};
