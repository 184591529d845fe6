import type * as v from 'valibot';

/** Says in plain words what is wrong with an object: a field missing, a field not known here, or no object at all. */
export function objectMessage(issue: v.StrictObjectIssue): string {
  if (issue.expected === 'never') return `There is no field named ${issue.received} here: leave it out`;
  if (issue.expected === 'Object' && issue.received !== 'undefined') return 'Send an object with fields here';
  return 'This field is missing';
}
