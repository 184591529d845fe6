import type { ResolverOptions } from 'react-hook-form';
import { describe, expect, it } from 'vitest';
import { type YardFormValues, timeZoneChoices, yardFormOf, yardResolver } from './yard-form-values';

const typed: YardFormValues = {
  name: 'Dry Fork',
  timeZone: 'America/Denver',
  advisoryEmail: 'office@dry-fork.example',
  complianceGate: true,
  capSignOff: 'compliance',
  capNitrogenKgPerHead: '28,5',
  capPhosphorusKgPerHead: '',
};
const judge = (values: YardFormValues) => yardResolver(values, undefined, {} as ResolverOptions<YardFormValues>);

describe('the yard form', () => {
  it('reads a cap with a comma, and an empty cap as none', async () => {
    const { values } = await judge(typed);
    expect(values).toMatchObject({ capNitrogenKgPerHead: 28.5, capPhosphorusKgPerHead: null });
  });

  it('refuses a cap of 0, which is not the same as none', async () => {
    const { errors } = await judge({ ...typed, capPhosphorusKgPerHead: '0' });
    expect(errors).toMatchObject({ capPhosphorusKgPerHead: { message: 'A cap is above 0' } });
  });

  it('names every fault at once', async () => {
    const { errors } = await judge({ ...typed, name: ' ', advisoryEmail: 'office', timeZone: 'Middle of nowhere' });
    expect(Object.keys(errors).sort()).toEqual(['advisoryEmail', 'name', 'timeZone']);
  });

  it('shows a stored cap with every digit it was given', () => {
    const yard = {
      id: '2f4e1c1e-7d0a-4a53-9c3b-0a4f5f2f6c11',
      version: 3,
      name: typed.name,
      timeZone: typed.timeZone,
      advisoryEmail: typed.advisoryEmail,
      complianceGate: true,
      capSignOff: 'notice' as const,
      capNitrogenKgPerHead: 28.125,
      capPhosphorusKgPerHead: null,
    };
    expect(yardFormOf(yard)).toMatchObject({ capNitrogenKgPerHead: '28.125', capPhosphorusKgPerHead: '' });
  });

  it('offers the yard’s own zone even where the browser does not know it', () => {
    expect(timeZoneChoices('America/Denver')).toContain('America/Denver');
    expect(timeZoneChoices('Etc/Unheard_Of')[0]).toBe('Etc/Unheard_Of');
  });
});
