import type { RationListItem } from '@brimgate/rules';
import { Link } from 'react-router-dom';
import { type Column, DataTable } from '../../components/data-table';
import { StatusMark, statusOf } from '../../components/status-mark';
import { formatMoment, formatNumber } from '../../lib/format';
import { paths } from '../../paths';
import { stateWords } from './ration-state';
import { stageText } from './stage-words';

interface RationListProps {
  rations: readonly RationListItem[];
  timeZoneOf: (yardId: string) => string;
}

const asksForSignature = (signOff: string | null) =>
  signOff === 'veterinarian' || signOff === 'compliance' || signOff === 'reason';

export function RationList({ rations, timeZoneOf }: RationListProps) {
  const columns: Column<RationListItem>[] = [
    {
      key: 'name',
      header: 'Ration',
      isRowHeader: true,
      cell: (ration) => <Link to={paths.ration(ration.id)}>{ration.name}</Link>,
    },
    { key: 'yard', header: 'Yard', cell: (ration) => ration.yard.name },
    { key: 'stage', header: 'Cattle', cell: (ration) => stageText(ration.stage) },
    { key: 'state', header: 'State', cell: stateCell },
    { key: 'verdict', header: 'Verdict', cell: verdictCell },
    {
      key: 'sulfur',
      header: 'Total sulfur',
      unit: '% of DM',
      align: 'number',
      cell: (ration) => formatNumber(ration.sulfurPctDm, 3),
    },
    { key: 'saved', header: 'Saved', cell: (ration) => formatMoment(ration.savedAt, timeZoneOf(ration.yard.id)) },
  ];
  return (
    <DataTable caption="Rations, newest saved first" columns={columns} rows={rations} rowKey={(ration) => ration.id} />
  );
}

function stateCell(ration: RationListItem) {
  const fed = ration.releasedVersionNumber;
  const fedWords = fed === null || fed === ration.versionNumber ? '' : `; version ${fed} is fed`;
  return `${stateWords[ration.state]}, version ${ration.versionNumber}${fedWords}`;
}

function verdictCell(ration: RationListItem) {
  const status = statusOf(ration.verdict);
  if (!status) return 'not screened';
  return <StatusMark status={status} asksForSignature={status !== 'within' && asksForSignature(ration.signOff)} />;
}
