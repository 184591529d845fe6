import type { ResolverOptions } from 'react-hook-form';
import { describe, expect, it } from 'vitest';
import { aLot, aLotNotDetermined } from '../../../test/a-lot';
import { emptyLotForm, type LotFormValues, lotFormOf, lotResolver } from './lot-form-values';

const yardId = '2f4e1c1e-7d0a-4a53-9c3b-0a4f5f2f6c11';
const judge = (values: LotFormValues) => lotResolver(values, undefined, {} as ResolverOptions<LotFormValues>);

const typed: LotFormValues = {
  ...emptyLotForm(yardId),
  name: 'Lot 118',
  head: '206',
  startedOn: '2026-01-10',
  endedOn: '2026-06-12',
  entryWeightKg: '338',
  exitWeightKg: '554,5',
  weightBasis: 'shrunk',
  dryMatterIntakeKgPerDay: '10.6',
};

describe('the lot form', () => {
  it('reads numbers with a comma or a point', async () => {
    const { values } = await judge(typed);
    expect(values).toMatchObject({ head: 206, exitWeightKg: 554.5, dryMatterIntakeKgPerDay: 10.6 });
  });

  it('keeps what is empty absent, never zero', async () => {
    const { values } = await judge({ ...typed, endedOn: '', exitWeightKg: '', dryMatterIntakeKgPerDay: ' ' });
    expect(values).toMatchObject({ endedOn: null, exitWeightKg: null, dryMatterIntakeKgPerDay: null, releaseId: null });
  });

  it('asks for what a lot cannot lack, all at once', async () => {
    const { errors } = await judge(emptyLotForm(yardId));
    expect(Object.keys(errors).sort()).toEqual(['entryWeightKg', 'head', 'name', 'startedOn', 'weightBasis']);
  });

  it('refuses a lot that ends before it starts, at the end date', async () => {
    const { errors } = await judge({ ...typed, endedOn: '2026-01-09' });
    expect(errors).toMatchObject({ endedOn: { message: 'The lot ends after it starts' } });
  });

  it('asks whether pounds were meant', async () => {
    const { errors } = await judge({ ...typed, exitWeightKg: '1560' });
    expect(errors).toMatchObject({ exitWeightKg: { message: 'Above 1,500 kg: is this in pounds?' } });
  });

  it('refuses half an animal', async () => {
    const { errors } = await judge({ ...typed, head: '206.5' });
    expect(errors).toMatchObject({ head: { message: 'Head is a whole number' } });
  });

  it('opens a stored lot as it was typed', async () => {
    const { values } = await judge(lotFormOf(aLot()));
    expect(values).toMatchObject({ name: 'Lot 118', head: 200, exitWeightKg: 554, endedOn: '2026-06-12' });
    expect(lotFormOf(aLotNotDetermined())).toMatchObject({ endedOn: '', exitWeightKg: '' });
  });
});
