import { sources } from '@brimgate/reference-tables';
import {
  answeredChecks,
  unansweredChecks,
  type AnsweredCheck,
  type Tolerance,
} from '@brimgate/reference-tables/checks';
import { describe, expect, it } from 'vitest';
import { answers } from './check-answers';

const allowed = (tolerance: Tolerance, expected: number): number =>
  'absolute' in tolerance ? tolerance.absolute : tolerance.relative * Math.abs(expected);

/** The answers that lie outside the tolerance, in words. */
function disagreements(check: AnsweredCheck): string[] {
  const found = answers[check.function](check.inputs);
  return Object.entries(check.expected).flatMap(([name, expected]) => {
    const value = found[name];
    if (typeof value !== 'number') return [`${name} is not answered`];
    return Math.abs(value - expected) <= allowed(check.tolerance, expected)
      ? []
      : [`${name} is ${value}, printed ${expected}`];
  });
}

const titled = (check: { id: string; sourceId: string; locator: string }) =>
  [`${check.id} (${check.sourceId}, ${check.locator})`, check] as const;

const agreeing = answeredChecks.filter((check) => !check.knownMismatch);
const mismatching = answeredChecks.filter((check) => check.knownMismatch);

describe('published worked examples are met', () => {
  it.each(agreeing.map((check) => [titled(check)[0], check] as const))('%s', (_title, check) => {
    expect(check.sourceId in sources).toBe(true);
    expect(disagreements(check)).toEqual([]);
  });
});

describe('published figures known to disagree still do', () => {
  it.each(mismatching.map((check) => [titled(check)[0], check] as const))('%s', (_title, check) => {
    expect(disagreements(check)).not.toEqual([]);
    expect(check.note, 'a known mismatch says why').toBeTruthy();
  });
});

describe('published figures that nothing here answers are listed with the reason', () => {
  it.each(unansweredChecks.map((check) => [`${titled(check)[0]}: ${check.why}`, check] as const))(
    '%s',
    (_title, check) => {
      expect(check.why.length).toBeGreaterThan(10);
    },
  );
});
