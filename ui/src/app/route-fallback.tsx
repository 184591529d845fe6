import { Loading } from '../components/loading';

/** Before the first page has arrived. */
export const RouteFallback = () => (
  <main style={{ padding: '0 16px' }}>
    <Loading what="the page" />
  </main>
);
