import type { LotView, NutrientBalance } from '@brimgate/rules';

const undeterminedBalance: NutrientBalance = { intakeKg: null, retainedKg: null, excretedKg: null };

const balance = (intakeKg: number, retainedKg: number): NutrientBalance => ({
  intakeKg,
  retainedKg,
  excretedKg: intakeKg - retainedKg,
});

const times = (each: NutrientBalance, head: number): NutrientBalance => ({
  intakeKg: each.intakeKg === null ? null : each.intakeKg * head,
  retainedKg: each.retainedKg === null ? null : each.retainedKg * head,
  excretedKg: each.excretedKg === null ? null : each.excretedKg * head,
});

/** A finished lot of 200 head: 30 kg nitrogen eaten a head, 4 kept; 5 kg phosphorus eaten, 1 kept. */
export function aLot(overrides: Partial<LotView> = {}): LotView {
  const head = overrides.head ?? 200;
  const perHead = { nitrogen: balance(30, 4), phosphorus: balance(5, 1), potassium: undeterminedBalance };
  return {
    id: 'b8a1c8f4-6f0e-4d2b-9f4c-3a5d8e2f7a01',
    yard: { id: '2f4e1c1e-7d0a-4a53-9c3b-0a4f5f2f6c11', name: 'Dry Fork' },
    name: 'Lot 118',
    head,
    startedOn: '2026-01-10',
    endedOn: '2026-06-12',
    daysOnFeed: 153,
    entryWeightKg: 338,
    exitWeightKg: 554,
    weightBasis: 'shrunk',
    dryMatterIntakeKgPerDay: 10.6,
    release: { id: 'c0d8f3a2-52b1-4e6d-8f2a-94b7a1e63d02', rationName: 'Finisher 4', versionNumber: 6 },
    excretion: {
      perHead,
      wholeLot: {
        nitrogen: times(perHead.nitrogen, head),
        phosphorus: times(perHead.phosphorus, head),
        potassium: undeterminedBalance,
      },
      steps: [],
      reasons: [],
    },
    rulesVersion: '0.1.0',
    edition: '2026-12',
    version: 1,
    ...overrides,
  };
}

/** A lot whose weights out are not known yet. */
export function aLotNotDetermined(overrides: Partial<LotView> = {}): LotView {
  const none = { nitrogen: undeterminedBalance, phosphorus: undeterminedBalance, potassium: undeterminedBalance };
  return aLot({
    endedOn: null,
    daysOnFeed: null,
    exitWeightKg: null,
    excretion: { perHead: none, wholeLot: none, steps: [], reasons: ['The weight out is not known.'] },
    ...overrides,
  });
}
