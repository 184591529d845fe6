import type { FeedstuffListItem } from '@brimgate/rules';
import { Link } from 'react-router-dom';
import { provenanceWords } from '../../components/provenance-tag';
import { paths } from '../../paths';
import { shortComposition } from './composition-words';
import styles from './lines-section.module.css';

/** Which composition is reckoned with and how its sulfur is known; the feedstuff's page shows every figure's source. */
export function CompositionNote({ feedstuff }: { feedstuff: FeedstuffListItem }) {
  const sulfurStatus = feedstuff.statuses.sulfurPctDm;
  return (
    <span className={styles.composition}>
      <Link to={paths.feedstuff(feedstuff.id)} title={feedstuff.compositionLabel}>
        {shortComposition(feedstuff.compositionLabel)}
        <span className="visually-hidden"> of {feedstuff.name}: figures and sources</span>
      </Link>
      {' · '}
      {feedstuff.composition.sulfurPctDm === undefined || !sulfurStatus
        ? 'sulfur not determined'
        : `sulfur ${feedstuff.composition.sulfurPctDm} %, ${provenanceWords[sulfurStatus]}`}
    </span>
  );
}
