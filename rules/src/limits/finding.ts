import type { LimitTable } from '@brimgate/reference-tables';
import type { Finding } from '../screenings/screening.schema';
import type { EffectiveLimit } from './effective-limit';
import { judge, type Judgement } from './judgement';
import type { LimitFacts } from './limit-facts';
import { markersOf } from './markers';
import type { Measurement } from './measurement';
import { whyInWords } from './why';

interface FindingFacts {
  readonly subject: string;
  readonly table: LimitTable;
  readonly limit: EffectiveLimit;
  readonly measured: Measurement;
  readonly facts: LimitFacts;
}

/** The finding of a limit that was asked; fields stand in the order of the contract. */
export function findingOf({ subject, table, limit, measured, facts }: FindingFacts): Finding {
  const judgement = judge(table, limit, measured);
  const isFloorKnown = measured.value === null && table.direction === 'max' && measured.atLeast > 0;
  return {
    rule: table.subject,
    applies: true,
    status: judgement.status,
    signOff: judgement.signOff,
    standingAllowed: judgement.standingAllowed,
    value: measured.value,
    atLeast: isFloorKnown ? measured.atLeast : null,
    limit: limit.value,
    unit: table.unit,
    direction: table.direction,
    percentOfLimit: percentOfLimit(table, limit.value, measured.value),
    limitStatus: limit.status,
    limitLocator: limit.locator,
    markers: markersOf(table, limit, facts.quantities.roughagePctDm.value),
    interval90: null,
    chanceBeyondLimit: null,
    contributors: [...measured.contributors],
    missing: [...measured.missing],
    basis: basisOf(limit, judgement),
    why: whyInWords({ subject, table, limit, measured, judgement, request: facts.request }),
    cautions: [...table.cautions],
  };
}

/** The finding of a question that was not asked of this ration: no status and no part in the verdict. */
export function notAsked(table: LimitTable, why: string): Finding {
  return {
    rule: table.subject,
    applies: false,
    status: null,
    signOff: 'none',
    standingAllowed: false,
    value: null,
    atLeast: null,
    limit: null,
    unit: table.unit,
    direction: table.direction,
    percentOfLimit: null,
    limitStatus: null,
    limitLocator: null,
    markers: [],
    interval90: null,
    chanceBeyondLimit: null,
    contributors: [],
    missing: [],
    basis: [],
    why,
    cautions: [],
  };
}

const MOST_PERCENT = 999;

/** How much of the limit is used. [%] For a minimum the limit over the value, at most 999. */
function percentOfLimit(table: LimitTable, limit: number, value: number | null): number | null {
  if (value === null) return null;
  if (table.direction === 'max') return (100 * value) / limit;
  return value === 0 ? MOST_PERCENT : Math.min(MOST_PERCENT, (100 * limit) / value);
}

function basisOf(limit: EffectiveLimit, judgement: Judgement): string[] {
  const ids = [limit.sourceId, limit.published?.basis, judgement.grade?.sourceId];
  return [...new Set(ids.filter((id) => typeof id === 'string' && id !== 'none'))] as string[];
}
