import type { LedgerView, LotView } from '@brimgate/rules';
import { decimalsToTellApart, formatNumber, formatWithUnit } from '../../lib/format';

export type LedgerNutrient = 'nitrogen' | 'phosphorus';

const names: Readonly<Record<LedgerNutrient, string>> = { nitrogen: 'Nitrogen', phosphorus: 'Phosphorus' };

/**
 * What one finished animal excreted, as a mean over the lots where it is determined. [kg per head]
 *
 * Weighted by head: the lots' stored sums over the head they stand for. Null when no lot is determined.
 */
export function excretedKgPerHead(lots: readonly LotView[], nutrient: LedgerNutrient): number | null {
  let excretedKg = 0;
  let head = 0;
  for (const lot of lots) {
    const lotKg = lot.excretion.wholeLot[nutrient].excretedKg;
    if (lotKg === null) continue;
    excretedKg += lotKg;
    head += lot.head;
  }
  return head === 0 ? null : excretedKg / head;
}

export interface NutrientAnswer {
  nutrient: LedgerNutrient;
  excretedKg: number | null;
  perHeadKg: number | null;
  capKgPerHead: number | null;
  /** Null: no cap, or the figure is not determined. */
  isOverCap: boolean | null;
  sentence: string;
}

/** The period's answer for one nutrient: what was excreted, a head, and against the yard's cap where one is set. */
export function nutrientAnswer(ledger: LedgerView, nutrient: LedgerNutrient): NutrientAnswer {
  const excretedKg = ledger[nutrient].excretedKg;
  const perHeadKg = excretedKgPerHead(ledger.lots, nutrient);
  const capKgPerHead = nutrient === 'nitrogen' ? ledger.capNitrogenKgPerHead : ledger.capPhosphorusKgPerHead;
  const isOverCap = perHeadKg === null || capKgPerHead === null ? null : exceeds(perHeadKg, capKgPerHead);
  return {
    nutrient,
    excretedKg,
    perHeadKg,
    capKgPerHead,
    isOverCap,
    sentence: answerSentence(names[nutrient], { excretedKg, perHeadKg, capKgPerHead, isOverCap }),
  };
}

// Rules compare at 9 decimals: what differs by less is the noise of adding up.
const exceeds = (value: number, cap: number) => value - cap > 5e-10;

// A cap is the yard's own word: it is shown with every digit it was given, one at least.
const decimalsTyped = (cap: number) => Math.max(1, String(cap).split('.')[1]?.length ?? 0);

function answerSentence(name: string, answer: Omit<NutrientAnswer, 'nutrient' | 'sentence'>): string {
  const { excretedKg, perHeadKg, capKgPerHead } = answer;
  if (excretedKg === null || perHeadKg === null) return `${name} excreted: not determined.`;
  const decimals =
    capKgPerHead === null ? 1 : decimalsToTellApart(perHeadKg, capKgPerHead, decimalsTyped(capKgPerHead));
  const perHead = formatWithUnit(perHeadKg, decimals, 'kg a head');
  const amount = `${name} excreted ${formatWithUnit(excretedKg, 0, 'kg')}, ${perHead}`;
  if (capKgPerHead === null) return `${amount}; the yard has set no cap.`;
  const cap = formatWithUnit(capKgPerHead, decimals, 'kg');
  return answer.isOverCap ? `${amount}: over the yard’s cap of ${cap}.` : `${amount}, within the yard’s cap of ${cap}.`;
}

/** Which lots of the period exceed a cap, by name. */
export function lotsOverCap(ledger: LedgerView, nutrient: LedgerNutrient): LotView[] {
  const cap = nutrient === 'nitrogen' ? ledger.capNitrogenKgPerHead : ledger.capPhosphorusKgPerHead;
  if (cap === null) return [];
  return ledger.lots.filter((lot) => exceeds(lot.excretion.perHead[nutrient].excretedKg ?? 0, cap));
}

/** What the totals leave out, as a sentence; null when every lot is in them. */
export function notDeterminedSentence(ledger: LedgerView): string | null {
  const left = ledger.lotsNotDetermined;
  if (left === 0) return null;
  const lots = left === 1 ? '1 lot is' : `${formatNumber(left, 0)} lots are`;
  return `${lots} not determined and not in these totals.`;
}
