import type { ComponentType } from 'react';
import type { RouteObject } from 'react-router-dom';
import { RouteFallback } from './app/route-fallback';
import { SignedInLayout } from './app/signed-in-layout';
import { ErrorPage } from './pages/error-page';
import { NotFoundPage } from './pages/not-found-page';

/** A page is fetched when somebody goes there. */
const page = (load: () => Promise<{ default: ComponentType }>) => async () => ({ Component: (await load()).default });

/** The one route table: the address of every page and the file that draws it. */
export const routes: RouteObject[] = [
  {
    errorElement: <ErrorPage />,
    hydrateFallbackElement: <RouteFallback />,
    children: [
      { path: '/sign-in', lazy: page(() => import('./pages/sign-in-page')) },
      {
        element: <SignedInLayout />,
        children: [
          {
            errorElement: <ErrorPage />,
            children: [
              { path: '/', lazy: page(() => import('./pages/work-page')) },
              { path: '/rations', lazy: page(() => import('./pages/rations-page')) },
              { path: '/rations/new', lazy: page(() => import('./pages/ration-new-page')) },
              { path: '/rations/:rationId', lazy: page(() => import('./pages/ration-page')) },
              { path: '/rations/:rationId/release', lazy: page(() => import('./pages/release-page')) },
              { path: '/screenings/:screeningId', lazy: page(() => import('./pages/screening-page')) },
              { path: '/feedstuffs', lazy: page(() => import('./pages/feedstuffs-page')) },
              { path: '/feedstuffs/new', lazy: page(() => import('./pages/feedstuff-new-page')) },
              { path: '/feedstuffs/:feedstuffId', lazy: page(() => import('./pages/feedstuff-page')) },
              { path: '/water', lazy: page(() => import('./pages/water-page')) },
              { path: '/review-desk', lazy: page(() => import('./pages/review-desk-page')) },
              { path: '/review-desk/:reviewId', lazy: page(() => import('./pages/review-page')) },
              { path: '/advisories', lazy: page(() => import('./pages/advisories-page')) },
              { path: '/advisories/:advisoryId', lazy: page(() => import('./pages/advisory-page')) },
              { path: '/lots', lazy: page(() => import('./pages/lots-page')) },
              { path: '/lots/new', lazy: page(() => import('./pages/lot-new-page')) },
              { path: '/lots/:lotId', lazy: page(() => import('./pages/lot-page')) },
              { path: '/ledger', lazy: page(() => import('./pages/ledger-page')) },
              { path: '/yards', lazy: page(() => import('./pages/yards-page')) },
              { path: '/yards/:yardId', lazy: page(() => import('./pages/yard-page')) },
              { path: '/people', lazy: page(() => import('./pages/people-page')) },
              { path: '/audit', lazy: page(() => import('./pages/audit-page')) },
              { path: '/sources', lazy: page(() => import('./pages/sources-page')) },
              { path: '*', element: <NotFoundPage /> },
            ],
          },
        ],
      },
    ],
  },
];
