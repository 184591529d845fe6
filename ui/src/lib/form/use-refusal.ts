import type { Problem } from '@brimgate/rules';
import { useState } from 'react';
import type { Fault } from './faults-to-form';

/** The faults of the last attempt to send a form, for its summary and its fields, in the same words. */
export function useRefusal() {
  const [refusal, setRefusal] = useState<{ faults: readonly Fault[]; attempt: number }>({ faults: [], attempt: 0 });
  const refuse = (faults: readonly Fault[]) => setRefusal((before) => ({ faults, attempt: before.attempt + 1 }));
  return {
    ...refusal,
    at: (path: string) => refusal.faults.find((fault) => fault.path === path)?.message,
    refuse,
    /** The server's own faults, or what happened when it named none. */
    refuseWith: (problem: Problem) =>
      refuse(problem.errors.length > 0 ? problem.errors : [{ path: '', message: problem.detail ?? problem.title }]),
  };
}
