import { describe, expect, it } from 'vitest';
import { aLine, aRequest } from '../testing';
import { contentText } from './content-hash';

const text = contentText(aRequest());

describe('the text of the content hash', () => {
  it('does not change with names, draws, the order of lines or a written-out newest edition', () => {
    const request = aRequest();
    const renamed = request.lines.map((line) => ({ ...line, feedstuff: `${line.feedstuff} 2` })).toReversed();
    expect(contentText({ ...request, lines: renamed, draws: 10, seed: 3, edition: '2026-12' })).toBe(text);
  });

  it.each([
    ['a share', aRequest({ lines: [aLine('grain', 79), aLine('hay', 21, { roughageSharePctDm: 100, ndfPctDm: 60 })] })],
    [
      'a composition',
      aRequest({
        lines: [aLine('grain', 80, { sulfurPctDm: 0.21 }), aLine('hay', 20, { roughageSharePctDm: 100, ndfPctDm: 60 })],
      }),
    ],
    ['a water', aRequest({ waters: [{ name: 'well', sharePct: 100, sulfate: { value: 1, as: 'SO4' } }] })],
    ['the water drunk', aRequest({ waterIntake: { litresPerDay: 41 } })],
    ['the stage', aRequest({ cattle: { stage: 'growing', bodyWeightKg: 450, dryMatterIntakeKgPerDay: 10 } })],
    ['an own limit', aRequest({ limits: { 'total-sulfur': { value: 0.28 } } })],
    ['a cap', aRequest({ yardCap: { nitrogenKgPerHead: 30 } })],
  ])('changes with %s', (_what, request) => {
    expect(contentText(request)).not.toBe(text);
  });

  it('changes with the rules version', () => {
    expect(contentText(aRequest(), '9.9.9')).not.toBe(text);
  });
});
