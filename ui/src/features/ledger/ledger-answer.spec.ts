import type { LedgerView } from '@brimgate/rules';
import { describe, expect, it } from 'vitest';
import { aLot, aLotNotDetermined } from '../../../test/a-lot';
import { excretedKgPerHead, lotsOverCap, notDeterminedSentence, nutrientAnswer } from './ledger-answer';

function aLedger(overrides: Partial<LedgerView> = {}): LedgerView {
  return {
    yard: { id: '2f4e1c1e-7d0a-4a53-9c3b-0a4f5f2f6c11', name: 'Dry Fork' },
    from: '2026-01-01',
    to: '2026-06-30',
    headFinished: 200,
    nitrogen: { intakeKg: 6000, retainedKg: 800, excretedKg: 5200 },
    phosphorus: { intakeKg: 1000, retainedKg: 200, excretedKg: 800 },
    lotsNotDetermined: 0,
    capNitrogenKgPerHead: null,
    capPhosphorusKgPerHead: null,
    lots: [aLot()],
    ...overrides,
  };
}

const plain = (text: string) => text.replaceAll(/[  ]/g, ' ');

describe('the answer of the ledger', () => {
  it('weights the mean by head', () => {
    // 200 head × 26 kg and 100 head × 26 kg, then one lot of 100 head at 32 kg: (7800 + 3200) / 400 = 27.5
    const heavy = aLot({ head: 100 });
    heavy.excretion.wholeLot.nitrogen.excretedKg = 3200;
    expect(excretedKgPerHead([aLot(), aLot({ head: 100 }), heavy], 'nitrogen')).toBeCloseTo(27.5);
  });

  it('leaves lots that are not determined out of the mean, never as zero', () => {
    expect(excretedKgPerHead([aLot(), aLotNotDetermined({ head: 5000 })], 'nitrogen')).toBeCloseTo(26);
    expect(excretedKgPerHead([aLotNotDetermined()], 'nitrogen')).toBeNull();
  });

  it('holds the mean against the yard’s cap', () => {
    const over = nutrientAnswer(aLedger({ capPhosphorusKgPerHead: 3.9 }), 'phosphorus');
    expect(over.isOverCap).toBe(true);
    expect(plain(over.sentence)).toBe('Phosphorus excreted 800 kg, 4.0 kg a head: over the yard’s cap of 3.9 kg.');
    const within = nutrientAnswer(aLedger({ capPhosphorusKgPerHead: 4 }), 'phosphorus');
    expect(within.isOverCap).toBe(false);
  });

  it('shows enough decimals to tell a figure from its cap', () => {
    const answer = nutrientAnswer(aLedger({ capPhosphorusKgPerHead: 3.98 }), 'phosphorus');
    expect(plain(answer.sentence)).toContain('4.00 kg a head: over the yard’s cap of 3.98 kg');
  });

  it('says that no cap is set', () => {
    expect(plain(nutrientAnswer(aLedger(), 'nitrogen').sentence)).toBe(
      'Nitrogen excreted 5,200 kg, 26.0 kg a head; the yard has set no cap.',
    );
  });

  it('claims nothing about a cap when the figure is not determined', () => {
    const none = { intakeKg: null, retainedKg: null, excretedKg: null };
    const answer = nutrientAnswer(
      aLedger({ nitrogen: none, lots: [aLotNotDetermined()], capNitrogenKgPerHead: 20 }),
      'nitrogen',
    );
    expect(answer).toMatchObject({ isOverCap: null, sentence: 'Nitrogen excreted: not determined.' });
  });

  it('names the lots over a cap', () => {
    const lots = [aLot({ name: 'Lot 118' }), aLotNotDetermined({ name: 'Lot 121' })];
    expect(lotsOverCap(aLedger({ lots, capNitrogenKgPerHead: 25.9 }), 'nitrogen').map((lot) => lot.name)).toEqual([
      'Lot 118',
    ]);
    expect(lotsOverCap(aLedger({ lots, capNitrogenKgPerHead: 26 }), 'nitrogen')).toEqual([]);
  });

  it('says how many lots the totals leave out', () => {
    expect(notDeterminedSentence(aLedger())).toBeNull();
    expect(notDeterminedSentence(aLedger({ lotsNotDetermined: 2 }))).toBe(
      '2 lots are not determined and not in these totals.',
    );
  });
});
