import { describe, expect, it } from 'vitest';
import { aFinding } from '../../../test/a-screening-view';
import { whySentences } from './why-sentences';

describe('why a version is at the desk', () => {
  it('puts what the veterinarian signs before what only gives a notice', () => {
    const { asking } = whySentences([
      aFinding({ rule: 'water-sulfate', status: 'over', signOff: 'notice', why: 'Water sulfate is 1,200 mg/L' }),
      aFinding({ status: 'over', signOff: 'veterinarian', why: 'Total sulfur is 0.43 % of DM.' }),
      aFinding({ rule: 'total-fat' }),
    ]);
    expect(asking).toEqual(['Total sulfur is 0.43 % of DM.', 'Water sulfate is 1,200 mg/L.']);
  });

  it('names what is not determined apart, and leaves out what was not asked', () => {
    const { asking, notDetermined } = whySentences([
      aFinding({ status: 'undetermined', signOff: 'veterinarian', why: 'NPN is not known.' }),
      aFinding({ applies: false, status: null, why: 'The yard has set no cap.' }),
    ]);
    expect(asking).toEqual([]);
    expect(notDetermined).toEqual(['NPN is not known.']);
  });
});
