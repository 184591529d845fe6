import type { LedgerQuery, LedgerView, LotView, NutrientTotals } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { CurrentUser } from '../common/current-user';
import { toLotView } from '../lots/lot.view';
import { LedgerLots } from './ledger-lots.service';

type Nutrient = 'nitrogen' | 'phosphorus';
type Figure = keyof NutrientTotals;

/** The nutrient ledger of a yard over a period. */
@Injectable()
export class LedgerService {
  constructor(private readonly ledgerLots: LedgerLots) {}

  async view({ user, query }: { user: CurrentUser; query: LedgerQuery }): Promise<LedgerView> {
    const period = await this.ledgerLots.period({ user, query });
    const lots: LotView[] = [];
    for await (const row of this.ledgerLots.each(period)) lots.push(toLotView(row));
    const { yard, from, to } = period;
    return {
      yard: { id: yard.uuid, name: yard.name },
      from,
      to,
      headFinished: lots.reduce((head, lot) => head + lot.head, 0),
      nitrogen: totalsOf('nitrogen', lots),
      phosphorus: totalsOf('phosphorus', lots),
      lotsNotDetermined: lots.filter((lot) => !isDetermined(lot)).length,
      capNitrogenKgPerHead: yard.capNitrogenKgPerHead,
      capPhosphorusKgPerHead: yard.capPhosphorusKgPerHead,
      lots,
    };
  }
}

const isDetermined = ({ excretion: { wholeLot } }: LotView) =>
  wholeLot.nitrogen.excretedKg !== null && wholeLot.phosphorus.excretedKg !== null;

/**
 * Stored figures added up over the lots whose excretion of the nutrient is known, so that intake less what is kept is
 * what is excreted; null where there is no such lot, because nothing known is not zero.
 */
function totalsOf(nutrient: Nutrient, lots: readonly LotView[]): NutrientTotals {
  const balances = lots.map((lot) => lot.excretion.wholeLot[nutrient]).filter((balance) => balance.excretedKg !== null);
  const sum = (figure: Figure) =>
    balances.length === 0 ? null : balances.reduce((total, balance) => total + (balance[figure] ?? 0), 0);
  return { intakeKg: sum('intakeKg'), retainedKg: sum('retainedKg'), excretedKg: sum('excretedKg') };
}
