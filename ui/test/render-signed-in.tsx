import { Theme } from '@radix-ui/themes';
import { permissionsOf, type Role, type SessionView } from '@brimgate/rules';
import { QueryClientProvider } from '@tanstack/react-query';
import { render, type RenderResult } from '@testing-library/react';
import type { ReactNode } from 'react';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { ToastProvider } from '../src/components/toast';
import { createQueryClient } from '../src/lib/query-client';
import { SessionContext } from '../src/lib/session';

const yards = [{ id: '2f4e1c1e-7d0a-4a53-9c3b-0a4f5f2f6c11', name: 'Dry Fork', timeZone: 'America/Chicago' }];

/** Somebody of the role, signed in at the yard Dry Fork. */
export function aSession(role: Role, overrides: Partial<SessionView['person']> = {}): SessionView {
  const membership = {
    id: '9a3b1f0e-1111-4a53-9c3b-0a4f5f2f6c12',
    firm: { id: '9a3b1f0e-2222-4a53-9c3b-0a4f5f2f6c13', name: 'Level Line Nutrition' },
    role,
    yards,
  };
  return {
    person: {
      id: '9a3b1f0e-3333-4a53-9c3b-0a4f5f2f6c14',
      name: 'Robin Example',
      email: 'robin@example.test',
      licence: role === 'veterinarian' ? 'Licence 20871' : null,
      ...overrides,
    },
    membership,
    memberships: [membership],
    permissions: [...permissionsOf[role]],
    endsAt: '2026-07-13T03:00:00.000Z',
  };
}

interface Where {
  session: SessionView;
  /** The address one stands at, and the route it belongs to. */
  at?: string;
  route?: string;
}

/** Draws a page as it stands below the signed-in layout. */
export function renderSignedIn(page: ReactNode, { session, at = '/', route = '/' }: Where): RenderResult {
  const router = createMemoryRouter(
    [
      { path: route, element: page },
      { path: '*', element: <p>another page</p> },
    ],
    { initialEntries: [at] },
  );
  return render(
    <Theme>
      <QueryClientProvider client={createQueryClient()}>
        <SessionContext value={session}>
          <ToastProvider>
            <RouterProvider router={router} />
          </ToastProvider>
        </SessionContext>
      </QueryClientProvider>
    </Theme>,
  );
}
