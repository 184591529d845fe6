import * as fc from 'fast-check';
import * as v from 'valibot';
import { describe, expect, it } from 'vitest';
import { nutrientNames, type Composition, type NutrientName } from './composition.schema';
import { screen } from './screen';
import { ScreeningRequest } from './screening-request.schema';
import { Screening } from './screening.schema';

const figure = (max: number) => fc.double({ min: 0, max, noNaN: true, noDefaultInfinity: true });

const composition: fc.Arbitrary<Composition> = fc
  .record({
    dryMatterPctAsFed: fc.double({ min: 20, max: 100, noNaN: true }),
    roughageSharePctDm: figure(100),
    protein: figure(60),
    npnShare: figure(1),
    ureaPctDm: figure(3),
    fat: figure(20),
    addedShare: figure(0.5),
    solublesShare: figure(0.5),
    sulfurPctDm: figure(1.2),
    phosphorusPctDm: fc.double({ min: 0.05, max: 1, noNaN: true }),
    calciumPctDm: figure(2),
    potassiumPctDm: figure(2),
    ndfPctDm: figure(80),
  })
  .map(({ protein, npnShare, fat, addedShare, solublesShare, ...rest }) => ({
    ...rest,
    crudeProteinPctDm: protein,
    npnProteinEquivalentPctDm: npnShare * protein,
    // urea is part of the NPN: 281 % crude protein equivalent of feed grade
    ureaPctDm: Math.min(rest.ureaPctDm, (npnShare * protein) / 2.81),
    fatPctDm: fat,
    addedFatPctDm: addedShare * fat,
    solublesFatPctDm: solublesShare * fat,
  }));

const request: fc.Arbitrary<ScreeningRequest> = fc
  .record({
    stage: fc.constantFrom('receiving', 'growing', 'finishing', 'cow-dry', 'cow-lactating'),
    bodyWeightKg: fc.double({ min: 150, max: 700, noNaN: true }),
    dryMatterIntakeKgPerDay: fc.double({ min: 3, max: 15, noNaN: true }),
    feeds: fc.array(fc.tuple(fc.integer({ min: 1, max: 50 }), composition), { minLength: 1, maxLength: 6 }),
    sulfate: figure(3000),
    litresPerDay: figure(80),
    cap: fc.double({ min: 1, max: 40, noNaN: true }),
  })
  .map(({ stage, bodyWeightKg, dryMatterIntakeKgPerDay, feeds, sulfate, litresPerDay, cap }) => {
    const sum = feeds.reduce((total, [weight]) => total + weight, 0);
    return v.parse(ScreeningRequest, {
      cattle: { stage, bodyWeightKg, dryMatterIntakeKgPerDay, entryWeightKg: 300, exitWeightKg: 560, daysOnFeed: 160 },
      lines: feeds.map(([weight, feed], index) => ({
        feedstuff: `feed ${index}`,
        sharePctDm: (100 * weight) / sum,
        composition: feed,
      })),
      waters: [{ name: 'well', sharePct: 100, sulfate: { value: sulfate, as: 'SO4' } }],
      waterIntake: { litresPerDay },
      yardCap: { nitrogenKgPerHead: cap, phosphorusKgPerHead: cap / 8 },
    });
  });

const removals = fc.array(fc.tuple(fc.nat(5), fc.constantFrom(...nutrientNames)), { minLength: 1, maxLength: 12 });

function without(full: ScreeningRequest, removed: [number, NutrientName][], noWater: boolean): ScreeningRequest {
  const lines = full.lines.map((line, index) => {
    const gone = removed.filter(([at]) => at === index).map(([, name]) => name);
    const kept = Object.entries(line.composition).filter(([name]) => !gone.some((nutrient) => nutrient === name));
    return { ...line, composition: Object.fromEntries(kept) };
  });
  return { ...full, lines, waters: noWater ? [] : full.waters };
}

describe('every screening', () => {
  it('repeats itself byte for byte and fits its schema', () => {
    fc.assert(
      fc.property(request, (one) => {
        const first = screen(one);
        expect(JSON.stringify(screen(structuredClone(one)))).toBe(JSON.stringify(first));
        expect(v.safeParse(Screening, JSON.parse(JSON.stringify(first))).success).toBe(true);
      }),
    );
  });

  it('has contributors that add up to the value', () => {
    fc.assert(
      fc.property(request, (one) => {
        for (const { contributors, value } of screen(one).findings) {
          if (contributors.length === 0) continue;
          const sum = contributors.reduce((total, part) => total + part.value, 0);
          expect(sum).toBeCloseTo(value ?? Number.NaN, 9);
        }
      }),
    );
  });

  it('balances: sulfur eaten and drunk is the sulfur found', () => {
    fc.assert(
      fc.property(request, (one) => {
        const dryMatterKg = one.cattle.dryMatterIntakeKgPerDay ?? 0;
        const eatenKg = one.lines.reduce(
          (sum, line) => sum + (dryMatterKg * line.sharePctDm * (line.composition.sulfurPctDm ?? 0)) / 10_000,
          0,
        );
        const litres = one.waterIntake?.model === undefined ? (one.waterIntake?.litresPerDay ?? 0) : 0;
        // relative atomic masses: S 32.06, O 15.999
        const drunkKg = (litres * (one.waters?.[0]?.sulfate?.value ?? 0) * (32.06 / 96.056)) / 1e6;
        const foundKg = ((screen(one).totals.sulfurPctDm ?? 0) * dryMatterKg) / 100;
        expect(foundKg).toBeCloseTo(eatenKg + drunkKg, 6);
      }),
    );
  });

  it('does not depend on the order of the lines', () => {
    fc.assert(
      fc.property(request, (one) => {
        const turned = screen({ ...one, lines: one.lines.toReversed() });
        const straight = screen(one);
        expect(turned.findings.map(({ rule, status }) => [rule, status])).toEqual(
          straight.findings.map(({ rule, status }) => [rule, status]),
        );
        expect(turned.totals.sulfurPctDm).toBeCloseTo(straight.totals.sulfurPctDm ?? Number.NaN, 9);
      }),
    );
  });

  it('never becomes more lenient when figures are removed', () => {
    fc.assert(
      fc.property(request, removals, fc.boolean(), (full, removed, noWater) => {
        const known = screen(full);
        const less = screen(without(full, removed, noWater));
        less.findings.forEach((finding, index) => {
          const before = known.findings[index];
          if (!before?.applies || !finding.applies) return;
          if (finding.status === 'within') expect(before.status).toBe('within');
          if (finding.value === null && finding.atLeast !== null && before.value !== null) {
            expect(finding.atLeast).toBeLessThanOrEqual(before.value + 1e-9);
            if (finding.limit !== null && finding.atLeast > finding.limit + 1e-9) expect(finding.status).toBe('over');
          }
          if (finding.status === 'over' && finding.value === null && finding.limit === before.limit) {
            expect(before.status).toBe('over');
          }
        });
      }),
      { numRuns: 300 },
    );
  });

  it('takes the gravest of the findings that can ask for a sign-off', () => {
    fc.assert(
      fc.property(request, removals, (full, removed) => {
        const screening = screen(without(full, removed, false));
        const notices = ['water-sulfate', 'roughage-minimum', 'calcium-phosphorus', 'nitrogen-cap', 'phosphorus-cap'];
        const statuses = screening.findings.filter(({ rule }) => !notices.includes(rule)).map(({ status }) => status);
        const gravest = (['over', 'undetermined', 'near', 'within'] as const).find((status) =>
          statuses.includes(status),
        );
        expect(screening.verdict).toBe(gravest);
      }),
    );
  });
});
