import type { RationVersionSummary } from '@brimgate/rules';
import { type Column, DataTable } from '../../components/data-table';
import { Section } from '../../components/section';
import { StatusMark, statusOf } from '../../components/status-mark';
import { formatMoment } from '../../lib/format';
import { stateWords } from './ration-state';

const HASH_SHOWN = 8;

/** Every version that was ever saved, newest first; a released one never changes. */
export function VersionList({ versions, timeZone }: { versions: readonly RationVersionSummary[]; timeZone: string }) {
  if (versions.length === 0) return null;
  const columns: Column<RationVersionSummary>[] = [
    { key: 'number', header: 'Version', isRowHeader: true, cell: (version) => version.number },
    { key: 'state', header: 'State', cell: (version) => stateWords[version.state] },
    { key: 'verdict', header: 'Verdict', cell: (version) => <Verdict verdict={version.verdict} /> },
    { key: 'saved', header: 'Saved', cell: (version) => formatMoment(version.savedAt, timeZone) },
    { key: 'by', header: 'By', cell: (version) => version.savedBy },
    {
      key: 'content',
      header: 'Content',
      cell: (version) =>
        version.contentHash ? <code>{version.contentHash.slice(0, HASH_SHOWN)}</code> : 'not screened',
    },
  ];
  return (
    <Section title="Versions" aside="newest first">
      <DataTable
        caption="Versions of this ration"
        columns={columns}
        rows={versions}
        rowKey={(version) => String(version.number)}
      />
    </Section>
  );
}

function Verdict({ verdict }: { verdict: string | null }) {
  const status = statusOf(verdict);
  return status ? <StatusMark status={status} /> : 'not screened';
}
