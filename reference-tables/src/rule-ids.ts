/** The rules that have a limit table, in alphabetical order; a rule id is also the name of its file. */
export const ruleIds = [
  'added-fat',
  'calcium-phosphorus',
  'nitrogen-cap',
  'npn-class',
  'npn-share',
  'phosphorus-cap',
  'roughage-minimum',
  'total-fat',
  'total-sulfur',
  'urea-level',
  'water-sulfate',
] as const;
export type RuleId = (typeof ruleIds)[number];
