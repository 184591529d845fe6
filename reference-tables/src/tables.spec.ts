import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import sourceList from '../sources.json';
import { publishedChecks, tradeFacts } from './checks';
import { feedstuffs } from './feedstuffs';
import { cautionOf, editionIds, findSource, ruleIds, sources, tablesOf } from './index';
import { everyCitation } from './testing/every-citation';

const root = join(__dirname, '..');

function repeated(ids: readonly string[]): string[] {
  return ids.filter((id, index) => ids.indexOf(id) !== index);
}

describe('sources', () => {
  it('have unique ids', () => {
    expect(repeated(sourceList.map((source) => source.id))).toEqual([]);
  });

  it('are all cited by a table, a caution, a feedstuff or a check', () => {
    const editions = editionIds.map(tablesOf);
    const cited = new Set([
      ...everyCitation([editions, feedstuffs]).map((citation) => citation.sourceId),
      ...editions.flatMap((tables) => tables.cautions.flatMap((caution) => caution.sourceIds)),
      ...publishedChecks.map((check) => check.sourceId),
    ]);
    expect(Object.keys(sources).filter((id) => !cited.has(id))).toEqual([]);
  });
});

describe.each([...editionIds])('edition %s', (edition) => {
  const tables = tablesOf(edition);
  const citations = everyCitation(tables);

  it('cites only documents that are listed', () => {
    expect(citations.filter((citation) => !(citation.sourceId in sources))).toEqual([]);
  });

  it('leaves a number without a document only where its status says so', () => {
    const undocumented = citations.filter((citation) => citation.sourceId === 'none');
    expect(undocumented.filter(({ status }) => status !== 'memory' && status !== 'common-practice')).toEqual([]);
    const byDefinition = citations.filter((citation) => citation.sourceId === 'definition');
    expect(byDefinition.filter(({ status }) => status !== 'derived')).toEqual([]);
  });

  it('names every limit table for its rule, in every file of the folder', () => {
    for (const ruleId of ruleIds) expect(tables.limits[ruleId].subject).toBe(ruleId);
    const files = readdirSync(join(root, 'limits')).filter((file) => file.endsWith(`.${edition}.json`));
    expect(files.map((file) => file.split('.')[0])).toEqual([...ruleIds]);
  });

  it('gives every limit row its own id and every rule cautions that exist', () => {
    for (const limit of Object.values(tables.limits)) {
      expect(repeated(limit.rows.map((row) => row.id))).toEqual([]);
      expect(limit.cautions.map((id) => cautionOf(id).id)).toEqual(limit.cautions);
      expect(limit.cautions).not.toEqual([]);
    }
  });

  it('has rows for every limit but the caps, which the yard sets', () => {
    const empty = ruleIds.filter((ruleId) => tables.limits[ruleId].rows.length === 0);
    expect(empty).toEqual(['nitrogen-cap', 'phosphorus-cap']);
  });

  it('begins near on the allowed side of every limit', () => {
    for (const limit of Object.values(tables.limits)) {
      for (const row of limit.rows) {
        if (row.nearFrom === null) continue;
        if (limit.direction === 'max') expect(row.nearFrom).toBeLessThan(row.value);
        else expect(row.nearFrom).toBeGreaterThan(row.value);
        expect(row.nearFromCitation, `${limit.subject} ${row.id}`).toBeDefined();
      }
    }
  });

  it('raises the grades of a limit in order, each above every row it can follow', () => {
    for (const limit of Object.values(tables.limits)) {
      const lines = limit.grades.map((grade) => grade.above);
      expect(lines).toEqual([...lines].sort((a, b) => a - b));
      const strictest = Math.min(...limit.rows.map((row) => row.value));
      for (const line of lines) expect(line).toBeGreaterThan(strictest);
    }
  });

  it('writes cautions with unique ids, listed sources, and without the word that promises too much', () => {
    expect(repeated(tables.cautions.map((caution) => caution.id))).toEqual([]);
    for (const caution of tables.cautions) {
      for (const id of caution.sourceIds) expect(findSource(id).id).toBe(id);
      if (caution.sourceIds.includes('none')) expect(caution.status).toBe('common-practice');
      const words = [caution.title, caution.whatIsWrong, caution.whatFollows, caution.howToAvoid].join(' ');
      expect(words).not.toMatch(/\b(un)?safe(ly|ty)?\b/i);
      expect(words, 'a caution names no dose').not.toMatch(/\d+(\.\d+)?\s?(g|mg|mL|L|litres)\b/);
    }
  });

  it('keeps feeding values to feedstuffs that exist', () => {
    const known = new Set(feedstuffs.map((feedstuff) => feedstuff.id));
    for (const row of tables.feedingValues.rows) {
      expect(row.status).toBe('common-practice');
      expect(row.feedstuffIds.filter((id) => !known.has(id))).toEqual([]);
    }
  });
});

describe('feedstuffs', () => {
  it('are 78', () => {
    expect(feedstuffs).toHaveLength(78);
    expect(repeated(feedstuffs.map((feedstuff) => feedstuff.id))).toEqual([]);
  });

  it('cite listed documents, with a status that fits', () => {
    const citations = everyCitation(feedstuffs);
    expect(citations.filter((citation) => !(citation.sourceId in sources))).toEqual([]);
    for (const { path, status, sourceId } of citations) {
      if (sourceId === 'none') expect(['memory', 'common-practice'], path).toContain(status);
      if (sourceId === 'definition' || sourceId === 'molar-mass') expect(status, path).toBe('derived');
    }
  });

  it('name cautions that exist', () => {
    for (const feedstuff of feedstuffs) {
      expect(feedstuff.cautions.map((id) => cautionOf(id).id)).toEqual(feedstuff.cautions);
    }
  });
});

describe('checks', () => {
  it('have unique ids and listed documents', () => {
    expect(repeated([...publishedChecks, ...tradeFacts].map((check) => check.id))).toEqual([]);
    expect(publishedChecks.filter((check) => !(check.sourceId in sources))).toEqual([]);
    expect(publishedChecks.filter((check) => check.sourceId === 'none')).toEqual([]);
  });
});
