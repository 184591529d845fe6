import type { PersonView } from '@brimgate/rules';
import { DataTable } from '../../components/data-table';
import { roleWords } from './role-words';

/** The people of the firm, what they are here, and which yards they see. */
export function PeopleTable({ people }: { people: readonly PersonView[] }) {
  return (
    <DataTable
      caption="People of the firm"
      rows={people}
      rowKey={(person) => `${person.id} ${person.role}`}
      columns={[
        { key: 'name', header: 'Name', isRowHeader: true, cell: (person) => person.name },
        { key: 'role', header: 'Role', cell: (person) => roleWords[person.role] },
        { key: 'yards', header: 'Yards', cell: (person) => yardsWords(person) },
        { key: 'email', header: 'E-mail', cell: (person) => person.email },
        { key: 'licence', header: 'Licence', cell: (person) => person.licence ?? '' },
        { key: 'active', header: 'May sign in', cell: (person) => (person.isActive ? 'yes' : 'no') },
      ]}
    />
  );
}

function yardsWords({ role, yards }: PersonView): string {
  if (role === 'administrator') return 'all yards of the firm';
  return yards.map((yard) => yard.name).join(', ') || 'none yet';
}
