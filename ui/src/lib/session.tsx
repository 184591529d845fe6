import type { Permission, SessionView } from '@brimgate/rules';
import { createContext, use } from 'react';

export const SessionContext = createContext<SessionView | null>(null);

/** Who is signed in, under which membership. Only below the signed-in layout. */
export function useSession(): SessionView {
  const session = use(SessionContext);
  if (!session) throw new Error('useSession is for pages below the signed-in layout');
  return session;
}

/** Whether the role of the person may do this; the server decides all the same. */
export const usePermission = (permission: Permission): boolean => useSession().permissions.includes(permission);

/** The zone of any yard, for lists whose rows belong to several. */
export function useZoneOfYard(): (yardId: string) => string {
  const { yards } = useSession().membership;
  return (yardId) => yards.find((yard) => yard.id === yardId)?.timeZone ?? 'UTC';
}

/** The zone in which one yard's times are shown; UTC, named, when the yard is not among the person's own. */
export const useYardZone = (yardId: string | undefined): string => useZoneOfYard()(yardId ?? '');
