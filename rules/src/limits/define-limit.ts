import type { LimitTable, RuleId, SignOff } from '@brimgate/reference-tables';
import type { OwnLimits } from '../screenings/own-limits.schema';
import type { ScreeningRequest } from '../screenings/screening-request.schema';
import type { Finding } from '../screenings/screening.schema';
import { applicableRow } from './applicable-row';
import { nearLine, ownLimit, publishedLimit, type EffectiveLimit } from './effective-limit';
import { findingOf, notAsked } from './finding';
import type { LimitFacts, QuantityName } from './limit-facts';
import { measureLimit, type MeasureDefinition } from './measurement';

export interface LimitDefinition<Need extends QuantityName> extends MeasureDefinition<Need> {
  readonly id: RuleId;
  /** Begins the sentence of the finding: "Sulfur of feed and drinking water". */
  readonly subject: string;
  /** Why the question is not asked of this ration; null when it is. */
  readonly whyNotAsked?: (facts: LimitFacts) => string | null;
  /** For limits that only a yard sets. */
  readonly yardCap?: (request: ScreeningRequest) => { value: number | undefined; signOff: SignOff };
}

export interface LimitResult {
  readonly finding: Finding;
  readonly assumptions: readonly string[];
}

export interface Limit {
  readonly id: RuleId;
  /** Whether the finding can ask for a sign-off, and so colours the ration. */
  readonly canAskForSignOff: (facts: LimitFacts) => boolean;
  readonly evaluate: (facts: LimitFacts) => LimitResult;
}

const asking: readonly SignOff[] = ['reason', 'compliance', 'veterinarian'];

/** Makes a limit from what it measures; values, grades, sign-offs and sources come from its table. */
export function defineLimit<Need extends QuantityName>(definition: LimitDefinition<Need>): Limit {
  const tableFor = (facts: LimitFacts): LimitTable => {
    const table = facts.tables.limits[definition.id];
    const cap = definition.yardCap?.(facts.request);
    return cap ? { ...table, signOff: { ...table.signOff, over: cap.signOff, undetermined: cap.signOff } } : table;
  };
  return {
    id: definition.id,
    canAskForSignOff: (facts) => {
      const { signOff, grades } = tableFor(facts);
      return [signOff.over, signOff.undetermined, ...grades.map((grade) => grade.signOff)].some((s) =>
        asking.includes(s),
      );
    },
    evaluate: (facts) => evaluate(definition, tableFor(facts), facts),
  };
}

function evaluate<Need extends QuantityName>(
  definition: LimitDefinition<Need>,
  table: LimitTable,
  facts: LimitFacts,
): LimitResult {
  const reason = definition.whyNotAsked?.(facts) ?? null;
  if (reason !== null) return { finding: notAsked(table, reason), assumptions: [] };
  const chosen = definition.yardCap
    ? yardLimit(table, definition.yardCap(facts.request).value)
    : tableLimit(definition.id, table, facts);
  if (!chosen) {
    const why = `The reference tables hold no ${table.title.toLowerCase()} limit for cattle at this stage.`;
    return { finding: notAsked(table, why), assumptions: [] };
  }
  const measured = measureLimit(definition, facts.quantities);
  const finding = findingOf({ subject: definition.subject, table, limit: chosen, measured, facts });
  return { finding, assumptions: chosen.assumptions };
}

function yardLimit(table: LimitTable, value: number | undefined): EffectiveLimit | null {
  if (value === undefined) return null;
  return {
    value,
    nearFrom: nearLine(table, value),
    status: null,
    locator: "the yard's own cap",
    sourceId: null,
    label: "the yard's own cap",
    published: null,
    assumptions: [],
  };
}

function tableLimit(id: RuleId, table: LimitTable, facts: LimitFacts): EffectiveLimit | null {
  const applicable = applicableRow(table, facts.request.cattle.stage, facts.quantities.roughagePctDm);
  if (!applicable) return null;
  const published = publishedLimit(table, applicable.row);
  const own = isOwnLimitId(id) ? facts.request.limits?.[id] : undefined;
  const chosen = own ? ownLimit(table, published, own) : published;
  if (applicable.isCertain) return chosen;
  const said = `The roughage share is not fully known, so the stricter limit for ${table.title.toLowerCase()} was taken: ${published.label}.`;
  return { ...chosen, assumptions: [said, ...chosen.assumptions] };
}

const isOwnLimitId = (id: RuleId): id is RuleId & keyof OwnLimits => id !== 'nitrogen-cap' && id !== 'phosphorus-cap';
