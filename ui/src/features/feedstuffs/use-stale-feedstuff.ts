import type { FeedstuffView } from '@brimgate/rules';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { feedstuffQuery, type FeedstuffSave } from './feedstuffs.queries';

const baseOf = (feedstuff: FeedstuffView | null): FeedstuffSave['opened'] =>
  feedstuff && feedstuff.version !== null ? { id: feedstuff.id, version: feedstuff.version } : null;

/** Which version a save goes on top of, and what somebody else saved meanwhile, until the person has chosen. */
export function useStaleFeedstuff(opened: FeedstuffView | null) {
  const queryClient = useQueryClient();
  const [base, setBase] = useState(() => baseOf(opened));
  const [current, setCurrent] = useState<FeedstuffView | null>(null);
  return {
    base,
    current,
    /** The save was refused as stale: fetches what was saved meanwhile. */
    look: async () => {
      if (base) setCurrent(await queryClient.fetchQuery({ ...feedstuffQuery(base.id), staleTime: 0 }));
    },
    /** The person has seen both: from here on the save goes on top of theirs. */
    keepMine: () => {
      setBase(baseOf(current));
      setCurrent(null);
    },
  };
}
