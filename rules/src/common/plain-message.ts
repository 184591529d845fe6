import type * as v from 'valibot';

const THINGS: Readonly<Record<string, string>> = {
  string: 'text',
  number: 'a number',
  boolean: 'true or false',
  Array: 'a list',
  Object: 'an object with fields',
};

/** What is wrong with an entry and what to send instead, for every check that has no message of its own. */
export function plainMessage(issue: v.BaseIssue<unknown>): string {
  const { expected, received, type } = issue;
  if (expected === 'never') return `There is no field named ${received} here: leave it out`;
  if (received === 'undefined') return 'This field is missing';
  if (type === 'max_length') return `Keep it within ${lengthOf(expected)} characters`;
  const thing = expected === null ? undefined : THINGS[expected];
  if (thing !== undefined) return `Send ${thing} here`;
  const choices = expected?.match(/"[^"]*"/g);
  if (choices) return `Send ${choices.join(' or ')} here`;
  return 'This entry cannot be read: check it';
}

const lengthOf = (expected: string | null): string => expected?.replace(/\D/g, '') ?? 'fewer';
