import { LedgerView, LotView, Problem, summaryColumns } from '@brimgate/rules';
import { parse } from 'csv-parse/sync';
import * as v from 'valibot';
import { createTestApp, statementsOf, type TestApp } from './support/app';
import { ownerConnection } from './support/database';
import { aLotInput } from './support/lots';
import { anOperation, type Operation, released } from './support/operation';

describe('the nutrient ledger', () => {
  let test: TestApp;
  let operation: Operation;
  let lots: LotView[];
  const owner = ownerConnection();
  const FORMULAS = ['=1+1', '+1', '-1', '@SUM(A1)', '\tx'];

  beforeAll(async () => {
    test = await createTestApp();
    operation = await anOperation(test, {
      name: '=Yard, "North"',
      capNitrogenKgPerHead: 25,
      capPhosphorusKgPerHead: 3,
    });
    const { releaseId } = await released(operation);
    const add = async (overrides: Parameters<typeof aLotInput>[1]) =>
      v.parse(
        LotView,
        (await operation.compliance.agent.post('/api/lots').send(aLotInput(operation, overrides)).expect(201)).body,
      );
    lots = [
      await add({ name: 'Lot 118', releaseId }),
      await add({ name: 'Lot 121', releaseId, head: 50, endedOn: '2026-06-30' }),
      await add({ name: 'No ration', endedOn: '2026-05-01', head: 30 }),
    ];
    await add({ name: 'Still on feed', releaseId, endedOn: null, exitWeightKg: null });
    await add({ name: 'Later', releaseId, endedOn: '2026-07-01' });
  });
  afterAll(async () => {
    await test.close();
    await owner.close();
  });

  const query = (from = '2026-01-01', to = '2026-06-30') => `yardId=${operation.yard.uuid}&from=${from}&to=${to}`;
  const view = async (path = query()) =>
    v.parse(LedgerView, (await operation.compliance.agent.get(`/api/ledger?${path}`).expect(200)).body);
  const file = (path = query(), own = operation) => own.compliance.agent.get(`/api/ledger.csv?${path}`).expect(200);
  const rowsOf = (text: string): string[][] => parse(text, { bom: true, relax_column_count: true });

  describe('on screen', () => {
    it('adds up the stored figures of the lots that ended in the period, both days included', async () => {
      const ledger = await view();
      expect(ledger.lots.map(({ name }) => name)).toEqual(['No ration', 'Lot 118', 'Lot 121']);
      const [first, second] = lots;
      const sum =
        (first?.excretion.wholeLot.nitrogen.excretedKg ?? NaN) +
        (second?.excretion.wholeLot.nitrogen.excretedKg ?? NaN);
      expect(ledger.nitrogen.excretedKg).toBeCloseTo(sum, 9);
      expect(ledger).toMatchObject({
        headFinished: 180,
        lotsNotDetermined: 1,
        capNitrogenKgPerHead: 25,
        capPhosphorusKgPerHead: 3,
      });
    });

    it('knows no figure of a period in which none is known: that is not zero', async () => {
      const ledger = await view(query('2026-04-01', '2026-05-31'));
      expect(ledger).toMatchObject({ headFinished: 30, lotsNotDetermined: 1 });
      expect(ledger.nitrogen).toEqual({ intakeKg: null, retainedKg: null, excretedKg: null });
      expect((await view(query('2020-01-01', '2020-12-31'))).lots).toEqual([]);
    });

    it('names every fault of the question', async () => {
      const response = await operation.compliance.agent.get('/api/ledger?yardId=x&from=2026-13-01').expect(422);
      expect(
        v
          .parse(Problem, response.body)
          .errors.map(({ path }) => path)
          .sort(),
      ).toEqual(['from', 'to', 'yardId']);
      const backwards = await operation.compliance.agent
        .get(`/api/ledger?${query('2026-06-30', '2026-01-01')}`)
        .expect(422);
      expect(v.parse(Problem, backwards.body).errors[0]?.path).toBe('to');
    });

    it('reads stored figures only: changed tables or rules would not change it', async () => {
      await owner.query(
        `UPDATE lots SET excretion = JSON_SET(excretion, '$.wholeLot.nitrogen.excretedKg', 1234.5) WHERE name = 'Lot 121'`,
      );
      const [first] = lots;
      expect((await view()).nitrogen.excretedKg).toBeCloseTo(
        (first?.excretion.wholeLot.nitrogen.excretedKg ?? NaN) + 1234.5,
        6,
      );
    });
  });

  describe('as a file', () => {
    it('is a CSV to be kept, named for yard and period', async () => {
      const response = await file();
      expect(response.headers['content-type']).toBe('text/csv; charset=utf-8');
      expect(response.headers['content-disposition']).toBe(
        'attachment; filename="nutrient-ledger-yard-north-2026-01-01-2026-06-30.csv"',
      );
      expect(response.text.startsWith('\uFEFF')).toBe(true);
      expect(response.text).toMatch(/\r\n/);
    });

    it('says of which yard, for which period, by whom and by which rules', async () => {
      const rows = rowsOf((await file()).text);
      const head = rows.slice(0, 7).map((row) => row.join(' '));
      expect(head.join('\n')).toContain(`'=Yard, "North"`);
      expect(head.join('\n')).toContain('2026-01-01 to 2026-06-30');
      expect(head.join('\n')).toContain(operation.compliance.person.name);
      expect(head.join('\n')).toContain(`rules ${lots[0]?.rulesVersion}, tables of edition ${lots[0]?.edition}`);
    });

    it('has a heading with units and a row for each lot, with the figures as stored', async () => {
      const rows = rowsOf((await file()).text);
      const at = rows.findIndex((row) => row[1] === 'Lot');
      const heading = rows[at] ?? [];
      expect(heading).toEqual(summaryColumns.map(({ title }) => title));
      const column = heading.indexOf('N excreted, kg whole lot');
      const cells = rows.slice(at + 1, at + 4).map((row) => row[column]);
      expect(cells).toEqual(['not determined', expect.stringMatching(/^\d+\.\d+$/), '1234.5']);
      expect(Number(cells[1])).toBeCloseTo(lots[0]?.excretion.wholeLot.nitrogen.excretedKg ?? NaN, 4);
    });

    it('ends with its sources and with what it is not', async () => {
      const { text } = await file();
      expect(text).toContain('Estimate, not analysis');
      expect(text).toMatch(/Local nutrient-management rules and the licensed planner decide/);
      expect(text).toMatch(/Source,.*(ASABE|Manure)/i);
      expect(text).not.toMatch(/Source,.*\bnone\b/);
      expect(text).toContain('P is not P2O5');
    });

    it.each(FORMULAS)('takes the formula out of %j in a text', async (formula) => {
      const own = await anOperation(test);
      const { releaseId } = await released(own);
      await own.compliance.agent
        .post('/api/lots')
        .send(aLotInput(own, { name: `${formula}`, releaseId }))
        .expect(201);
      await owner.query('UPDATE lots SET name = :name WHERE firm_id = :firmId', {
        replacements: { name: formula, firmId: own.firm.id },
      });
      const rows = rowsOf((await file(`yardId=${own.yard.uuid}&from=2026-01-01&to=2026-12-31`, own)).text);
      const heading = rows.findIndex((row) => row[1] === 'Lot');
      expect(rows[heading + 1]?.[1]).toBe(`'${formula}`);
      for (const cell of rows.flat()) expect(cell).not.toMatch(/^[=+@\t]/);
    });

    it('leaves a negative number a number', async () => {
      await owner.query(
        `UPDATE lots SET excretion = JSON_SET(excretion, '$.perHead.nitrogen.retainedKg', -0.25) WHERE name = 'Lot 118'`,
      );
      const rows = rowsOf((await file()).text);
      const heading = rows.find((row) => row.includes('N retained, kg per head')) ?? [];
      const row = rows.find((cells) => cells[1] === 'Lot 118') ?? [];
      expect(row[heading.indexOf('N retained, kg per head')]).toBe('-0.25');
    });

    it('holds every lot of a long period, read a few hundred at a time', async () => {
      const own = await anOperation(test);
      await own.compliance.agent.post('/api/lots').send(aLotInput(own)).expect(201);
      await owner.query(
        `INSERT INTO lots (firm_id, uuid, yard_id, name, head, started_on, ended_on, entry_weight_kg, exit_weight_kg, weight_basis,
           dry_matter_intake_kg_per_day, release_id, excretion, is_determined, rules_version, edition, version, saved_by_id, saved_by_name, saved_at)
         SELECT firm_id, UUID(), yard_id, CONCAT('Copy ', seq), head, started_on, DATE_ADD('2026-06-13', INTERVAL seq % 7 DAY), entry_weight_kg,
           exit_weight_kg, weight_basis, dry_matter_intake_kg_per_day, release_id, excretion, is_determined, rules_version, edition,
           version, saved_by_id, saved_by_name, saved_at
         FROM lots, seq_1_to_999 WHERE firm_id = :firmId`,
        { replacements: { firmId: own.firm.id } },
      );
      const path = `yardId=${own.yard.uuid}&from=2026-01-01&to=2026-12-31`;
      let text = '';
      const statements = await statementsOf(test.sequelize, async () => {
        text = (await file(path, own)).text;
      });
      const names = rowsOf(text)
        .map((row) => row[1])
        .filter((name) => name === 'Lot 118' || name?.startsWith('Copy '));
      expect(new Set(names).size).toBe(1000);
      expect(names).toHaveLength(1000);
      expect(statements.filter((sql) => sql.includes('`lots`')).length).toBeLessThan(10);
    });
  });
});
