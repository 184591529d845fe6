import type { SessionView } from '@brimgate/rules';
import { Link, Outlet, ScrollRestoration, useNavigation } from 'react-router-dom';
import { Loading } from '../components/loading';
import { paths } from '../paths';
import { Header } from './header';
import styles from './shell.module.css';

/** What stands round every page of somebody who is signed in. */
export function Shell({ session }: { session: SessionView }) {
  const isOnTheWay = useNavigation().state === 'loading';
  return (
    <>
      <a href="#page" className={styles.skip}>
        Skip to the page
      </a>
      <Header session={session} />
      {isOnTheWay && (
        <div className={styles.onTheWay}>
          <Loading what="the page" />
        </div>
      )}
      <main id="page" tabIndex={-1} className={styles.main}>
        <Outlet />
      </main>
      <footer className={`${styles.footer} no-print`}>
        <Link to={paths.sources()}>Limits and sources</Link>
      </footer>
      <ScrollRestoration />
    </>
  );
}
