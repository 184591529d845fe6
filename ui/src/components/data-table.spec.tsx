import { render, screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { axeViolations } from '../../test/axe-violations';
import { DataTable } from './data-table';

const table = (whenNarrow: 'stack' | 'scroll') => (
  <DataTable
    caption="Sulfur by feedstuff"
    whenNarrow={whenNarrow}
    rows={[
      { name: 'Corn', sulfur: '0.073' },
      { name: 'Straw', sulfur: '0.004' },
    ]}
    rowKey={(row) => row.name}
    columns={[
      { key: 'name', header: 'From', isRowHeader: true, cell: (row) => row.name, footer: 'Together' },
      { key: 'sulfur', header: 'Sulfur', unit: '% of DM', align: 'number', cell: (row) => row.sulfur, footer: '0.077' },
    ]}
  />
);

describe.each(['stack', 'scroll'] as const)('a table that becomes a %s where it is narrow', (whenNarrow) => {
  it('has a caption, a unit in the header and a name on each row', () => {
    render(table(whenNarrow));
    expect(screen.getByRole('table', { name: 'Sulfur by feedstuff' })).toBeInTheDocument();
    expect(screen.getByRole('columnheader', { name: /Sulfur.*% of DM/ })).toBeInTheDocument();
    const corn = screen.getByRole('rowheader', { name: 'Corn' }).closest('tr');
    expect(corn && within(corn).getByRole('cell')).toHaveTextContent('0.073');
  });

  it('has no fault that axe can find', async () => {
    const { container } = render(table(whenNarrow));
    expect(await axeViolations(container)).toEqual([]);
  });
});
