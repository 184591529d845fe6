import type { ScreeningView } from '@brimgate/rules';
import { describe, expect, it } from 'vitest';
import { aScreeningView } from '../../../test/a-screening-view';
import { hasChanges, versionChanges } from './version-changes';

const line = (feedstuff: string, sharePctDm: number) => ({ feedstuff, sharePctDm, composition: {} });
const plain = (text: string | undefined) => text?.replaceAll(/[  ]/g, ' ');

function fedOn(overrides: Partial<ScreeningView['request']>, sulfurPctDm: number | null = 0.31): ScreeningView {
  const view = aScreeningView();
  return {
    ...view,
    request: { ...view.request, ...overrides },
    screening: { ...view.screening, totals: { ...view.screening.totals, sulfurPctDm } },
  };
}

const before = fedOn({ lines: [line('Corn, high-moisture', 60), line('Distillers grains, wet', 40)] });

describe('what changed since the version that is fed', () => {
  it('is nothing when both read alike', () => {
    expect(hasChanges(versionChanges(before, before))).toBe(false);
  });

  it('names the shares that moved and leaves out those that stayed', () => {
    const after = fedOn({
      lines: [line('Corn, high-moisture', 60), line('Distillers grains, wet', 30), line('Wheat straw', 10)],
    });
    const { fed } = versionChanges(before, after);
    expect(fed.map((change) => [change.label, plain(change.before), plain(change.after)])).toEqual([
      ['Distillers grains, wet', '40.0 % of DM', '30.0 % of DM'],
      ['Wheat straw', 'not in it', '10.0 % of DM'],
    ]);
  });

  it('adds up a feedstuff that stands on two lines', () => {
    const after = fedOn({
      lines: [line('Corn, high-moisture', 40), line('Corn, high-moisture', 20), line('Distillers grains, wet', 40)],
    });
    expect(versionChanges(before, after).fed).toEqual([]);
  });

  it('tells water whose sulfate is not determined from water without sulfate', () => {
    const known = { name: 'north well', sharePct: 100, sulfate: { value: 0, as: 'SO4' as const } };
    const unknown = { name: 'north well', sharePct: 100 };
    const { drunk } = versionChanges(fedOn({ waters: [known] }), fedOn({ waters: [unknown] }));
    expect(drunk.map((change) => [plain(change.before), plain(change.after)])).toEqual([
      ['100 % of the water, 0 mg/L SO4', '100 % of the water, sulfate not determined'],
    ]);
  });

  it('shows a total that is no longer determined as such', () => {
    const { totals } = versionChanges(before, fedOn({ lines: before.request.lines }, null));
    expect(totals).toMatchObject([{ label: 'Total sulfur', after: 'not determined' }]);
  });
});
