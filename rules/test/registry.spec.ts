import { NEWEST_EDITION, ruleIds, sources, tablesOf } from '@brimgate/reference-tables';
import { describe, expect, it } from 'vitest';
import { limits } from '../src/limits';
import { screen } from '../src/screenings/screen';
import { aRequest } from '../src/testing';

const tables = tablesOf(NEWEST_EDITION);
// Who signs, in the order of the list: compliance staff come after the nutritionist, who always reads a ration first.
const place = { none: 0, notice: 1, compliance: 2, reason: 3, veterinarian: 4 } as const;

describe('the registry of limits', () => {
  it('lists every limit that has a table, each once', () => {
    expect(limits.map(({ id }) => id).sort()).toEqual([...ruleIds].sort());
  });

  it('stands in the order people see: veterinarian, reason, compliance, notice', () => {
    const heaviest = limits.map(({ id }) => {
      const { signOff, grades } = tables.limits[id];
      const isCap = id === 'nitrogen-cap' || id === 'phosphorus-cap';
      const asked = [
        signOff.over,
        signOff.undetermined,
        ...grades.map((grade) => grade.signOff),
        isCap ? 'compliance' : 'none',
      ] as const;
      return Math.max(...asked.map((signOff) => place[signOff]));
    });
    expect(heaviest).toEqual(heaviest.toSorted((one, other) => other - one));
  });

  it.each(limits.map(({ id }) => id))('has a source for every published line of %s', (id) => {
    const { rows, grades, markers } = tables.limits[id];
    const lines = [...rows, ...grades, ...markers].filter(({ status }) => status === 'published');
    expect(lines.filter(({ sourceId }) => sourceId === 'none' || !(sourceId in sources))).toEqual([]);
  });

  it('answers with every rule in every screening, in its own order', () => {
    expect(screen(aRequest()).findings.map(({ rule }) => rule)).toEqual(limits.map(({ id }) => id));
  });

  it('names only documents and cautions that exist', () => {
    const { findings } = screen(aRequest());
    const cautionIds = tables.cautions.map(({ id }) => id);
    expect(findings.flatMap(({ basis }) => basis).filter((id) => !(id in sources))).toEqual([]);
    expect(findings.flatMap(({ cautions }) => cautions).filter((id) => !cautionIds.includes(id))).toEqual([]);
  });
});
