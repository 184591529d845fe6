import * as v from 'valibot';
import coProducts from '../checks/co-products.2026-12.json';
import compounds from '../checks/compounds.2026-12.json';
import excretion from '../checks/excretion.2026-12.json';
import netEnergy from '../checks/net-energy.2026-12.json';
import nitrate from '../checks/nitrate.2026-12.json';
import npn from '../checks/npn.2026-12.json';
import sulfur from '../checks/sulfur.2026-12.json';
import tradeFactTable from '../checks/trade-facts.common-practice.json';
import water from '../checks/water.2026-12.json';
import { CheckTable, type AnsweredCheck, type PublishedCheck, type UnansweredCheck } from './check.schema';
import { TradeFactTable, type TradeFact } from './trade-fact.schema';

export type { AnsweredCheck, CheckedFunction, PublishedCheck, Tolerance, UnansweredCheck } from './check.schema';
export type { ConcentrationFact, FindingFact, MassBalanceFact, TradeFact } from './trade-fact.schema';

export const publishedChecks: readonly PublishedCheck[] = [
  sulfur,
  water,
  nitrate,
  npn,
  compounds,
  netEnergy,
  excretion,
  coProducts,
].flatMap((table) => v.parse(CheckTable, table).checks);

export const answeredChecks: readonly AnsweredCheck[] = publishedChecks.filter((check) => check.function !== null);

export const unansweredChecks: readonly UnansweredCheck[] = publishedChecks.filter((check) => check.function === null);

/** Facts of the trade without a document: common practice, and shown as such. */
export const tradeFacts: readonly TradeFact[] = v.parse(TradeFactTable, tradeFactTable).facts;
