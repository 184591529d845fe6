import { NEWEST_EDITION } from '@brimgate/reference-tables';
import { describe, expect, it } from 'vitest';
import { aRation, aWaterAnalysis, aYard, factsOfARation } from '../testing';
import { assembleScreeningRequest } from './screening-request';

const assemble = (content = aRation(), facts = factsOfARation()) =>
  assembleScreeningRequest({ content, ...facts, edition: NEWEST_EDITION });

describe('a request assembled from a ration', () => {
  it('holds the resolved feedstuffs and waters', () => {
    const { request } = assemble();
    expect(request?.lines.map(({ feedstuff, sharePctDm }) => [feedstuff, sharePctDm])).toEqual([
      ['grain', 80],
      ['hay', 20],
    ]);
    expect(request?.waters).toEqual([
      {
        name: 'north well',
        sharePct: 100,
        sulfate: { value: 90, as: 'SO4' },
        nitrate: { value: 5, as: 'NO3' },
        totalDissolvedSolidsMgPerL: 400,
      },
    ]);
  });

  it('leaves out what was not analysed', () => {
    const waters = [aWaterAnalysis({ sulfate: null, nitrate: null, totalDissolvedSolidsMgPerL: null })];
    expect(assemble(aRation(), { ...factsOfARation(), waters }).request?.waters).toEqual([
      { name: 'north well', sharePct: 100 },
    ]);
  });

  it('takes the caps of the yard with who answers for them', () => {
    const yard = aYard({ capNitrogenKgPerHead: 30, capSignOff: 'compliance' });
    expect(assemble(aRation(), { ...factsOfARation(), yard }).request?.yardCap).toEqual({
      nitrogenKgPerHead: 30,
      signOff: 'compliance',
    });
    expect(assemble().request?.yardCap).toBeUndefined();
  });

  it('names the line whose feedstuff and the water whose analysis is not known', () => {
    const { request, problems } = assemble(aRation(), { ...factsOfARation(), feedstuffs: [], waters: [] });
    expect(request).toBeNull();
    expect(problems?.map(({ path }) => path)).toEqual([
      'lines.0.feedstuffId',
      'lines.1.feedstuffId',
      'waters.0.waterAnalysisId',
    ]);
  });

  it('judges the shares', () => {
    const { problems } = assemble(aRation({ lines: [{ feedstuffId: 'grain', sharePctDm: 80 }] }));
    expect(problems).toEqual([{ path: 'lines', message: 'Shares add to 80, not 100' }]);
  });
});
