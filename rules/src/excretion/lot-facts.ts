/** A lot of cattle fed together; a figure that is null is not known. Weights in kg, intake in kg DM per head and day. */
export interface LotFacts {
  readonly head: number;
  readonly daysOnFeed: number | null;
  readonly entryWeightKg: number;
  readonly exitWeightKg: number | null;
  readonly weightBasis: 'full' | 'shrunk';
  readonly dryMatterIntakeKgPerDay: number | null;
  readonly rationFed: {
    readonly crudeProteinPctDm: number | null;
    readonly phosphorusPctDm: number | null;
    readonly potassiumPctDm: number | null;
  } | null;
  readonly standardReferenceWeightKg?: number;
}
