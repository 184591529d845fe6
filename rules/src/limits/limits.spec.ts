import { describe, expect, it } from 'vitest';
import { screen } from '../screenings/screen';
import type { ScreeningRequest } from '../screenings/screening-request.schema';
import type { Composition } from '../screenings/composition.schema';
import { aLine, aRequest } from '../testing';

const findingOf = (rule: string, overrides: Partial<ScreeningRequest>) => {
  const finding = screen(aRequest(overrides)).findings.find((candidate) => candidate.rule === rule);
  if (!finding) throw new Error(`${rule} is not listed`);
  return finding;
};

const cattle = (stage: ScreeningRequest['cattle']['stage'], bodyWeightKg = 450) => ({
  stage,
  bodyWeightKg,
  dryMatterIntakeKgPerDay: 10,
});

const fed = (composition: Composition, stage: ScreeningRequest['cattle']['stage'] = 'finishing') => ({
  cattle: cattle(stage),
  lines: [aLine('feed', 100, composition)],
});

describe('water sulfate', () => {
  it.each([
    ['finishing', 1000, 'near'],
    ['finishing', 1000.001, 'over'],
    ['finishing', 899.9, 'within'],
    ['growing', 500, 'near'],
    ['growing', 500.001, 'over'],
    ['cow-dry', 600, 'within'],
  ] as const)('for %s cattle at %s mg/L is %s', (stage, value, status) => {
    const waters = [{ name: 'well', sharePct: 100, sulfate: { value, as: 'SO4' as const } }];
    expect(findingOf('water-sulfate', { cattle: cattle(stage), waters })).toMatchObject({ status });
  });

  it('only ever gives a notice and does not colour the ration', () => {
    const waters = [{ name: 'well', sharePct: 100, sulfate: { value: 1001, as: 'SO4' as const } }];
    const request = aRequest({
      lines: [
        aLine('grain', 80, { sulfurPctDm: 0.05 }),
        aLine('hay', 20, { sulfurPctDm: 0.05, roughageSharePctDm: 100, ndfPctDm: 60 }),
      ],
      waters,
    });
    const screening = screen(request);
    expect(screening.findings.find(({ rule }) => rule === 'water-sulfate')).toMatchObject({
      status: 'over',
      signOff: 'notice',
    });
    expect(screening).toMatchObject({ verdict: 'within', signOff: 'notice' });
  });
});

describe('fat', () => {
  it.each([
    ['finishing', 6.99, 'within'],
    ['finishing', 7, 'near'],
    ['finishing', 8, 'near'],
    ['finishing', 8.001, 'over'],
    ['growing', 5.99, 'within'],
    ['growing', 6, 'near'],
    ['growing', 7.001, 'over'],
    ['cow-lactating', 7.001, 'over'],
  ] as const)('in total, for %s cattle at %s %%, is %s', (stage, fatPctDm, status) => {
    expect(findingOf('total-fat', fed({ fatPctDm }, stage))).toMatchObject({ status });
  });

  it.each([
    ['finishing', 4, 'near'],
    ['finishing', 5, 'near'],
    ['finishing', 5.001, 'over'],
    ['growing', 2.69, 'within'],
    ['growing', 3.001, 'over'],
  ] as const)('added, for %s cattle at %s %%, is %s', (stage, addedFatPctDm, status) => {
    expect(findingOf('added-fat', fed({ fatPctDm: 6, addedFatPctDm }, stage))).toMatchObject({ status });
  });

  it('asks for a reason when over, since it costs performance and not health', () => {
    expect(findingOf('total-fat', fed({ fatPctDm: 9 })).signOff).toBe('reason');
  });

  it('knows that feed without fat holds no added fat', () => {
    expect(
      findingOf('added-fat', { lines: [{ ...aLine('limestone', 100), composition: { fatPctDm: 0 } }] }).value,
    ).toBe(0);
  });

  it('takes added fat as a floor of total fat', () => {
    const composition = { addedFatPctDm: 9 };
    expect(findingOf('total-fat', { lines: [{ ...aLine('mix', 100), composition }] })).toMatchObject({
      status: 'over',
      atLeast: 9,
    });
  });
});

describe('non-protein nitrogen', () => {
  const withNpn = (npn: number, protein: number) => fed({ npnProteinEquivalentPctDm: npn, crudeProteinPctDm: protein });

  it.each([
    [4, 12, 'near'],
    [4.0001, 12, 'over'],
    [3.5, 12, 'within'],
  ])('of %s in %s %% crude protein is %s', (npn, protein, status) => {
    expect(findingOf('npn-share', withNpn(npn, protein))).toMatchObject({ status });
  });

  it('is over on a floor that takes missing crude protein for that of pure urea', () => {
    // 70 of 90 % known protein as NPN; the missing tenth holds at most 29.15: 63 / (81 + 29.15) = 57 %
    const lines = [
      aLine('urea mix', 90, { npnProteinEquivalentPctDm: 70, crudeProteinPctDm: 90 }),
      { ...aLine('hay', 10), composition: { npnProteinEquivalentPctDm: 0 } },
    ];
    const finding = findingOf('npn-share', { lines });
    expect(finding).toMatchObject({ status: 'over', signOff: 'veterinarian', value: null });
    expect(finding.atLeast).toBeCloseTo(57.2, 1);
  });

  it.each([
    [203.9, 'over'],
    [204, 'near'],
    [250, 'within'],
  ])('fed to cattle of %s kg is %s', (bodyWeightKg, status) => {
    const request = { ...withNpn(1, 12), cattle: cattle('growing', bodyWeightKg) };
    expect(findingOf('npn-class', request)).toMatchObject({ status });
  });

  it('is not asked about where none is added', () => {
    expect(findingOf('npn-class', { ...fed({}), cattle: cattle('growing', 150) })).toMatchObject({
      applies: false,
      status: null,
    });
  });

  it('leaves light calves not determined while it is not known whether any is added', () => {
    const lines = [{ ...aLine('mix', 100), composition: {} }];
    expect(findingOf('npn-class', { lines, cattle: cattle('growing', 150) })).toMatchObject({
      status: 'undetermined',
      signOff: 'veterinarian',
      missing: ['lines.0.composition.npnProteinEquivalentPctDm'],
    });
  });

  it.each([
    [1, 'near', 'none'],
    [1.0001, 'over', 'reason'],
    [1.6, 'over', 'reason'],
    [1.6001, 'over', 'veterinarian'],
  ])('as %s %% urea is %s and asks for %s', (ureaPctDm, status, signOff) => {
    const request = fed({ ureaPctDm, npnProteinEquivalentPctDm: 4.5, crudeProteinPctDm: 16 });
    expect(findingOf('urea-level', request)).toMatchObject({ status, signOff });
  });

  it('knows that feed without NPN holds no urea', () => {
    const lines = [{ ...aLine('hay', 100), composition: { npnProteinEquivalentPctDm: 0 } }];
    expect(findingOf('urea-level', { lines })).toMatchObject({ status: 'within', value: 0 });
  });
});

describe('roughage and minerals', () => {
  it.each([
    [6.999, 'over'],
    [7, 'near'],
    [10, 'near'],
    [10.1, 'within'],
  ])('find %s %% NDF from roughage %s in a finishing diet', (ndfPctDm, status) => {
    expect(findingOf('roughage-minimum', fed({ roughageSharePctDm: 100, ndfPctDm }))).toMatchObject({ status });
  });

  it('ask no roughage minimum of growing cattle, because none is in the tables', () => {
    expect(findingOf('roughage-minimum', fed({}, 'growing'))).toMatchObject({ applies: false });
  });

  it.each([
    [0.299, 'over'],
    [0.3, 'near'],
    [0.4, 'within'],
  ])('find %s %% calcium on 0.3 %% phosphorus %s', (calciumPctDm, status) => {
    expect(findingOf('calcium-phosphorus', fed({ calciumPctDm, phosphorusPctDm: 0.3 }))).toMatchObject({ status });
  });

  it('find calcium below the minimum though some phosphorus is missing', () => {
    const lines = [
      aLine('grain', 90, { calciumPctDm: 0.03 }),
      { ...aLine('hay', 10), composition: { calciumPctDm: 0.5 } },
    ];
    expect(findingOf('calcium-phosphorus', { lines })).toMatchObject({ status: 'over', value: null });
  });

  it('cap the per cent of a minimum at 999', () => {
    expect(findingOf('calcium-phosphorus', fed({ calciumPctDm: 0 })).percentOfLimit).toBe(999);
  });
});

describe('yard caps', () => {
  const finished = { ...cattle('finishing'), entryWeightKg: 338, exitWeightKg: 554, daysOnFeed: 153 };

  it('are not asked about where the yard set none', () => {
    expect(findingOf('nitrogen-cap', { cattle: finished })).toMatchObject({ applies: false, status: null });
  });

  it('give a notice, or ask for compliance staff where the yard says so', () => {
    const over = (signOff?: 'compliance') =>
      findingOf('nitrogen-cap', { cattle: finished, yardCap: { nitrogenKgPerHead: 1, signOff } });
    expect(over()).toMatchObject({ status: 'over', signOff: 'notice' });
    expect(over('compliance')).toMatchObject({ status: 'over', signOff: 'compliance' });
  });

  it('are not determined without weights, and say which', () => {
    expect(findingOf('phosphorus-cap', { yardCap: { phosphorusKgPerHead: 4 } })).toMatchObject({
      status: 'undetermined',
      missing: ['cattle.entryWeightKg', 'cattle.exitWeightKg', 'cattle.daysOnFeed'],
    });
  });

  it('are over on a floor of what is known to be eaten', () => {
    const lines = [
      aLine('grain', 90, { crudeProteinPctDm: 20 }),
      { ...aLine('hay', 10), composition: { npnProteinEquivalentPctDm: 0 } },
    ];
    // at least 10 kg × 153 d × 18 % ÷ 6.25 = 44 kg N eaten, about 4 kg kept
    expect(findingOf('nitrogen-cap', { cattle: finished, lines, yardCap: { nitrogenKgPerHead: 30 } }).status).toBe(
      'over',
    );
  });
});
