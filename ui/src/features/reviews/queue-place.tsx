import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { paths } from '../../paths';
import { reviewListQuery } from './reviews.queries';

/** Where one stands in the desk's list, and what comes next. */
export function QueuePlace({ reviewId }: { reviewId: string }) {
  const { data } = useQuery(reviewListQuery(null));
  const desk = <Link to={paths.reviewDesk()}>Review desk</Link>;
  const open = data?.items ?? [];
  const place = open.findIndex((review) => review.id === reviewId);
  const next = open.filter((review) => review.id !== reviewId).at(Math.max(place, 0));
  return (
    <>
      {desk}
      {place >= 0 && `, ${place + 1} of ${open.length}${data?.nextCursor ? ' and more' : ''}`}
      {next && (
        <>
          {' · next: '}
          <Link to={paths.review(next.id)}>
            {next.rationName}, {next.yard.name}
          </Link>
        </>
      )}
    </>
  );
}
