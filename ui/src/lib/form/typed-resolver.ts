import { type FieldError, type FieldErrors, type FieldValues, get, type Resolver, set } from 'react-hook-form';
import type * as v from 'valibot';
import { judged } from './judged';

export interface TypedForm<Values extends FieldValues, Schema extends v.GenericSchema> {
  schema: Schema;
  /** Text to the schema's shape: an empty box is absent, never 0; numbers go through `typedNumber`. */
  candidateOf: (values: Values) => unknown;
  /** The field that a path of the schema belongs to, where the form is built otherwise than the schema. */
  fieldOf?: (path: string) => string;
}

/** Judges a form of typed text by the wire schema, all faults at once, each beside its field. */
export function typedResolver<Values extends FieldValues, Schema extends v.GenericSchema>({
  schema,
  candidateOf,
  fieldOf = (path) => path,
}: TypedForm<Values, Schema>): Resolver<Values, unknown, v.InferOutput<Schema>> {
  return (values) => {
    const input = judged(schema, candidateOf(values));
    if (input.isValid) return { values: input.output, errors: {} };
    const errors: FieldErrors<Values> = {};
    for (const { path, message } of input.faults) {
      const field = fieldOf(path === '' ? 'root' : path);
      // The first fault of a field is the one that explains the others.
      if (!get(errors, field)) set(errors, field, { type: 'schema', message } satisfies FieldError);
    }
    return { values: {}, errors };
  };
}
