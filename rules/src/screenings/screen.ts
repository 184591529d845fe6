import { NEWEST_EDITION, tablesOf } from '@brimgate/reference-tables';
import { rationExcretion } from '../excretion/ration-excretion';
import { limits } from '../limits';
import type { LimitFacts, Quantities } from '../limits/limit-facts';
import { between, exactly } from '../quantities/bounded-quantity';
import { dietOf, type Diet } from '../rations/diet';
import { RULES_VERSION } from '../rules-version';
import type { ScreeningRequest } from './screening-request.schema';
import type { Screening } from './screening.schema';
import { totalsOf } from './totals';
import { heaviestSignOff, verdictOf } from './verdict';

/**
 * Screens a ration with its water against every limit of an edition.
 *
 * Pure: the same request gives the same screening, byte for byte. The request must have passed its schema.
 * Throws UnknownEdition for an edition that is not in the reference tables.
 */
export function screen(request: ScreeningRequest): Screening {
  const tables = tablesOf(request.edition ?? NEWEST_EDITION);
  const { diet, assumptions } = dietOf(request, tables);
  const excretion = rationExcretion(request.cattle, diet, tables);
  const { nitrogenExcretedKgPerHead, phosphorusExcretedKgPerHead } = excretion;
  const npnFedBodyWeightKg = npnFedWeight(request, diet);
  const quantities: Quantities = {
    ...diet,
    npnFedBodyWeightKg,
    nitrogenExcretedKgPerHead,
    phosphorusExcretedKgPerHead,
  };
  const facts: LimitFacts = { request, quantities, tables };
  const results = limits.map((limit) => ({ ...limit.evaluate(facts), colours: limit.canAskForSignOff(facts) }));
  const findings = results.map((result) => result.finding);
  return {
    rulesVersion: RULES_VERSION,
    edition: tables.edition,
    totals: totalsOf(request, diet, tables),
    verdict: verdictOf(results.filter((result) => result.colours).map((result) => result.finding)),
    signOff: heaviestSignOff(findings),
    findings,
    excretion: excretion.estimate,
    assumptions: [
      ...assumptions,
      ...results.flatMap((result) => result.assumptions),
      ...excretion.assumptions,
      ...drawsNotMade(request),
    ],
  };
}

/** Cattle that may get NPN or not are held to no weight yet, so their weight has no ceiling. */
function npnFedWeight({ cattle }: ScreeningRequest, diet: Diet) {
  const npn = diet.npnProteinEquivalentPctDm;
  if (npn.atLeast > 0 || npn.value !== null) return exactly(cattle.bodyWeightKg);
  return between({ atLeast: cattle.bodyWeightKg, atMost: Infinity }, npn.missing);
}

const drawsNotMade = ({ draws = 0 }: ScreeningRequest): string[] =>
  draws > 0
    ? [
        'Load-to-load spread is not drawn by this version of the rules: intervals and chances beyond a limit are not determined.',
      ]
    : [];
