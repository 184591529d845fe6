import type { FeedstuffListItem } from '@brimgate/rules';
import { Link } from 'react-router-dom';
import { provenanceWords } from '../../components/provenance-tag';
import { paths } from '../../paths';
import styles from './lines-section.module.css';

/** Which composition is reckoned with and how its sulfur is known; the feedstuff's page shows every figure's source. */
export function CompositionNote({ feedstuff }: { feedstuff: FeedstuffListItem }) {
  const sulfurStatus = feedstuff.statuses.sulfurPctDm;
  return (
    <>
      <Link to={paths.feedstuff(feedstuff.id)} className={styles.compositionLink} title={feedstuff.compositionLabel}>
        {feedstuff.compositionLabel}
        <span className="visually-hidden"> of {feedstuff.name}: figures and sources</span>
      </Link>
      <span className={styles.sulfurNote}>
        {feedstuff.composition.sulfurPctDm === undefined || !sulfurStatus
          ? 'sulfur not determined'
          : `sulfur ${feedstuff.composition.sulfurPctDm} %, ${provenanceWords[sulfurStatus]}`}
      </span>
    </>
  );
}
