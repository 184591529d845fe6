import { describe, expect, it } from 'vitest';
import * as v from 'valibot';
import { plainMessage } from './plain-message';

const messagesFor = (schema: v.GenericSchema, value: unknown) =>
  v.safeParse(schema, value, { message: plainMessage }).issues?.map(({ message }) => message);

describe('a fault without a message of its own', () => {
  const schema = v.strictObject({
    name: v.string('Enter a name'),
    head: v.number(),
    gate: v.boolean(),
    lines: v.array(v.string()),
    basis: v.picklist(['full', 'shrunk']),
    note: v.nullable(v.pipe(v.string(), v.maxLength(3))),
  });

  it('says of every field what is wrong and what to send', () => {
    const value = { name: 5, head: 'x', gate: 'true', lines: {}, basis: 'live', note: 'long', extra: 1 };
    expect(messagesFor(schema, value)).toEqual([
      'Enter a name',
      'Send a number here',
      'Send true or false here',
      'Send a list here',
      'Send "full" or "shrunk" here',
      'Keep it within 3 characters',
      'There is no field named "extra" here: leave it out',
    ]);
  });

  it('says which fields are missing', () => {
    expect(messagesFor(schema, {})).toEqual(Array(6).fill('This field is missing'));
  });

  it('says that an object was asked', () => {
    expect(messagesFor(schema, 'text')).toEqual(['Send an object with fields here']);
  });
});
