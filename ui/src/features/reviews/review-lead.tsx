import type { ReviewView } from '@brimgate/rules';
import { formatAge, formatCount, formatMoment } from '../../lib/format';

/** Who sent it, how long it waits, what it would replace and who eats that. */
export function ReviewLead({ review, timeZone }: { review: ReviewView; timeZone: string }) {
  return (
    <>
      sent by <strong>{review.submittedBy}</strong> {formatMoment(review.submittedAt, timeZone)}
      {review.state === 'open' && (
        <>
          , waiting <strong>{formatAge(review.submittedAt).replaceAll(' ', '\u00a0')}</strong>
        </>
      )}{' '}
      · {replacesWords(review)}
    </>
  );
}

function replacesWords({ replaces, lotsFed }: ReviewView): string {
  if (!replaces) return 'would be the first version of this ration to be fed';
  const version = `would replace version ${replaces.versionNumber}`;
  if (lotsFed.length === 0) return `${version}, which no lot on record is fed`;
  const head = lotsFed.reduce((sum, lot) => sum + lot.head, 0);
  return `${version}, fed to ${lotsFed.map((lot) => lot.name).join(', ')}: ${formatCount(head, 'head', 'head')}`;
}
