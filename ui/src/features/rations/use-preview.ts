import { useDeferredValue, useMemo, useState } from 'react';
import { previewOf, type PreviewFacts, type Screened } from './preview';
import type { RationValues } from './ration-values';

interface PreviewInput extends PreviewFacts {
  values: RationValues;
  /** What the server computed for exactly the saved content; shown until something can be reckoned here. */
  stored: Screened | null;
}

/** Findings that follow the typing, with no request; while the ration is incomplete the last ones stay, marked stale. */
export function usePreview({ values, feedstuffs, waterSources, yard, stored }: PreviewInput) {
  const settled = useDeferredValue(values);
  const preview = useMemo(
    () => previewOf(settled, { feedstuffs, waterSources, yard }),
    [settled, feedstuffs, waterSources, yard],
  );
  const [last, setLast] = useState<Screened | null>(stored);
  if (preview.screened && preview.screened !== last) setLast(preview.screened);
  return { screened: preview.screened ?? last, isStale: preview.screened === null, wanting: preview.wanting };
}
