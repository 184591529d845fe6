import { useMemo, useState } from 'react';
import type { Fault } from '../../lib/form/faults-to-form';
import type { SaveState } from './draft-saver';
import { contentFromValues } from './ration-content';
import type { RationValues } from './ration-values';

/** What the server refused, together with what was sent: its words stand until that is changed. */
interface Refusal {
  of: RationValues;
  faults: readonly Fault[];
}

const NONE: readonly Fault[] = [];

/**
 * The faults to show: what cannot be read as soon as a save met it, everything else from the first attempt to screen
 * on, each until it is mended.
 */
export function useFaults(values: RationValues, saveState: SaveState) {
  const [attempt, setAttempt] = useState(0);
  const [refusal, setRefusal] = useState<Refusal | null>(null);
  const content = attempt > 0 ? contentFromValues(values) : null;
  const ownFaults = content && !content.isValid ? content.faults : NONE;
  const serverFaults = refusal?.of === values ? refusal.faults : NONE;
  const heldFaults = saveState.kind === 'held' ? saveState.faults : NONE;
  const summary = useMemo(() => uniqueFaults([...ownFaults, ...serverFaults]), [ownFaults, serverFaults]);
  // The same function as long as the faults are the same: sections are drawn anew only when something of theirs changed.
  const at = useMemo(() => {
    const byPath = new Map([...heldFaults, ...summary].map(({ path, message }) => [path, message]));
    return (path: string) => byPath.get(path);
  }, [heldFaults, summary]);
  return {
    summary,
    attempt,
    at,
    /** An attempt was refused, by the form itself or by the server. */
    refuse: (faults: readonly Fault[]) => {
      setRefusal({ of: values, faults });
      setAttempt((before) => before + 1);
    },
  };
}

const uniqueFaults = (faults: readonly Fault[]): Fault[] => [
  ...new Map(faults.map((fault) => [`${fault.path} ${fault.message}`, fault])).values(),
];
