import { NEWEST_EDITION, editionIds, tablesOf, type LimitTable, type RuleId } from '@brimgate/reference-tables';

/** Short enough for one line of the headroom chart on a phone; the table's title stands everywhere else. */
const shortTitles: Readonly<Partial<Record<RuleId, string>>> = {
  'npn-share': 'NPN, share of nitrogen',
  'npn-class': 'NPN, weight of cattle',
  'water-sulfate': 'Water sulfate',
};

/** Units as the charts print them; elsewhere they stand in full. */
const shortUnits: Readonly<Record<string, string>> = {
  'kg N per finished head': 'kg N a head',
  'kg P per finished head': 'kg P a head',
  'mg/L as SO4': 'mg/L',
};

/** The limit table a finding was judged by; null for a rule that this edition of the interface does not know. */
export function limitTableOf(rule: string, edition: string): LimitTable | null {
  const tables = tablesOf(editionIds.includes(edition) ? edition : NEWEST_EDITION);
  return rule in tables.limits ? tables.limits[rule as RuleId] : null;
}

/** What the rules call the water among the contributors. */
export const WATER = 'drinking water';

const sentenceCase = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

export const ruleTitle = (rule: string, edition: string): string =>
  limitTableOf(rule, edition)?.title ?? sentenceCase(rule.replaceAll('-', ' '));

export const shortRuleTitle = (rule: string, edition: string): string =>
  shortTitles[rule as RuleId] ?? ruleTitle(rule, edition);

/** Among feedstuffs, which all start with a capital, the water does so too. */
export const contributorTitle = (name: string): string => (name === WATER ? sentenceCase(name) : name);

export const shortUnit = (unit: string): string => shortUnits[unit] ?? unit;

/** In the middle of a sentence a title starts small, unless it is an abbreviation. */
export function inSentence(title: string): string {
  const second = title.charAt(1);
  return second === second.toUpperCase() ? title : title.charAt(0).toLowerCase() + title.slice(1);
}
