import { describe, expect, it } from 'vitest';
import { aLot, aLotNotDetermined } from '../../../test/a-lot';
import { byPhosphorusExcreted } from './sorted-lots';

it('puts the lot that excretes the most a head first and what is not determined last, by name', () => {
  const much = aLot({ name: 'Lot 4' });
  much.excretion.perHead.phosphorus.excretedKg = 5.6;
  const lots = [
    aLotNotDetermined({ name: 'Lot 9' }),
    aLotNotDetermined({ name: 'Lot 8' }),
    aLot({ name: 'Lot 2' }),
    much,
  ];
  expect(byPhosphorusExcreted(lots).map((lot) => lot.name)).toEqual(['Lot 4', 'Lot 2', 'Lot 8', 'Lot 9']);
});

describe('the list it was given', () => {
  it('stays as it was', () => {
    const lots = [aLotNotDetermined(), aLot()];
    byPhosphorusExcreted(lots);
    expect(lots[0]?.endedOn).toBeNull();
  });
});
