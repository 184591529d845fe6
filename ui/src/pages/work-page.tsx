import { useQuery } from '@tanstack/react-query';
import type { Role, WorkItem } from '@brimgate/rules';
import { LinkButton } from '../components/button';
import { EmptyState } from '../components/empty-state';
import { Loading } from '../components/loading';
import { Page } from '../components/page';
import { ProblemNotice } from '../components/problem-notice';
import { workQuery } from '../features/work/work.queries';
import { WorkList } from '../features/work/work-list';
import { emptyWords } from '../features/work/work-words';
import { usePermission, useSession } from '../lib/session';
import { paths } from '../paths';

function pathOf(item: WorkItem): string {
  switch (item.kind) {
    case 'ration':
      return paths.ration(item.id);
    case 'review':
      return paths.review(item.id);
    case 'advisory':
      return paths.advisory(item.id);
    case 'lot':
      return paths.lot(item.id);
  }
}

export default function WorkPage() {
  const { person, membership } = useSession();
  const work = useQuery(workQuery);
  return (
    <Page title="Work" lead={`What waits for ${person.name}, ${membership.firm.name}`} actions={<WorkActions />}>
      {work.isPending && <Loading what="your work" />}
      {work.error && <ProblemNotice problem={work.error} onRetry={() => void work.refetch()} />}
      {work.data && <WorkList groups={work.data.groups} pathOf={pathOf} />}
      {work.data?.groups.every((group) => group.items.length === 0) && <NothingWaits />}
    </Page>
  );
}

/** The one thing this role starts from here. */
function WorkActions() {
  const mayEditRations = usePermission('edit-rations');
  const mayEditLots = usePermission('edit-lots');
  if (mayEditRations) {
    return (
      <LinkButton kind="primary" to={paths.newRation()}>
        New ration
      </LinkButton>
    );
  }
  if (mayEditLots) {
    return (
      <LinkButton kind="primary" to={paths.newLot()}>
        New lot
      </LinkButton>
    );
  }
  return null;
}

/** Where one looks when nothing waits. */
const nextSteps: Readonly<Record<Role, { to: string; label: string }>> = {
  nutritionist: { to: paths.rations(), label: 'See the rations' },
  veterinarian: { to: paths.rations(), label: 'See what is fed' },
  compliance: { to: paths.ledger(), label: 'Open the ledger' },
  'yard-manager': { to: paths.advisories(), label: 'Read the advisories' },
  administrator: { to: paths.yards(), label: 'Look after the yards' },
};

function NothingWaits() {
  const { membership } = useSession();
  const { title, next } = emptyWords[membership.role];
  const { to, label } = nextSteps[membership.role];
  return (
    <EmptyState title={title} action={<LinkButton to={to}>{label}</LinkButton>}>
      {next}
    </EmptyState>
  );
}
