import type { Problem, ProblemError } from '@brimgate/rules';
import type { FieldPath, FieldValues, UseFormSetError } from 'react-hook-form';

/** One fault of a form: where it is and how to mend it; an empty path means the form as a whole. */
export type Fault = ProblemError;

/**
 * Puts the server's faults beside their fields and returns those that have none, for the form's error summary.
 * `isField` says which paths are on this form; without it, all of them are.
 */
export function faultsToForm<Values extends FieldValues>(
  problem: Problem,
  setError: UseFormSetError<Values>,
  isField: (path: string) => boolean = (path) => path !== '',
): Fault[] {
  const homeless: Fault[] = [];
  for (const fault of problem.errors) {
    if (isField(fault.path)) setError(fault.path as FieldPath<Values>, { type: 'server', message: fault.message });
    else homeless.push(fault);
  }
  if (problem.errors.length === 0) homeless.push({ path: '', message: problem.detail ?? problem.title });
  return homeless;
}

const isFaultNode = (node: object): node is { message: string } =>
  'message' in node && typeof node.message === 'string';

/** A form's faults as one list in the order of its fields, for the error summary. */
export function faultsOfForm(errors: object, parent = ''): Fault[] {
  const faults: Fault[] = [];
  for (const [name, node] of Object.entries(errors) as [string, unknown][]) {
    if (typeof node !== 'object' || node === null) continue;
    const path = parent === '' ? name : `${parent}.${name}`;
    if (isFaultNode(node)) faults.push({ path: name === 'root' ? parent : path, message: node.message });
    // A fault holds its field's DOM node in `ref`: nothing to list there.
    else if (name !== 'ref') faults.push(...faultsOfForm(node, path));
  }
  return faults;
}
