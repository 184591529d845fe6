import { useState } from 'react';
import { newIdempotencyKey } from './api-client';
import { ApiProblem } from './api-problem';

/** Whether the server has said no, so that the act did not happen; without an answer nobody knows. */
const isRefusal = (error: unknown) => error instanceof ApiProblem && error.status >= 400 && error.status < 500;

/**
 * The Idempotency-Key of one act. Kept while the outcome is unknown, so that trying again cannot act twice; after a
 * refusal or a success the next attempt is a new act.
 */
export function useActKey(): { key: string; settle: (error?: unknown) => void } {
  const [key, setKey] = useState(newIdempotencyKey);
  const settle = (error?: unknown) => {
    if (error === undefined || isRefusal(error)) setKey(newIdempotencyKey());
  };
  return { key, settle };
}
