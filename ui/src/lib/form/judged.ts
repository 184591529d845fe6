import * as v from 'valibot';
import type { Fault } from './faults-to-form';
import { numberFromText, numberTextFault } from './number-text';

/**
 * What stands in a number's box, ready for a schema: nothing, the number, or the text itself when it is none, so that
 * the schema refuses it at its own path.
 */
export function typedNumber(text: string): number | string | undefined {
  return numberTextFault(text) === undefined ? numberFromText(text) : text;
}

export type Judged<Output> = { isValid: true; output: Output } | { isValid: false; faults: Fault[] };

/** Holds what a form would send against the schema of the wire; every fault carries the path of its field. */
export function judged<Schema extends v.GenericSchema>(schema: Schema, input: unknown): Judged<v.InferOutput<Schema>> {
  const result = v.safeParse(schema, input);
  if (result.success) return { isValid: true, output: result.output };
  const faults = result.issues.map((issue) => ({ path: v.getDotPath(issue) ?? '', message: messageOf(issue) }));
  return { isValid: false, faults };
}

/** Text where a number belongs is told by what is wrong with the text; everything else by the schema. */
function messageOf(issue: v.BaseIssue<unknown>): string {
  const { expected, input } = issue;
  const textFault = expected === 'number' && typeof input === 'string' ? numberTextFault(input) : undefined;
  return textFault ?? issue.message;
}
