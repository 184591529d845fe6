import type { ArgumentMetadata, PipeTransform } from '@nestjs/common';
import { plainMessage } from '@brimgate/rules';
import * as v from 'valibot';
import type { FieldError } from './domain-error';
import { BodyUnreadable, InputInvalid } from './request-errors';

/** Every fault with its full dotted path, such as `lines.2.sharePctDm`; an empty path is the whole. */
export function fieldErrors(issues: readonly v.BaseIssue<unknown>[]): FieldError[] {
  return issues.map((issue) => ({ path: v.getDotPath(issue) ?? '', message: issue.message }));
}

class ValidPipe<Schema extends v.GenericSchema> implements PipeTransform<unknown, v.InferOutput<Schema>> {
  constructor(private readonly schema: Schema) {}

  transform(value: unknown, { type }: ArgumentMetadata): v.InferOutput<Schema> {
    // Express leaves the body out when its content type is not JSON.
    if (type === 'body' && value === undefined) throw new BodyUnreadable();
    // To the schema a list is an object of no fields: say what is wrong instead of naming every field as missing.
    if (Array.isArray(value))
      throw new InputInvalid([{ path: '', message: 'Send one object with fields, not a list' }]);
    const result = v.safeParse(this.schema, value, { message: plainMessage });
    if (!result.success) throw new InputInvalid(fieldErrors(result.issues));
    return result.output;
  }
}

/** Parses a body, a query or a parameter with a schema: `@Body(valid(RationContent))`. */
export const valid = <Schema extends v.GenericSchema>(schema: Schema) => new ValidPipe(schema);
