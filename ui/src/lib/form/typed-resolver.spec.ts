import type { ResolverOptions } from 'react-hook-form';
import * as v from 'valibot';
import { describe, expect, it } from 'vitest';
import { typedNumber } from './judged';
import { typedResolver } from './typed-resolver';

interface Values {
  name: string;
  weightKg: string;
}

const schema = v.strictObject({
  name: v.pipe(v.string(), v.nonEmpty('Enter a name')),
  weightKg: v.pipe(v.number('Enter a weight in kg'), v.minValue(20, 'Below 20 kg')),
});
const resolve = typedResolver<Values, typeof schema>({
  schema,
  candidateOf: (values) => ({ name: values.name, weightKg: typedNumber(values.weightKg) }),
});
const judge = (values: Values) => resolve(values, undefined, {} as ResolverOptions<Values>);

describe('a typed form', () => {
  it('hands on what the schema made of the text', async () => {
    expect(await judge({ name: 'Lot 118', weightKg: '338,5' })).toEqual({
      values: { name: 'Lot 118', weightKg: 338.5 },
      errors: {},
    });
  });

  it('names every fault at once, each at its field', async () => {
    const { errors } = await judge({ name: '', weightKg: '12' });
    expect(errors).toMatchObject({ name: { message: 'Enter a name' }, weightKg: { message: 'Below 20 kg' } });
  });

  it('takes an empty box as absent', async () => {
    expect((await judge({ name: 'Lot 118', weightKg: ' ' })).errors).toMatchObject({
      weightKg: { message: 'Enter a weight in kg' },
    });
  });

  it('says what is wrong with the text before what the schema thinks of its absence', async () => {
    const { errors } = await judge({ name: 'Lot 118', weightKg: '1,234' });
    expect(errors).toMatchObject({ weightKg: { message: expect.stringContaining('two ways') as string } });
  });
});
