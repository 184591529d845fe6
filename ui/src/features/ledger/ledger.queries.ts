import { queryOptions } from '@tanstack/react-query';
import { type LedgerQuery, LedgerView } from '@brimgate/rules';
import { api, queryText } from '../../lib/api-client';

export const ledgerQuery = (period: LedgerQuery) =>
  queryOptions({
    queryKey: ['ledger', period.yardId, period.from, period.to],
    queryFn: ({ signal }) => api.get(`/ledger${queryText(searchOf(period))}`, LedgerView, signal),
  });

/** Where the same ledger is downloaded; a plain link, so that the browser's own download works. */
export function ledgerCsvAddress(period: LedgerQuery): string {
  return `/api/ledger.csv${queryText(searchOf(period))}`;
}

const searchOf = ({ yardId, from, to }: LedgerQuery) => ({ yardId, from, to });
