import { describe, expect, it } from 'vitest';
import { screen } from '../screenings/screen';
import type { ScreeningRequest } from '../screenings/screening-request.schema';
import { aLine, aRequest } from '../testing';

const sulfurOf = (overrides: Partial<ScreeningRequest>) => {
  const { findings, assumptions } = screen(aRequest(overrides));
  const finding = findings.find(({ rule }) => rule === 'total-sulfur');
  if (!finding) throw new Error('total-sulfur is not listed');
  return { ...finding, assumptions };
};

/** One feed of the given sulfur and roughage share, with a water that holds no sulfate. */
const fed = (sulfurPctDm: number, roughageSharePctDm = 0): Partial<ScreeningRequest> => ({
  lines: [aLine('feed', 100, { sulfurPctDm, roughageSharePctDm })],
});

describe('total sulfur', () => {
  it('adds the sulfur of the drinking water', () => {
    // 40 L × 1000 mg/L = 40 g sulfate = 40 × 32.06 / 96.06 = 13.35 g sulfur; (20 + 13.35) g in 10 kg
    const waters = [{ name: 'well', sharePct: 100, sulfate: { value: 1000, as: 'SO4' as const } }];
    expect(sulfurOf({ ...fed(0.2), waters }).value).toBeCloseTo(0.3335, 4);
  });

  it('reads sulfate sulfur as three times the sulfate', () => {
    // 40 L × 333.75 mg/L S = 13.35 g sulfur: as above
    const waters = [{ name: 'well', sharePct: 100, sulfate: { value: 333.75, as: 'SO4-S' as const } }];
    expect(sulfurOf({ ...fed(0.2), waters }).value).toBeCloseTo(0.3335, 4);
  });

  it.each([
    [0.26, 'within', 'none'],
    [0.27, 'near', 'none'],
    [0.3, 'near', 'none'],
    [0.300001, 'over', 'reason'],
    [0.4, 'over', 'reason'],
    [0.400001, 'over', 'veterinarian'],
    [0.5, 'over', 'veterinarian'],
    [0.500001, 'over', 'veterinarian'],
  ])('of %s %% at no roughage is %s and asks for %s', (sulfur, status, signOff) => {
    expect(sulfurOf(fed(sulfur))).toMatchObject({ status, signOff, limit: 0.3 });
  });

  it.each([
    [0.42, 'within', 'none'],
    [0.5, 'near', 'none'],
    [0.500001, 'over', 'veterinarian'],
  ])('of %s %% at all roughage is %s and asks for %s', (sulfur, status, signOff) => {
    expect(sulfurOf(fed(sulfur, 100))).toMatchObject({ status, signOff, limit: 0.5 });
  });

  it.each([
    [40, 0.3],
    [40.0001, 0.5],
  ])('at %s %% roughage is held to %s', (roughage, limit) => {
    expect(sulfurOf(fed(0.2, roughage)).limit).toBe(limit);
  });

  it('lets a standing concurrence answer up to 0.5 and not above', () => {
    expect(sulfurOf(fed(0.5)).standingAllowed).toBe(true);
    expect(sulfurOf(fed(0.500001)).standingAllowed).toBe(false);
  });

  it('draws the convention between 15 and 40 % roughage: 0.40 half way', () => {
    // 0.30 + (27.5 − 15) / 25 × 0.20 = 0.40
    const marker = sulfurOf(fed(0.2, 27.5)).markers.find(({ label }) => label.startsWith('straight line'));
    expect(marker?.value).toBeCloseTo(0.4, 9);
    expect(marker?.status).toBe('common-practice');
  });

  it('takes the stricter limit while the roughage is not known, and says so', () => {
    const lines = [aLine('feed', 70, { sulfurPctDm: 0.2 }), { ...aLine('hay', 30), composition: { sulfurPctDm: 0.2 } }];
    const finding = sulfurOf({ lines });
    // hay may be all roughage, yet 30 % is not above 40: the row is certain
    expect(finding.assumptions.join()).not.toMatch(/roughage share is not fully known/);
    const more = sulfurOf({ lines: [aLine('feed', 50), { ...aLine('hay', 50), composition: { sulfurPctDm: 0.2 } }] });
    expect(more.limit).toBe(0.3);
    expect(more.assumptions.join()).toMatch(/roughage share is not fully known/);
  });

  it('takes the forage limit when the known roughage alone exceeds 40 %', () => {
    const lines = [
      aLine('hay', 50, { roughageSharePctDm: 100 }),
      { ...aLine('mix', 50), composition: { sulfurPctDm: 0.2 } },
    ];
    expect(sulfurOf({ lines }).limit).toBe(0.5);
  });

  it('is over on what is known, whatever is missing, and asks for no less than not knowing does', () => {
    // half the ration at 0.64 is 0.32 already
    const lines = [
      aLine('grain', 50, { sulfurPctDm: 0.64 }),
      { ...aLine('hay', 50), composition: { roughageSharePctDm: 0 } },
    ];
    const finding = sulfurOf({ lines });
    expect(finding).toMatchObject({ status: 'over', signOff: 'veterinarian', value: null, standingAllowed: false });
    expect(finding.atLeast).toBeCloseTo(0.32, 9);
    expect(finding.missing).toEqual(['lines.1.composition.sulfurPctDm']);
    expect(finding.why).toMatch(/sulfur of hay/);
  });

  it('is not determined without a water, a water analysis or the litres drunk', () => {
    expect(sulfurOf({ waters: [] })).toMatchObject({
      status: 'undetermined',
      signOff: 'veterinarian',
      missing: ['waters'],
    });
    expect(sulfurOf({ waters: [{ name: 'well', sharePct: 100 }] }).missing).toEqual(['waters.0.sulfate']);
    expect(sulfurOf({ waterIntake: undefined }).missing).toEqual(['waterIntake']);
  });

  it('takes the analysed water as a floor beside one that is not analysed', () => {
    // half of 40 L at 6000 mg/L = 120 g sulfate = 40.05 g sulfur in 10 kg: 0.40 from water alone, and 0.20 from feed
    const waters = [
      { name: 'well', sharePct: 50, sulfate: { value: 6000, as: 'SO4' as const } },
      { name: 'creek', sharePct: 50 },
    ];
    const finding = sulfurOf({ ...fed(0.2), waters });
    expect(finding.status).toBe('over');
    expect(finding.atLeast).toBeCloseTo(0.6005, 3);
  });

  it('holds a stricter own limit, and shows the published one beside it', () => {
    const finding = sulfurOf({ ...fed(0.29), limits: { 'total-sulfur': { value: 0.28 } } });
    expect(finding).toMatchObject({ status: 'over', signOff: 'reason', limit: 0.28, limitStatus: null });
    expect(finding.markers[0]).toMatchObject({ value: 0.3, status: 'published' });
  });

  it('holds a looser own limit with its reason and source, but never past the 0.50 grade', () => {
    const limits = { 'total-sulfur': { value: 0.6, reason: 'Fed so for years', source: 'Trial of the firm' } };
    expect(sulfurOf({ ...fed(0.45), limits })).toMatchObject({ status: 'near', limit: 0.5 });
    expect(sulfurOf({ ...fed(0.45), limits }).assumptions.join()).toMatch(
      /An own limit of 0\.6 % of DM stands for total sulfur.* It was held to 0\.5 % of DM/,
    );
    expect(sulfurOf({ ...fed(0.51), limits })).toMatchObject({
      status: 'over',
      signOff: 'veterinarian',
      standingAllowed: false,
    });
  });

  it('keeps the published limit when a looser own one has no reason or source', () => {
    const finding = sulfurOf({ ...fed(0.35), limits: { 'total-sulfur': { value: 0.45 } } });
    expect(finding).toMatchObject({ status: 'over', limit: 0.3 });
    expect(finding.assumptions.join()).toMatch(/no reason or source/);
  });

  it('explains itself with its numbers', () => {
    expect(sulfurOf(fed(0.45)).why).toMatch(/0\.45 % of DM, above the limit of 0\.3 % of DM/);
  });
});
