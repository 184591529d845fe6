import { queryOptions } from '@tanstack/react-query';
import { AuditEventView, pageOf } from '@brimgate/rules';
import { api, queryText } from '../../lib/api-client';

const AuditPage = pageOf(AuditEventView);

/** Newest first; with a subject only what was done to it. */
export const auditListQuery = (subjectId: string | null, cursor: string | null) =>
  queryOptions({
    queryKey: ['audit-events', 'list', subjectId, cursor],
    queryFn: ({ signal }) => api.get(`/audit-events${queryText({ subjectId, cursor })}`, AuditPage, signal),
  });
