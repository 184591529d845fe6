import { useQuery } from '@tanstack/react-query';
import { Link, useSearchParams } from 'react-router-dom';
import { EmptyState } from '../components/empty-state';
import { Fetched } from '../components/fetched';
import { Page } from '../components/page';
import { Pager } from '../components/pager';
import { auditListQuery } from '../features/audit/audit.queries';
import { AuditTrail } from '../features/audit/audit-trail';
import { queryText } from '../lib/api-client';
import { paths } from '../paths';

/** What was done in the firm, by whom and when; it is only ever added to. */
export default function AuditPage() {
  const [search] = useSearchParams();
  const subjectId = search.get('subject');
  const events = useQuery(auditListQuery(subjectId, search.get('cursor')));
  return (
    <Page
      title="Audit trail"
      lead="What was done, by whom, with old and new values; newest first, times in UTC. Nothing in it is ever changed."
    >
      {subjectId && (
        <p>
          Only what was done to one subject. <Link to={paths.audit()}>Show everything</Link>
        </p>
      )}
      <Fetched query={events} what="the audit trail">
        {({ items, nextCursor }) => (
          <>
            {items.length === 0 && <EmptyState title="Nothing was recorded here" />}
            <AuditTrail events={items} subjectPath={subjectId ? null : subjectPath} />
            <Pager nextCursor={nextCursor} what="events" />
          </>
        )}
      </Fetched>
    </Page>
  );
}

const subjectPath = (id: string) => paths.audit() + queryText({ subject: id });
