import type { ReleaseView } from '@brimgate/rules';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { Button } from '../../components/button';
import { type Column, DataTable } from '../../components/data-table';
import { Section } from '../../components/section';
import { formatMoment, formatNumber } from '../../lib/format';
import { paths } from '../../paths';
import styles from './release-record.module.css';
import { StopDialog } from './stop-dialog';

interface ReleaseRecordProps {
  release: ReleaseView;
  timeZone: string;
  mayStop: boolean;
}

const titles = {
  released: 'What is fed now',
  superseded: 'What was fed before',
  stopped: 'Stopped: no longer to be fed',
} as const;

const HASH_SHOWN = 8;

const columns: Column<ReleaseView['lines'][number]>[] = [
  { key: 'feedstuff', header: 'Feedstuff', isRowHeader: true, cell: (line) => line.feedstuff },
  { key: 'share', header: 'Share', unit: '% of DM', align: 'number', cell: (line) => formatNumber(line.sharePctDm, 2) },
];

/** A released version as it was frozen: it never changes, it is only superseded or stopped. */
export function ReleaseRecord({ release, timeZone, mayStop }: ReleaseRecordProps) {
  const [isStopping, setIsStopping] = useState(false);
  return (
    <Section
      title={titles[release.state]}
      aside={`version ${release.versionNumber}, content ${release.contentHash.slice(0, HASH_SHOWN)}`}
    >
      <p>
        Released by {release.releasedBy} on {formatMoment(release.releasedAt, timeZone)}.
        {release.reason && ` Reason: ${release.reason}`}
      </p>
      {release.state === 'stopped' && (
        <p>
          Stopped by {release.stoppedBy} on {formatMoment(release.stoppedAt, timeZone)}: {release.stopReason}
        </p>
      )}
      <DataTable
        caption={`Version ${release.versionNumber} as released`}
        columns={columns}
        rows={release.lines}
        rowKey={(line) => line.feedstuff}
        whenNarrow="scroll"
      />
      <p className={styles.links}>
        <Link to={paths.screening(release.screeningId)}>The screening it was released on</Link>
        {release.advisoryId && <Link to={paths.advisory(release.advisoryId)}>The advisory and its delivery</Link>}
      </p>
      {release.state === 'released' && mayStop && (
        <div className="no-print">
          <Button onClick={() => setIsStopping(true)}>Stop this release</Button>
        </div>
      )}
      {isStopping && <StopDialog release={release} onClose={() => setIsStopping(false)} />}
    </Section>
  );
}
