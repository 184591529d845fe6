import { Link, useLocation, useSearchParams } from 'react-router-dom';
import styles from './pager.module.css';

/** Further rows of a list by keyset: the cursor stands in the address, so Back and a shared link show the same rows. */
export function Pager({ nextCursor, what }: { nextCursor: string | null; what: string }) {
  const { pathname } = useLocation();
  const [search] = useSearchParams();
  const to = (cursor: string | null) => {
    const next = new URLSearchParams(search);
    if (cursor === null) next.delete('cursor');
    else next.set('cursor', cursor);
    const query = next.toString();
    return query === '' ? pathname : `${pathname}?${query}`;
  };
  const isFirst = !search.has('cursor');
  if (isFirst && nextCursor === null) return null;
  return (
    <nav className={styles.pager} aria-label={`Pages of ${what}`}>
      {!isFirst && <Link to={to(null)}>Back to the first {what}</Link>}
      {nextCursor !== null && <Link to={to(nextCursor)}>More {what}</Link>}
    </nav>
  );
}
